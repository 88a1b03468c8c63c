import Papa from 'papaparse';
import { expect, test } from 'vitest';
import { fitImport } from '../../../src/chat/attachments/fit-import.ts';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { readImport } from '../../../src/edge/files/read-import.ts';
import { PEOPLE } from '../../chat/attachments/any-log.ts';
import { exportOf } from './export-of.ts';

const at = Date.UTC(2026, 9, 5, 8);
const told = [
  { kind: 'reading', vessels: ['tank 4'], ph: 3.5 },
  { kind: 'addition', vessels: ['tank 3'], additive: 'potassium-metabisulfite', mass_g: 99 },
  {
    kind: 'stock',
    event: 'received',
    vessels: [],
    additive: 'potassium-metabisulfite',
    mass_g: 25_000,
    chemical_lot: '4471',
    supplier: 'Norte Supplies',
  },
  {
    kind: 'addition',
    vessels: ['tank 4'],
    additive: 'potassium-metabisulfite',
    mass_g: 256,
    chemical_lot: '4471',
  },
  {
    kind: 'stock',
    event: 'used',
    vessels: [],
    additive: 'potassium-metabisulfite',
    mass_g: 200,
    remark: 'rinsing',
  },
  { kind: 'stock', event: 'counted', vessels: [], additive: 'potassium-metabisulfite', mass_g: 24_000 },
  { kind: 'stock', event: 'received', vessels: [], additive: 'tablet', tablet_SO2_g: 5, tablets: 50 },
];
const LOG = told.map(
  (one, i) => ({ ...one, entry: i + 1, key: `k${i}`, at: at + i, noted_at: at + i, by: 1 }) as LoggedEntry,
);

const rowsOf = (bytes: Uint8Array): Record<string, string>[] =>
  Papa.parse<Record<string, string>>(new TextDecoder().decode(bytes), {
    header: true,
    skipEmptyLines: true,
  }).data;

/** 27 CFR 24.320 (read in the edition of 1.1.2008): kinds, quantities, date received and supplier of chemicals. */
test('the sheet has kind, quantity, date of receipt and supplier of what came in, and what was left', async () => {
  const rows = rowsOf(await exportOf(LOG));
  expect(rows[2]).toMatchObject({
    'Done (local time)': '2026-10-05 10:00',
    'Kind [kind]': 'stock',
    'What happened [event]': 'received',
    'Additive [additive]': 'potassium-metabisulfite',
    'Supplier [supplier]': 'Norte Supplies',
  });
  const left = rows.map((row) => row['Left in store (g, mL, tablets)']);
  expect(left).toEqual(['', '', '25000', '24744', '24544', '24000', '50']);
});

test('the sheet of the store has only what did something to it', async () => {
  const rows = rowsOf(await exportOf(LOG, { of: 'stock' }));
  expect(rows.map((row) => row['No. [entry]'])).toEqual(['3', '4', '5', '6', '7']);
});

test('an import reads it all back', async () => {
  const noting = { key: 'import:1', at: 0, by: 1 };
  const read = await readImport(await exportOf(LOG), { reader: READER_DEFAULTS, noting });
  expect(read).toMatchObject({ kind: 'log', problems: [], notUnderstood: [] });
  const { entries } = fitImport(read, { nextEntry: 1, people: PEOPLE, hasKey: () => false });
  expect(entries.map((entry, i) => ({ ...entry, entry: i + 1 }))).toEqual(LOG);
});

test('a row whose event is of no stock is not taken for one', async () => {
  const bytes = await exportOf(LOG.slice(2, 3));
  const wrong = new TextEncoder().encode(new TextDecoder().decode(bytes).replace('received', 'racked'));
  const noting = { key: 'import:1', at: 0, by: 1 };
  const read = await readImport(wrong, { reader: READER_DEFAULTS, noting });
  expect(read).toMatchObject({ kind: 'log' });
  expect('entries' in read ? read.entries : []).toEqual([]);
});
