import { describe, expect, test } from 'vitest';
import { ADDITIVES } from '../../../src/core/additives/additives.ts';
import { cautionLines } from '../../../src/chat/conversation/lines/cautions.ts';
import { MOST_ROWS, PHONE_COLUMNS, rowsOf } from '../../../src/chat/replies/fold.ts';
import { say, startTalk, textOf } from './talk.ts';

/** Messages of every kind; figures made up. */
const MESSAGES = [
  'T4 1450 gal pH 3.58 free 21',
  'T4 40 hl pH 3.4 free 15',
  'white 12 hl 3.21 28',
  'T7 merlot 20 hl pH 3.6 free 3, ML bugs tomorrow',
  'T2 40 hl pH 4.1 free 45',
  'T2 1450 gal pH 4.1 free 45 total 80 13.5% RS 3 TA 5.9',
  'port 20 hl pH 3.6 free 12',
  '1 g kmbs per 10 L to stop the ferment',
  'T4 pH 3.5 free 20',
  '2 campden in 10 L',
  'T4 40 hl add 120 ppm, total 20',
  'T4 40 hl pH 3.4 free 5, +30%',
  'T8 900 gal pH 3.55 free 4 total 135, 1/3 binds, smbs 65%',
  'B1-B24 225 L pH 3.62 free 19',
  '15 L pH 3.5 free 10, 0.44 g potassium campden',
  'T4 30 hl pH 3.5 free 20 SO2 gas',
  '100 g kmbs in T4 20 hl pH 3.5 free 12 total 140',
  'added 26 ppm T4, 1450 gal',
  'make 5 L of 10% kmbs',
  '?',
  'asdf qwer zxcv',
  '50 g bentonite in 20 hl',
  'me salpicó metabisulfito en los ojos',
  'sulfite solution 40 hl add 25 ppm',
  'T4 40 hl pH 2.6 free 150 total 160, target 200',
];

describe.each(MESSAGES)('%s', (message) => {
  test(`fits ${MOST_ROWS} rows of ${PHONE_COLUMNS} letters, cautions in full included`, async () => {
    expect(rowsOf(textOf(await startTalk().write(message)), PHONE_COLUMNS)).toBeLessThanOrEqual(MOST_ROWS);
  });
});

test.each([
  'T4 1450 gal pH 3.58 free 21',
  'T4 40 hl pH 3.4 free 15',
  'white 12 hl 3.21 28',
  '100 g kmbs in 20 hl',
])('a typical reply takes at most 16 rows once the cautions were said today: %s', async (message) => {
  const talk = startTalk();
  await talk.write(message);
  expect(rowsOf(textOf(await talk.write(message)), PHONE_COLUMNS)).toBeLessThanOrEqual(16);
});

test.each(Object.values(ADDITIVES).map(({ id }) => id))(
  'the cautions of %s in full are sentences on at most six rows',
  (id) => {
    for (const [use, tablet_salt_g] of [
      ['wine', undefined],
      ['wine', 0.44],
      ['water', undefined],
    ] as const) {
      const lines = cautionLines({ id, ...(tablet_salt_g && { tablet_salt_g }) }, true, use);
      const { text } = say({ language: 'en', lines, buttons: [] });
      expect(rowsOf(text, PHONE_COLUMNS)).toBeLessThanOrEqual(6);
      expect(text).toMatch(/^⚠ ([A-Z][^.;]*\. ?)+$/);
    }
  },
);

test('help explains itself with three examples and its topics in sixteen rows', async () => {
  const help = textOf(await startTalk().write('?'));
  expect(rowsOf(help, PHONE_COLUMNS)).toBeLessThanOrEqual(16);
  const examples = help
    .split('\n')
    .flatMap((_, at, all) => (all[at + 1]?.startsWith('→') ? [all[at] ?? ''] : []));
  expect(examples).toHaveLength(3);
  for (const example of examples) {
    const { understood, answers } = await startTalk().write(example);
    expect(understood?.readings.map(({ problems, asks }) => [problems, asks])).toEqual([[[], []]]);
    expect(answers?.[0]).not.toBeNull();
  }
});
