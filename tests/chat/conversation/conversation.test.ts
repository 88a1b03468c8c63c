import { expect, test } from 'vitest';
import { FRESH_MEMORY } from '../../../src/chat/conversation/memory.ts';
import { DEFAULT_SETTINGS, withUnits } from '../../../src/chat/conversation/settings.ts';
import { say, startTalk, textOf } from './talk.ts';

const FULL = 'T4 1450 gal pH 3.58 free 21';

test('the same message with the same memory gets the same answer, and the memory handed in stays as it was', () => {
  const before = JSON.stringify(FRESH_MEMORY);
  expect(startTalk().write(FULL)).toEqual(startTalk().write(FULL));
  expect(JSON.stringify(FRESH_MEMORY)).toBe(before);
});

test('what is kept is plain: it comes back from text as it went in', () => {
  const talk = startTalk();
  const [write] = talk.write('T4 pH 3.5 free 20').writes;
  expect(JSON.parse(JSON.stringify(write))).toStrictEqual(write);
});

test('a write names the conversation and nothing of the message', () => {
  const [write] = startTalk().write(FULL).writes;
  expect(write?.who).toStrictEqual({ cellar: 'harbour cellar', chat: 'one', person: 'Ana' });
});

test('the last 20 readings are remembered, and a button of an older one gets a kind line', () => {
  const talk = startTalk();
  for (let count = 0; count <= 20; count += 1) talk.write(FULL);
  expect(talk.memory.remembered).toHaveLength(20);
  expect(textOf(talk.press('w:1'))).toContain('older message');
  expect(textOf(talk.press('w:2'))).toContain('the working');
});

test('a button means the same however often it is pressed', () => {
  const talk = startTalk();
  talk.write(FULL);
  const first = textOf(talk.press('w:1'));
  expect(textOf(talk.press('w:1'))).toBe(first);
});

test('at most four buttons stand under a dose, and their keys fit 64 bytes', () => {
  const talk = startTalk();
  for (const message of [FULL, FULL, 'T2 40 hl pH 4.1 free 45', '100 g kmbs in 20 hl'])
    for (const reply of talk.write(message).replies) {
      expect(reply.buttons.length).toBeLessThanOrEqual(4);
      for (const { key } of reply.buttons) expect(Buffer.byteLength(key)).toBeLessThanOrEqual(64);
    }
});

test('an emergency has no button, no question, no figure of the wine, and nothing waits after it', () => {
  const talk = startTalk();
  talk.write('T4 pH 3.5 free 20');
  const handled = talk.write('gas leak at T4, 1450 gal pH 3.5 free 20, he cant breathe');
  expect(handled.replies.flatMap(({ buttons }) => buttons)).toEqual([]);
  expect(textOf(handled)).not.toMatch(/\?|1.?450|3\.5|weigh/);
  expect(talk.memory.waiting).toBeUndefined();
  expect(handled.answers).toEqual([null]);
});

test('beside a problem there is no answer, no button of a dose and nothing to weigh', () => {
  const handled = startTalk().write('ph 36 1,450 gal free 22');
  expect(handled.answers).toEqual([null]);
  expect(handled.replies.flatMap(({ buttons }) => buttons)).toEqual([]);
  expect(textOf(handled)).not.toMatch(/weigh/i);
});

test('who wants to stop a fermentation gets the figure, that it does not, and no amount to weigh', () => {
  const handled = startTalk().write('1 g kmbs per 10 L to stop the ferment');
  expect(handled.answers?.[0]).toMatchObject({
    adds_mg_L: expect.closeTo(57.6, 1) as number,
    warnings: expect.arrayContaining([
      expect.objectContaining({ code: 'does-not-stop-fermentation' }),
    ]) as unknown[],
  });
  expect(textOf(handled)).toMatch(/bottles can burst: ask someone qualified/);
  expect(textOf(handled)).not.toMatch(/weigh/i);
});

test('a round of 30 vessels comes in two messages of a line each, cautions once', () => {
  const round = Array.from({ length: 30 }, (_, at) => `T${at + 1} 20 hl pH 3.4 free 15`).join('\n');
  const { replies, answers } = startTalk().write(round);
  const texts = replies.map((reply) => say(reply).text);
  expect(texts.map((text) => text.match(/^T\d+ \(/gm)?.length)).toEqual([25, 5]);
  for (const text of texts) expect(text).toMatch(/^Weigh potassium metabisulfite:$/m);
  expect(texts.join('\n').match(/never lean into a tank/gi)).toHaveLength(1);
  expect(texts.join('\n').match(/if malolactic/gi)).toHaveLength(1);
  expect(answers).toHaveLength(30);
});

test.each([
  ['metric', 'g potassium metabisulfite per hL', '1 450 L'],
  ['us', 'per 1 000 gal', '1 450 gal (5 489 L)'],
  ['imperial', 'per 1 000 imp gal', '1 450 imp gal (6 592 L)'],
] as const)('in a %s chat a rate and a bare volume are in its own units', (units, rate, volume) => {
  const talk = startTalk(withUnits(DEFAULT_SETTINGS, units));
  expect(textOf(talk.write('T4 pH 3.5 free 20'))).toContain(rate);
  expect(textOf(talk.write('1450'))).toContain(volume);
});

test('ppm stays ppm for one who writes ppm', () => {
  expect(textOf(startTalk().write('T4 40 hl pH 3.4 free 15 ppm'))).toContain('32 ppm free if nothing binds');
});

test('a message in a language without sentences yet is answered in English', () => {
  expect(textOf(startTalk(DEFAULT_SETTINGS, 'de').write('T4 40 hl pH 3,4 frei 15'))).toContain('T4: weigh');
});

test('the OIV basis is used only where alcohol and temperature allow it, else that is said with what it would change', () => {
  const settings = { ...DEFAULT_SETTINGS, basis: 'oiv' } as const;
  expect(textOf(startTalk(settings).write('T4 40 hl pH 3.4 free 15'))).toMatch(
    /reckoned with pK 1\.81.*\d+ mg\/L/,
  );
  const [answer] = startTalk(settings).write('T4 40 hl pH 3.4 free 15 13% 25C').answers ?? [];
  expect(answer).toMatchObject({ basis: 'oiv' });
});
