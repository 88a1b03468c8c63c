import { expect, test } from 'vitest';
import { DAY_ms } from '../../../src/core/time/durations.ts';
import { FRESH_MEMORY } from '../../../src/chat/conversation/memory.ts';
import { DEFAULT_SETTINGS, withUnits } from '../../../src/chat/conversation/settings.ts';
import { MOST_ROWS, PHONE_COLUMNS, rowsOf } from '../../../src/chat/replies/fold.ts';
import { say, startTalk, textOf } from './talk.ts';

const FULL = 'T4 1450 gal pH 3.58 free 21';

test('the same message with the same memory gets the same answer, and the memory handed in stays as it was', async () => {
  const before = JSON.stringify(FRESH_MEMORY);
  expect(await startTalk().write(FULL)).toEqual(await startTalk().write(FULL));
  expect(JSON.stringify(FRESH_MEMORY)).toBe(before);
});

test('what is kept is plain: it comes back from text as it went in', async () => {
  const { writes } = await startTalk().write('T4 pH 3.5 free 20');
  expect(writes.length).toBeGreaterThan(0);
  expect(JSON.parse(JSON.stringify(writes))).toStrictEqual(writes);
});

test('a button works for 14 days, and after that gets a kind line', async () => {
  const talk = startTalk();
  await talk.write(FULL);
  talk.at += 14 * DAY_ms - 1;
  expect(textOf(await talk.press('w:1.1'))).toContain('the working');
  talk.at += 1;
  expect(textOf(await talk.press('w:1.1'))).toContain('older message');
});

test('a button means the same however often it is pressed', async () => {
  const talk = startTalk();
  await talk.write(FULL);
  const first = textOf(await talk.press('w:1.1'));
  expect(first).toContain('the working');
  expect(textOf(await talk.press('w:1.1'))).toBe(first);
});

test('at most six buttons stand under a dose, and their keys fit 64 bytes', async () => {
  const talk = startTalk();
  for (const message of [FULL, FULL, 'T2 40 hl pH 4.1 free 45', '100 g kmbs in 20 hl'])
    for (const reply of (await talk.write(message)).replies) {
      expect(reply.buttons.length).toBeLessThanOrEqual(6);
      for (const { key } of reply.buttons) expect(Buffer.byteLength(key)).toBeLessThanOrEqual(64);
    }
});

test('an emergency has no button, no question, no figure of the wine, and nothing waits after it', async () => {
  const talk = startTalk();
  await talk.write('T4 pH 3.5 free 20');
  const handled = await talk.write('gas leak at T4, 1450 gal pH 3.5 free 20, he cant breathe');
  expect(handled.replies.flatMap(({ buttons }) => buttons)).toEqual([]);
  expect(textOf(handled)).not.toMatch(/\?|1.?450|3\.5|weigh/);
  expect((await talk.memory()).waiting).toBeUndefined();
  expect(handled.answers).toEqual([null]);
});

test('beside a problem there is no answer, no button of a dose and nothing to weigh', async () => {
  const handled = await startTalk().write('ph 36 1,450 gal free 22');
  expect(handled.answers).toEqual([null]);
  expect(handled.replies.flatMap(({ buttons }) => buttons)).toEqual([]);
  expect(textOf(handled)).not.toMatch(/weigh/i);
});

test('who wants to stop a fermentation gets the figure, that it does not, and no amount to weigh', async () => {
  const handled = await startTalk().write('1 g kmbs per 10 L to stop the ferment');
  expect(handled.answers?.[0]).toMatchObject({
    adds_mg_L: expect.closeTo(57.6, 1) as number,
    warnings: expect.arrayContaining([
      expect.objectContaining({ code: 'does-not-stop-fermentation' }),
    ]) as unknown[],
  });
  expect(textOf(handled)).toMatch(/bottles can burst: ask someone qualified/);
  expect(textOf(handled)).not.toMatch(/weigh/i);
});

test('a round of 30 vessels is one screen; asked for, it comes in messages of a line each', async () => {
  const talk = startTalk();
  const round = Array.from({ length: 30 }, (_, at) => `T${at + 1} 20 hl pH 3.4 free 15`).join('\n');
  const said = await talk.write(round);
  const screen = textOf(said);
  expect(rowsOf(screen, PHONE_COLUMNS)).toBeLessThanOrEqual(MOST_ROWS);
  // 15 → 31.9 mg/L in 2,000 L: 59 g each.
  expect(screen.split('\n')[0]).toMatch(/^In all 1\.77 kg potassium metabisulfite: the 30 rounded amounts/);
  expect(screen.match(/never lean into a tank/gi)).toHaveLength(1);
  const { replies } = await talk.write('round');
  const { answers } = said;
  const texts = replies.map((reply) => say(reply).text);
  expect(texts.map((text) => text.match(/^T\d+ \(/gm)?.length)).toEqual([25, 5]);
  for (const text of texts) expect(text).toMatch(/^Weigh potassium metabisulfite:$/m);
  expect(texts.join('\n').match(/if malolactic/gi)).toHaveLength(1);
  expect(answers).toHaveLength(30);
});

test('a long round with lines that have no amount is one screen too, and names them', async () => {
  const lines = Array.from(
    { length: 24 },
    (_, at) => `T${at + 1} ${10 + at} hl pH ${at % 7 === 3 ? '36' : '3.4'} free ${10 + (at % 9)}`,
  );
  const screen = textOf(await startTalk().write(lines.join('\n')));
  expect(rowsOf(screen, PHONE_COLUMNS)).toBeLessThanOrEqual(MOST_ROWS);
  expect(screen.split('\n')[1]).toBe('No amount for T4, T11, T18: send “round” to see why.');
});

test.each([
  ['metric', 'g potassium metabisulfite per hL', '1 450 L'],
  ['us', 'per 1 000 gal', '1 450 gal (5 489 L)'],
  ['imperial', 'per 1 000 imp gal', '1 450 imp gal (6 592 L)'],
] as const)('in a %s chat a rate and a bare volume are in its own units', async (units, rate, volume) => {
  const talk = startTalk(withUnits(DEFAULT_SETTINGS, units));
  expect(textOf(await talk.write('T4 pH 3.5 free 20'))).toContain(rate);
  expect(textOf(await talk.write('1450'))).toContain(volume);
});

test('ppm stays ppm for one who writes ppm', async () => {
  expect(textOf(await startTalk().write('T4 40 hl pH 3.4 free 15 ppm'))).toContain(
    '32 ppm free if nothing binds',
  );
});

test.each([
  ['es', 'T4 40 hl pH 3,4 libre 15', 'T4: pesa 117 g'],
  ['de', 'T4 40 hl pH 3,4 frei 15', 'T4: 117 g'],
] as const)('a chat in %s is answered in it, with the same amount', async (language, text, first) => {
  expect(textOf(await startTalk(DEFAULT_SETTINGS, language).write(text))).toContain(first);
});

test('the OIV basis is used only where alcohol and temperature allow it, else that is said with what it would change', async () => {
  const settings = { ...DEFAULT_SETTINGS, basis: 'oiv' } as const;
  expect(textOf(await startTalk(settings).write('T4 40 hl pH 3.4 free 15'))).toMatch(
    /reckoned with pK 1\.81.*\d+ mg\/L/,
  );
  const [answer] = (await startTalk(settings).write('T4 40 hl pH 3.4 free 15 13% 25C')).answers ?? [];
  expect(answer).toMatchObject({ basis: 'oiv' });
});
