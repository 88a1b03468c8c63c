import { expect, test } from 'vitest';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import type { Handled } from '../../../src/chat/conversation/ports.ts';
import { readFile } from '../../../src/edge/files/read-file.ts';
import { MORNING, say, startTalk, textOf, type Talk } from './talk.ts';

const reading = { reader: DEFAULT_SETTINGS, noting: { key: 'import x', at: MORNING, by: 1 } };

async function sendFile(text: string, talk: Talk = startTalk()): Promise<Handled> {
  const read = await readFile(new TextEncoder().encode(text), reading);
  return talk.send({ kind: 'file', read });
}

const labels = ({ replies }: Handled): string[] =>
  replies.flatMap((reply) => say(reply).buttons.map(({ label }) => label));

const entriesIn = ({ writes }: Handled): number => writes.filter(({ kind }) => kind === 'entry').length;

test('a file with targets is a round: it is answered with its sheet, made as it came', async () => {
  const handled = await sendFile(
    'Tank,Volume hL,pH,Free SO2 mg/L,Target\n1,20,3.4,18,30\n2,35,3.5,20,30\n3,40,36,20,30\n4,12,3.3,12,\n',
  );
  // 12 mg/L in 2,000 L, 10 in 3,500 L, and at pH 3.3 25.5 − 12 in 1,200 L; ÷ 0.57629.
  expect(textOf(handled)).toMatch(
    /^Weigh potassium metabisulfite:\nT1 .*: 42 g\nT2 .*: 61 g\nT4 .*: 28 g\nIn all 131 g/,
  );
  expect(textOf(handled)).toContain('No amount for one:\nT3: “pH 36”');
  expect(handled.errand).toMatchObject({ kind: 'round-sheet', format: 'csv' });
  expect(handled.round).toMatchObject({ totals: [{ mass_g: 131 }], problems: 1 });
});

test('readings alone are asked about: doses, or only to be noted; each tap notes them once', async () => {
  const talk = startTalk();
  const asked = await sendFile('Tank;Volume hL;pH;Free\n1;20;3,4;18\n2;35,5;3,5;20\n', talk);
  expect(entriesIn(asked)).toBe(0);
  expect(labels(asked)).toEqual(['Doses', 'Note the readings', 'Take the vessels']);
  const [dose = '', note = ''] = (await talk.memory()).lastButtons;
  const noted = await talk.press(note);
  expect(entriesIn(noted)).toBe(2);
  expect(textOf(noted)).toContain('pH 3,4');
  expect(noted.errand).toBeUndefined();
  expect(entriesIn(await talk.press(note))).toBe(0);
  const dosed = await talk.press(dose);
  expect(entriesIn(dosed)).toBe(0);
  expect(textOf(dosed)).toContain('In all 171 g potassium metabisulfite');
});

test('lines without headings are a round as they stand there', async () => {
  const handled = await sendFile('kmbs\nT1 20 hl pH 3.4 free 18\nT2 35 hl pH 3.5 free 20\n');
  expect(handled.round?.totals).toHaveLength(1);
});

test('a list of vessels stays one, and what tells of additions is no round', async () => {
  expect(labels(await sendFile('T1; 20 hl; red\nT2; 35 hl; red\n'))).toEqual(['Take it']);
  const told = await sendFile('added 5 g kmbs T1\nadded 6 g kmbs T2\n');
  expect([entriesIn(told), told.round]).toEqual([0, undefined]);
});

test('a cell that holds something else than its column is left out and named, and never read as an addition', async () => {
  const handled = await sendFile(
    'vessel,volume L,pH,free,target\nT1,2000,3.4,18,30\nT2,2000,3.4,added 5 g,30\nT3,200,3.4,11,30\n',
  );
  expect(handled.understood?.readings.map(({ fields }) => fields.vessel)).toEqual(['tank 1', 'tank 3']);
  expect(textOf(handled)).toContain('Not understood, and left out: line 3 of the file.');
});

test('an addition beside an additive is SO2 where the heading says so, else it is asked', async () => {
  const rows = '1,225,3.6,18,20,kmbs\n2,225,3.6,14,25,kmbs\n';
  const said = await sendFile(`Barrel,Volume L,pH,Free ppm,Add SO2 ppm,Additive\n${rows}`);
  expect(said.answers?.map((one) => one !== null && 'measure' in one && one.measure)).toEqual([
    { value: 7.8, unit: 'g' },
    { value: 9.8, unit: 'g' },
  ]);
  const unsaid = await sendFile(`Barrel,Volume L,pH,Free ppm,Add ppm,Additive\n${rows}`);
  expect(unsaid.answers).toEqual([null, null]);
});

test('200 lines come through, more than a message has room for', async () => {
  const rows = Array.from({ length: 200 }, (_, at) => `T${at + 1},20,3.4,18,30,potassium metabisulfite`);
  const handled = await sendFile(`tank,volume hl,ph,free so2,target free,additive\n${rows.join('\n')}`);
  expect(handled.answers).toHaveLength(200);
  // 12 mg/L in 2,000 L: 42 g each.
  expect(handled.round?.totals[0]?.mass_g).toBe(8400);
});

test('a target of up to 2 is molecular where its heading does not say free; molecular alone is what was reckoned', async () => {
  const rows = (last: string): string => `T1,2000,3.4,11,${last}\nT2,2000,3.4,12,${last}\n`;
  const targets = async (heading: string): Promise<unknown[]> =>
    ((await sendFile(`vessel,volume L,pH,free,${heading}\n${rows('0.6')}`)).understood?.readings ?? []).map(
      ({ fields }) => fields.target,
    );
  expect(await targets('target')).toEqual([{ molecular_mg_L: 0.6 }, { molecular_mg_L: 0.6 }]);
  expect(await targets('target free')).toEqual([{ free_mg_L: 0.6 }, { free_mg_L: 0.6 }]);
  expect(await targets('molecular')).toEqual([]);
});
