import { expect, test } from 'vitest';
import { importLines, importProblemLines } from '../../../src/chat/attachments/import-lines.ts';
import { nothingRead } from '../../../src/chat/attachments/import-read.ts';
import type { ImportProblemCode, ImportRead } from '../../../src/chat/attachments/import-read.ts';
import type { Line } from '../../../src/chat/replies/reply.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';

const say = makeSay(loadLocales());
const textOf = (lines: readonly Line[]): string[] =>
  say({ language: 'en', lines, buttons: [] }).text.split('\n');
const read: ImportRead = { ...nothingRead('empty'), kind: 'vessels', vessels: 41, problems: [] };

test('a list of vessels is shown before anything of it is taken', () => {
  const shown: ImportRead = {
    ...read,
    notUnderstood: [7, 9, 30],
    notTaken: ['ph', 'Zweigelt'],
    assumedUnit: 'galUS',
  };
  expect(textOf(importLines(shown))).toEqual([
    'Vessels in the file: 41.',
    'Not understood and left out: lines 7, 9, 30.',
    'Not taken from it: pH, Zweigelt.',
    'Volumes without a unit are read in US gallons.',
  ]);
});

test('of many lines the first are named and the others counted', () => {
  const notUnderstood = Array.from({ length: 120 }, (_, i) => i + 1);
  expect(textOf(importLines({ ...read, notUnderstood }))[1]).toMatch(/ 19, 20 … \(\+100\)\.$/);
});

test('a log is shown by what is in it', () => {
  expect(textOf(importLines({ ...read, kind: 'log', people: [{ number: 1 }], vessels: 2 }))).toEqual([
    'Entries in the file: 0. Vessels: 2. People: 1.',
  ]);
});

const CODES: Readonly<Record<ImportProblemCode, true>> = {
  empty: true,
  'too-large': true,
  'too-many-rows': true,
  'too-many-columns': true,
  'cell-too-long': true,
  'not-a-table': true,
  'old-spreadsheet': true,
  broken: true,
  'too-heavy': true,
  'columns-missing': true,
  'columns-unknown': true,
  'unclear-numbers': true,
  'not-understood': true,
  doubled: true,
  'refers-outside': true,
  'already-noted': true,
  'no-vessels': true,
};

test('every reason has a sentence of its own, and says that nothing was taken', () => {
  const sentences = Object.keys(CODES).map((code) =>
    textOf(importProblemLines([{ code: code as ImportProblemCode, lines: [7], about: 'key' }])),
  );
  expect(new Set(sentences.map(([first]) => first)).size).toBe(Object.keys(CODES).length);
  expect(new Set(sentences.map((lines) => lines[1]))).toEqual(new Set(['Nothing of it was taken.']));
});
