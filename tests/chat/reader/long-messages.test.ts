import { expect, test } from 'vitest';
import { LONGEST_MESSAGE, readMessage } from '../../../src/chat/reader/read-message.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';

const readingsOf = (text: string) => readMessage(text, READER_DEFAULTS).readings;
const round = (lines: number): string => Array.from({ length: lines }, (_, k) => `T${k + 1} 9 hl`).join('\n');

test('the platform carries 4,096 UTF-16 units (its published limit), and so many are read', () => {
  expect(LONGEST_MESSAGE).toBe(4096);
  const longest = `T4 20 hl pH 3.5 free 12${' '.repeat(4096)}`.slice(0, 4096);
  expect(readingsOf(longest)[0]?.problems).toEqual([]);
  expect(readingsOf(`${longest} `)[0]?.problems).toEqual([{ code: 'too-long', about: '' }]);
});

// Own thresholds: what no cellar writes, so that no text takes long.
test('a round has up to 300 lines', () => {
  expect(readingsOf(round(300))).toHaveLength(300);
  expect(readingsOf(round(301))).toHaveLength(1);
});

test('a message of more than a hundred figures is asked about, not guessed at', () => {
  const said = 'T4 20 hl pH 3.5 free 12';
  const with100 = `${said} ${'TA 6 '.repeat(96)}`;
  const with101 = `${said} ${'TA 6 '.repeat(97)}`;
  expect(readingsOf(with100)[0]?.fields).toMatchObject({ vessel: 'tank 4', ph: 3.5, free_mg_L: 12 });
  expect(readingsOf(with101)[0]).toMatchObject({ fields: {}, problems: [{ code: 'ambiguous-number' }] });
});
