import Papa from 'papaparse';
import { describe, expect, test } from 'vitest';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import type { Entry, LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { readFile } from '../../../src/edge/files/read-file.ts';
import { anyLog } from '../../chat/attachments/any-log.ts';
import { exportOf } from './export-of.ts';

const LOG = anyLog(200, 5);
const reading = { reader: READER_DEFAULTS, noting: { key: 'import:1', at: 0, by: 1 } };
const plain = ({ struck: _struck, ...entry }: LoggedEntry): Entry => entry;

/** The rows of our own export as a spreadsheet has them in memory. */
async function rowsOf(decimalMark: '.' | ',', entries = LOG): Promise<string[][]> {
  const bytes = await exportOf(entries, { decimalMark });
  const text = new TextDecoder().decode(bytes);
  return Papa.parse<string[]>(text, { delimiter: decimalMark === ',' ? ';' : ',', skipEmptyLines: true })
    .data;
}

const utf8 = (text: string): Uint8Array => new TextEncoder().encode(text);
const utf16 = (text: string): Uint8Array => Buffer.from(`\uFEFF${text}`, 'utf16le');
const wide = (row: readonly string[]): string[] => [...row, '', '', ''];

describe('our own export is known again after a spreadsheet has saved it', () => {
  test.each<[string, '.' | ',', (rows: string[][]) => Uint8Array]>([
    ['without its mark and with plain line ends', '.', (rows) => utf8(Papa.unparse(rows, { newline: '\n' }))],
    ['with tabs', '.', (rows) => utf8(Papa.unparse(rows, { delimiter: '\t' }))],
    ['with tabs and decimal commas', ',', (rows) => utf8(Papa.unparse(rows, { delimiter: '\t' }))],
    ['with semicolons and decimal points', '.', (rows) => utf8(Papa.unparse(rows, { delimiter: ';' }))],
    ['with commas and decimal commas', ',', (rows) => utf8(Papa.unparse(rows, { delimiter: ',' }))],
    ['with quotes around everything', '.', (rows) => utf8(Papa.unparse(rows, { quotes: true }))],
    ['as Unicode text', '.', (rows) => utf16(Papa.unparse(rows, { delimiter: '\t' }))],
    [
      'with empty columns and rows behind',
      '.',
      (rows) => utf8(`${Papa.unparse(rows.map(wide))}\r\n,,,\r\n\r\n`),
    ],
    ['with a title above', '.', (rows) => utf8(Papa.unparse([['Our log'], [], ...rows]))],
    ['sorted the other way', '.', ([head = [], ...rows]) => utf8(Papa.unparse([head, ...rows.toReversed()]))],
    [
      'with its columns in another order',
      '.',
      (rows) => utf8(Papa.unparse(rows.map((row) => row.toReversed()))),
    ],
    [
      'with a column of somebody’s own',
      '.',
      (rows) => utf8(Papa.unparse(rows.map((row, i) => [...row, i === 0 ? 'My notes' : 'seen']))),
    ],
    [
      'in another language',
      '.',
      ([head = [], ...rows]) =>
        utf8(Papa.unparse([head.map((heading) => heading.replace(/^.*(?=\[)/, 'Überschrift ')), ...rows])),
    ],
  ])('%s', async (_, decimalMark, save) => {
    const read = await readFile(save(await rowsOf(decimalMark)), reading);
    expect(read.problems).toEqual([]);
    expect(read.entries).toEqual(LOG.map(plain));
  });

  test('in the letters of western Windows', async () => {
    const noting = { entry: 1, key: 'k', at: 0, noted_at: 0, by: 1 };
    const entry: Entry = {
      ...noting,
      kind: 'other',
      vessels: ['tank 4'],
      remark: 'Rosé: 2 kg Hefe für später',
    };
    const bytes = Buffer.from(Papa.unparse(await rowsOf('.', [entry])), 'latin1');
    expect((await readFile(bytes, reading)).entries).toEqual([entry]);
  });
});

describe('what a hand has changed in it is told by its lines, and then nothing can be taken', () => {
  const change = (line: number, name: string, cell: string) => (rows: string[][]) => {
    const column = rows[0]?.findIndex((heading) => heading.endsWith(`[${name}]`)) ?? -1;
    const row = rows[line - 1];
    if (row) row[column] = cell;
    return rows;
  };
  const drop = (name: string) => (rows: string[][]) => {
    const column = rows[0]?.findIndex((heading) => heading.endsWith(`[${name}]`)) ?? -1;
    return rows.map((row) => row.toSpliced(column, 1));
  };

  test.each<[string, (rows: string[][]) => string[][], object]>([
    ['a time without its zone', change(7, 'at', '12.11.2026 09:30'), { code: 'not-understood', lines: [7] }],
    ['a kind that is none', change(7, 'kind', 'party'), { code: 'not-understood', lines: [7] }],
    ['a pH that is none', change(7, 'ph', '36'), { code: 'not-understood', lines: [7] }],
    ['an additive that is none', change(7, 'additive', 'salt'), { code: 'not-understood', lines: [7] }],
    ['a number with words', change(7, 'volume_L', 'about 5200'), { code: 'not-understood', lines: [7] }],
    [
      'a cell beside all columns',
      (rows) => rows.with(6, [...(rows[6] ?? []), 'x']),
      { code: 'not-understood', lines: [7] },
    ],
    ['a line that stands there twice', (rows) => [...rows, rows[6] ?? []], { code: 'doubled', lines: [202] }],
    ['a key that stands there twice', change(7, 'key', 'chat:5:0'), { code: 'doubled', lines: [7] }],
    ['a decimal comma among points', change(7, 'SO2_g', '1,5'), { code: 'unclear-numbers' }],
    ['a column that is missing', drop('key'), { code: 'columns-missing', about: 'key' }],
    [
      'a column of a later day',
      change(1, 'ph', 'New [new_field]'),
      { code: 'columns-unknown', about: 'new_field' },
    ],
    [
      'a column that stands there twice',
      change(1, 'ph', 'pH [free_mg_L]'),
      { code: 'columns-unknown', about: 'free_mg_L' },
    ],
  ])('%s', async (_, hand, problem) => {
    const read = await readFile(utf8(Papa.unparse(hand(await rowsOf('.')))), reading);
    expect(read.problems).toContainEqual(problem);
  });

  test('a part of a log in which an entry names one that is not there', async () => {
    const noting = (entry: number) => ({ entry, key: `k${entry}`, at: 0, noted_at: 0, by: 1 });
    const part: LoggedEntry[] = [
      { ...noting(2), kind: 'correction', vessels: ['tank 4'], corrects: 1, reason: 'typo' },
      { ...noting(3), kind: 'addition', vessels: ['tank 4'], order: 1 },
      { ...noting(4), kind: 'addition', vessels: ['tank 4'], struck: { entry: 9, reason: 'twice' } },
      { ...noting(5), kind: 'addition', vessels: ['tank 4'] },
    ];
    const read = await readFile(utf8(Papa.unparse(await rowsOf('.', part))), reading);
    expect(read.problems).toEqual([{ code: 'refers-outside', lines: [2, 3, 4] }]);
  });
});
