import { expect, test } from 'vitest';
import type { Entry } from '../../../src/core/cellar/entry.ts';
import { COLUMNS } from '../../../src/chat/attachments/columns.ts';
import type { ExportWords } from '../../../src/chat/attachments/export-words.ts';
import { makeSheet } from '../../../src/chat/attachments/make-sheet.ts';
import type { ExportSpan } from '../../../src/chat/attachments/make-sheet.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { sayExportWords } from '../../../src/edge/files/say-export-words.ts';
import { struckIn } from './any-log.ts';

const words: ExportWords = sayExportWords(makeSay(loadLocales()), 'en', [1, 2]);
const DAY_ms = 86_400_000;
const START = Date.UTC(2026, 10, 10, 8, 30);
const noting = (entry: number, days = entry, late_days = 0) => ({
  entry,
  key: `k${entry}`,
  at: START + days * DAY_ms,
  noted_at: START + (days + late_days) * DAY_ms,
  by: entry % 2 === 0 ? 2 : 1,
});

const LOG: Entry[] = [
  { ...noting(1), kind: 'vessel', event: 'told', vessels: ['tank 4'], style: 'red', category: 'sweet' },
  { ...noting(2), kind: 'vessel', event: 'lot', vessels: ['tank 4'], lot: 'Blanca 2026' },
  { ...noting(3), kind: 'addition', vessels: ['tank 4'], mass_g: 256, SO2_g: 147.5, volume_L: 5488.8470868 },
  { ...noting(4, 4, 4), kind: 'other', vessels: ['tank 4'], remark: '2 kg bentonite' },
  { ...noting(5), kind: 'correction', vessels: ['tank 4'], corrects: 3, reason: 'typo' },
  { ...noting(6, 6, 3), kind: 'vessel', event: 'moved', vessels: ['tank 4'], to: 'tank 9' },
  { ...noting(7), kind: 'addition', vessels: ['tank 9'], mass_g: 10 },
  { ...noting(8, 2.5), kind: 'vessel', event: 'lot', vessels: ['tank 4'], lot: 'Negra 2026' },
];

/** The rows by their headings, what is empty left out. */
function rows(wanted: ExportSpan = {}): Record<string, unknown>[] {
  const people = [{ number: 1, name: 'Ana' }, { number: 2 }];
  const sheet = makeSheet({ entries: struckIn(LOG), wanted, people, zone: 'Europe/Madrid', words });
  return sheet.rows.map((row) =>
    Object.fromEntries(
      row.flatMap((cell, i) => (cell === undefined ? [] : [[sheet.columns[i]?.heading ?? '', cell]])),
    ),
  );
}

test('a row has what record duties ask for, and what a machine needs to read it again', () => {
  expect(rows()[2]).toEqual({
    'No. [entry]': 3,
    'Kind [kind]': 'addition',
    // 9:30 in Madrid, as a clock there shows it.
    'Done (local time)': { local_ms: Date.UTC(2026, 10, 13, 9, 30) },
    'Noted (local time)': { local_ms: Date.UTC(2026, 10, 13, 9, 30) },
    Person: 'Ana',
    'Vessel [vessels]': 'tank 4',
    'Wine lot': 'Negra 2026',
    Wine: 'red, sweet',
    'Quantity g [mass_g]': 256,
    'SO2 added g [SO2_g]': 147.5,
    'Volume L [volume_L]': 5488.8470868,
    'Volume US gal': 1450,
    'Struck by no. [struck_by]': 5,
    'Struck because': 'typo',
    Calculated: 'Calculated',
    'Done (with zone) [at]': '2026-11-13T09:30:00+01:00',
    'Noted (with zone) [noted_at]': '2026-11-13T09:30:00+01:00',
    'Person no. [by]': 1,
    'Name [name]': 'Ana',
    'Key [key]': 'k3',
  });
});

test('an entry is late when it was noted more than 3 days after it was done', () => {
  expect(rows().map((row) => row['Late'])).toEqual([
    ...Array(3).fill(undefined),
    'Late',
    ...Array(4).fill(undefined),
  ]);
});

test('who has no name is told by the number, and a name is no column of theirs', () => {
  expect(rows()[1]).toMatchObject({ Person: 'Person 2', 'Person no. [by]': 2 });
  expect(rows()[1]).not.toHaveProperty('Name [name]');
});

test('the lot and the colour are those of the moment, go with the wine, and are known of what was noted later', () => {
  expect(rows().map((row) => row['Wine lot'])).toEqual([
    undefined,
    'Blanca 2026',
    'Negra 2026',
    'Negra 2026',
    'Negra 2026',
    'Negra 2026',
    'Negra 2026',
    'Negra 2026',
  ]);
  expect(rows()[6]).toMatchObject({ 'Vessel [vessels]': 'tank 9', Wine: 'red, sweet' });
});

test('what was only noted, or whose SO2 nobody knows, is marked as not calculated', () => {
  expect(rows().map((row) => row['Calculated'])).toEqual([
    undefined,
    undefined,
    'Calculated',
    'Not calculated',
    undefined,
    undefined,
    'Not calculated',
    undefined,
  ]);
});

test('a span takes what happened in it, a vessel also what was moved into it, and both know what was before', () => {
  const span = { from: START + 3 * DAY_ms, to: START + 5 * DAY_ms };
  expect(rows(span).map((row) => row['No. [entry]'])).toEqual([3, 4]);
  expect(rows(span)[0]).toMatchObject({ 'Wine lot': 'Negra 2026' });
  expect(rows({ vessel: 'tank 9' }).map((row) => row['No. [entry]'])).toEqual([6, 7]);
});

test('no two columns have one heading, in any language that has them', () => {
  const headings = makeSheet({ entries: [], people: [], zone: 'UTC', words }).columns.map(
    ({ heading }) => heading,
  );
  expect(new Set(headings).size).toBe(COLUMNS.length);
});
