import { strToU8, zipSync } from 'fflate';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { READER_DEFAULTS } from '../../../src/chat/reader/reader-defaults.ts';
import { FILE_LIMITS } from '../../../src/edge/files/file-limits.ts';
import { readFile } from '../../../src/edge/files/read-file.ts';
import { readImport } from '../../../src/edge/files/read-import.ts';
import { anyLog } from '../../chat/attachments/any-log.ts';
import { exportOf } from './export-of.ts';

const reading = { reader: READER_DEFAULTS, noting: { key: 'import:1', at: 0, by: 1 } };

const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const RELATIONS = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006/relationships';
const BOOK = {
  '[Content_Types].xml': strToU8('<Types/>'),
  'xl/workbook.xml': strToU8(
    `<workbook xmlns="${MAIN}" xmlns:r="${RELATIONS}"><sheets><sheet name="a" sheetId="1" r:id="r1"/></sheets></workbook>`,
  ),
  'xl/_rels/workbook.xml.rels': strToU8(
    `<Relationships xmlns="${PACKAGE}"><Relationship Id="r1" Type="${RELATIONS}/worksheet" Target="worksheets/sheet1.xml"/></Relationships>`,
  ),
};
const SHEET = 'xl/worksheets/sheet1.xml';
const sheetOf = (rows: string): Uint8Array =>
  zipSync({
    ...BOOK,
    [SHEET]: strToU8(`<worksheet xmlns="${MAIN}"><sheetData>${rows}</sheetData></worksheet>`),
  });
const row = (number: number): string => `<row r="${number}"><c r="A${number}"><v>1</v></c></row>`;

test('the spreadsheet that the others are made like is read', async () => {
  const cell = (at: string, text: string) => `<c r="${at}" t="inlineStr"><is><t>${text}</t></is></c>`;
  const rows = `<row r="1">${cell('A1', 'T4')}${cell('B1', '5200 L')}</row>`;
  expect(await readFile(sheetOf(rows), reading)).toMatchObject({ kind: 'vessels', vessels: 1 });
});

const lying = (): Uint8Array => {
  const bytes = sheetOf(row(1).repeat(1));
  // The size that a part says it unpacks to, in the list at the end of a zip: 24 bytes behind its mark.
  const view = Buffer.from(bytes);
  for (let at = view.indexOf('PK\u0001\u0002'); at >= 0; at = view.indexOf('PK\u0001\u0002', at + 4))
    view.writeUInt32LE(0xffff_fff0, at + 24);
  return view;
};

const CASES: [string, () => Uint8Array, string][] = [
  ['nothing', () => new Uint8Array(), 'empty'],
  ['blank lines', () => strToU8('\n \r\n\t\n'), 'empty'],
  ['a NUL in a text', () => strToU8('T4;5200 L\0;red'), 'not-a-table'],
  ['signs that steer a screen', () => strToU8('T4;5200 L;\u001B[2J'), 'not-a-table'],
  [
    'a picture',
    () => new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0, 0, 13]),
    'not-a-table',
  ],
  ['all bytes', () => Uint8Array.from({ length: 65_536 }, (_, i) => (i * 7 + 13) % 256), 'not-a-table'],
  [
    'a spreadsheet of before 2007',
    () => new Uint8Array([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]),
    'old-spreadsheet',
  ],
  ['one giant cell', () => strToU8(`vessel;volume\n"${'x'.repeat(400_000)}";5`), 'cell-too-long'],
  ['one giant word', () => strToU8('x'.repeat(400_000)), 'cell-too-long'],
  ['100,000 columns', () => strToU8(';'.repeat(100_000)), 'too-many-columns'],
  ['20,001 lines', () => strToU8('T4\n'.repeat(FILE_LIMITS.rows + 2)), 'too-many-rows'],
  ['a quotation mark that is never closed', () => strToU8('vessel;volume\n"T4;5200\n'), 'broken'],
  ['more than 512 kB of a list', () => strToU8('T4;5200 L;red\n'.repeat(40_000)), 'too-large'],
  ['more than 8 MB of anything', () => new Uint8Array(FILE_LIMITS.own_bytes + 1), 'too-large'],
  [
    'headings of ours above rows without end',
    () => strToU8(`[entry],[kind],[key],[at],[noted_at],[by],[vessels]\n${'1\n'.repeat(300_000)}`),
    'too-many-rows',
  ],
  ['a zip that is no spreadsheet', () => zipSync({ 'a.txt': strToU8('hello') }), 'not-a-table'],
  ['a spreadsheet cut off', () => sheetOf(row(1)).slice(0, 400), 'broken'],
  ['a spreadsheet whose XML is none', () => sheetOf('<row r="1"><c r="A1"><v>1<'), 'broken'],
  [
    'a zip that unpacks to 60 MB',
    () => zipSync({ ...BOOK, [SHEET]: new Uint8Array(60 * 1024 * 1024) }),
    'too-heavy',
  ],
  ['a zip that lies about its size', lying, 'too-heavy'],
  [
    'a cell in the far corner',
    () => sheetOf('<row r="1"><c r="XFD1"><v>1</v></c></row>'),
    'too-many-columns',
  ],
  ['a row at the far end', () => sheetOf(row(1_048_576)), 'too-many-rows'],
  [
    '20,002 rows',
    () => sheetOf(Array.from({ length: 20_003 }, (_, i) => row(i + 1)).join('')),
    'too-many-rows',
  ],
  [
    'an entity that grows',
    () =>
      zipSync({
        ...BOOK,
        [SHEET]: strToU8(
          '<!DOCTYPE x [<!ENTITY a "aaaa"><!ENTITY b "&a;&a;&a;">]><worksheet><sheetData><row r="1"><c r="A1" t="inlineStr"><is><t>&b;</t></is></c></row></sheetData></worksheet>',
        ),
      }),
    'no-vessels',
  ],
];

