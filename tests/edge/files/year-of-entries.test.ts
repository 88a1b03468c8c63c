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

type Form = 'csv .' | 'csv ,' | 'xlsx .';
const made = new Map<Form, Promise<Uint8Array>>();

/** The year in a form, made once. */
function yearAs(form: Form): Promise<Uint8Array> {
  const [format, decimalMark] = form.split(' ') as ['csv' | 'xlsx', '.' | ','];
  const bytes = made.get(form) ?? exportOf(YEAR, { format, decimalMark });
  made.set(form, bytes);
  return bytes;
}

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
    ['csv .', ',', {}],
    ['csv ,', ';', { decimal: ',' as const }],
  ] as const)('as %s', async (form, delimiter, decimal) => {
    const rows = rowsOf(await yearAs(form), delimiter);
    expect(rows).toHaveLength(5000);
    const wrong = YEAR.flatMap((entry, i) =>
      differences(entry, rows[i] ?? {}, { ...decimal, apostrophe: true }),
    );
    expect(wrong).toEqual([]);
  });

  test('as XLSX, where numbers are numbers and times are times', async () => {
    const bytes = Buffer.from(await yearAs('xlsx .'));
    const [headings = [], ...cells]: unknown[][] = await readSheet(bytes, 1, { trim: false });
    const rows = cells.map((row) => Object.fromEntries(row.map((cell, i) => [String(headings[i]), cell])));
    expect(rows).toHaveLength(5000);
    expect(YEAR.flatMap((entry, i) => differences(entry, rows[i] ?? {}))).toEqual([]);
    expect(rows[0]?.['Done (local time)']).toBeInstanceOf(Date);
  });
});

describe('a year of 5,000 entries, imported into an empty cellar, is the same log and gives the same sheets', () => {
  test.each<Form>(['csv .', 'csv ,', 'xlsx .'])('%s', async (form) => {
    const read = await readImport(await yearAs(form), reading);
    expect(read).toMatchObject({ kind: 'log', problems: [], notUnderstood: [], people: PEOPLE });

    const { entries, people } = fitImport(read, { nextEntry: 1, people: [], hasKey: () => false });
    const noted = struckIn(entries.map((entry, i): Entry => ({ ...entry, entry: i + 1 })));
    expect(noted).toEqual(YEAR);
    const again = await exportOf(noted, { people });
    expect(Buffer.from(again).equals(await yearAs('csv .'))).toBe(true);
  });
});
