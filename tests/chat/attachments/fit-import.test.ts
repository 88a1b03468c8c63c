import { expect, test } from 'vitest';
import type { Entry } from '../../../src/core/cellar/entry.ts';
import { fitImport } from '../../../src/chat/attachments/fit-import.ts';
import type { ImportRead } from '../../../src/chat/attachments/import-read.ts';

const noting = (entry: number, by = 1) => ({ entry, key: `k${entry}`, at: entry, noted_at: entry, by });
const ENTRIES: Entry[] = [
  { ...noting(11), kind: 'order', vessels: ['tank 4'], mass_g: 256 },
  { ...noting(12, 2), kind: 'addition', vessels: ['tank 4'], mass_g: 250, order: 11 },
  { ...noting(13), kind: 'correction', vessels: ['tank 4'], corrects: 12, reason: 'typo' },
];
const READ: ImportRead = {
  kind: 'log',
  entries: ENTRIES,
  lines: [2, 3, 4],
  people: [
    { number: 1, name: 'Ana' },
    { number: 2, name: 'Bo' },
  ],
  vessels: 1,
  notUnderstood: [],
  notTaken: [],
  problems: [],
};
const EMPTY = { nextEntry: 1, people: [], hasKey: () => false };

test('entries follow on the last one, and name each other by their new numbers', () => {
  const { entries, people, problems } = fitImport(READ, { ...EMPTY, nextEntry: 1 });
  expect(problems).toEqual([]);
  expect(entries).toEqual([
    { ...without(ENTRIES[0]!), by: 1 },
    { ...without(ENTRIES[1]!), order: 1 },
    { ...without(ENTRIES[2]!), corrects: 2 },
  ]);
  expect(people).toEqual(READ.people);
});

test('an entry that the cellar has is told by its line, and nothing is taken', () => {
  const fitted = fitImport(READ, { ...EMPTY, hasKey: (key) => key === 'k12' });
  expect(fitted).toEqual({ entries: [], people: [], problems: [{ code: 'already-noted', lines: [3] }] });
});

test('a file with a problem is not taken', () => {
  const problems = [{ code: 'not-understood' as const, lines: [9] }];
  expect(fitImport({ ...READ, problems }, EMPTY)).toEqual({ entries: [], people: [], problems });
});

test('who has a number here keeps it, and whoever comes gets another', () => {
  const here = {
    ...EMPTY,
    people: [
      { number: 1, name: 'Ana' },
      { number: 2, name: 'Carl' },
    ],
  };
  const { entries, people } = fitImport(READ, here);
  expect(people).toEqual([{ number: 3, name: 'Bo' }]);
  expect(entries.map(({ by }) => by)).toEqual([1, 3, 1]);
});

const without = ({ entry: _entry, ...rest }: Entry) => rest;