describe('a file that means harm, or is none, is a problem with a code and no exception', () => {
  test.each(CASES)('%s', async (_, file, code) => {
    const { kind, entries, problems } = await readFile(file(), reading);
    expect({ kind, entries, codes: problems.map((one) => one.code) }).toEqual({
      kind: 'nothing',
      entries: [],
      codes: [code],
    });
  });

  test('reading that takes too long is given up, and the next file is read', async () => {
    // A text of 20 MB in one cell, which the library that reads spreadsheets goes over again and again.
    const slow = sheetOf(
      `<row r="1"><c r="A1" t="inlineStr"><is><t>${'y'.repeat(20_000_000)}</t></is></c></row>`,
    );
    const [given, next] = await Promise.all([
      readImport(slow, reading, { time_ms: 2000 }),
      readImport(strToU8('T4;5200 L;red'), reading),
    ]);
    expect(given.problems).toEqual([{ code: 'too-heavy' }]);
    expect(next.vessels).toBe(1);
  });

  test('reading that would need more memory than it may have takes nothing else down', async () => {
    const [given, next] = await Promise.all([
      readImport(sheetOf(row(1)), reading, { memory_MB: 4 }),
      readImport(strToU8('T4;5200 L;red'), reading),
    ]);
    expect(given.problems).toEqual([{ code: 'too-heavy' }]);
    expect(next.vessels).toBe(1);
  });
});

test('a file of our own with any bytes of it changed is read or refused, and never throws', async () => {
  const csv = await exportOf(anyLog(20, 8));
  const xlsx = await exportOf(anyLog(20, 8), { format: 'xlsx' });
  const bytes = fc.constantFrom(csv, xlsx);
  const hits = fc.array(fc.tuple(fc.nat(), fc.nat(255)), { minLength: 1, maxLength: 8 });
  await fc.assert(
    fc.asyncProperty(bytes, hits, async (file, changes) => {
      const changed = Uint8Array.from(file);
      for (const [at, byte] of changes) changed[at % changed.length] = byte;
      const { kind, problems } = await readFile(changed, reading);
      expect(kind === 'nothing' || problems.length > 0 || kind === 'log').toBe(true);
    }),
    { numRuns: 150 },
  );
});

test('any text is a list, or is refused, and never throws', async () => {
  const line = fc.array(
    fc.oneof(
      fc.constantFrom(
        'T4',
        'B1-B9',
        '5200 L',
        '5.200',
        '"',
        ';',
        ',',
        '\t',
        'red',
        'lot',
        'capacity',
        '%',
        '\n',
        '=1',
        '🍷',
      ),
      fc.string(),
    ),
    { maxLength: 40 },
  );
  await fc.assert(
    fc.asyncProperty(line, async (parts) => {
      const read = await readFile(strToU8(parts.join(' ')), reading);
      expect(read.vessels > 0).toBe(read.problems.length === 0);
    }),
    { numRuns: 300 },
  );
});
