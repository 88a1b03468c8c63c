import Papa from 'papaparse';
import { readSheet } from 'read-excel-file/node';
import { describe, expect, test } from 'vitest';
import { fitImport } from '../../../src/chat/attachments/fit-import.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import type { Entry } from '../../../src/core/cellar/entry.ts';
import { readImport } from '../../../src/edge/files/read-import.ts';
import { PEOPLE, anyLog, struckIn } from '../../chat/attachments/any-log.ts';
import { differences } from './cells-of-entry.ts';
import { exportOf } from './export-of.ts';

/** A year of a busy cellar, with every field of every kind in it, and texts and numbers that hurt. */
const YEAR = anyLog(5000, 20_261_112);
const reading = { reader: READER_DEFAULTS, noting: { key: 'import:1', at: 0, by: 1 } };

function rowsOf(csv: Uint8Array, delimiter: string): Record<string, unknown>[] {
  const text = new TextDecoder('utf-8', { ignoreBOM: true }).decode(csv);
  expect(text.startsWith('\uFEFF')).toBe(true);
  const { data, errors } = Papa.parse<Record<string, unknown>>(text.slice(1), {
    header: true,
    delimiter,
    newline: '\r\n',
    skipEmptyLines: true,
  });
  expect(errors).toEqual([]);
  return data;
}

describe('a year of 5,000 entries, read again by another library, has every value', () => {
  test.each([
    ['.', ',', {}],
    [',', ';', { decimal: ',' as const }],
  ] as const)('as CSV with a decimal %s', async (decimalMark, delimiter, decimal) => {
    const { bytes } = await exportOf(YEAR, { decimalMark });
    const rows = rowsOf(bytes, delimiter);
    expect(rows).toHaveLength(5000);
    const wrong = YEAR.flatMap((entry, i) =>
      differences(entry, rows[i] ?? {}, { ...decimal, apostrophe: true }),
    );
    expect(wrong).toEqual([]);
  });

  test('as XLSX, where numbers are numbers and times are times', async () => {
    const { bytes } = await exportOf(YEAR, { format: 'xlsx' });
    const [headings = [], ...cells]: unknown[][] = await readSheet(Buffer.from(bytes), 1, { trim: false });
    const rows = cells.map((row) => Object.fromEntries(row.map((cell, i) => [String(headings[i]), cell])));
    expect(rows).toHaveLength(5000);
    expect(YEAR.flatMap((entry, i) => differences(entry, rows[i] ?? {}))).toEqual([]);
    expect(rows[0]?.['Done (local time)']).toBeInstanceOf(Date);
  });
});

describe('a year of 5,000 entries, imported into an empty cellar, is the same log and gives the same sheets', () => {
  test.each([
    ['csv', '.'],
    ['csv', ','],
    ['xlsx', '.'],
  ] as const)('%s with a decimal %s', async (format, decimalMark) => {
    const first = await exportOf(YEAR, { format, decimalMark });
    const read = await readImport(first.bytes, reading);
    expect(read).toMatchObject({ kind: 'log', problems: [], notUnderstood: [], people: PEOPLE });

    const { entries, people } = fitImport(read, { nextEntry: 1, people: [], hasKey: () => false });
    const noted = entries.map((entry, i): Entry => ({ ...entry, entry: i + 1 }));
    expect(struckIn(noted)).toEqual(YEAR);

    // A zip keeps the minute in which it was made, so sheets are held against each other as text.
    const [sheet, again] = await Promise.all([
      exportOf(YEAR, { decimalMark }),
      exportOf(struckIn(noted), { people, decimalMark }),
    ]);
    expect(Buffer.from(again.bytes).equals(sheet.bytes)).toBe(true);
  });
});
