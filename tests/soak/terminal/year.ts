/**
 * `node tests/soak/terminal/year.ts [ENTRIES]`: a year that was written in words goes out of the program as CSV and as
 * XLSX, is read by libraries that know nothing of us, comes into an empty cellar, and goes out of that one the same.
 */
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { isDeepStrictEqual } from 'node:util';
import Papa from 'papaparse';
import { readSheet } from 'read-excel-file/node';
import type { LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { openSqliteReader } from '../../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { differences, type ForeignRow } from '../../edge/files/cells-of-entry.ts';
import { runProgram } from './typing.ts';

const [entries = 5000] = process.argv.slice(2).map(Number);
const BEGIN = Date.UTC(2026, 0, 2, 6);
const END = Date.UTC(2026, 11, 30, 18);
const HANDS = ['Ines', 'Tomas', 'Nora'];

/** What somebody writes as the `k`th message of the year; now and then a remark that a spreadsheet might reckon with. */
function messageAt(k: number): string {
  const vessel = `T${1 + ((k * 7) % 60)}`;
  const remark = k % 11 === 0 ? ` note: =1+${k} "twice"; and, so` : '';
  if (k % 17 === 0) return `racked ${vessel} ${4000 + (k % 900)} L`;
  if (k % 13 === 0) return `strike ${k - 5} bag was short`;
  if (k % 29 === 0) return `order ${vessel} ${50 + (k % 100)} g kmbs`;
  if (k % 31 === 0) return `added 2 kg bentonite ${vessel}`;
  if (k % 2 === 0) return `added ${(1000 + k) / 10} g kmbs ${vessel} lot ${4000 + (k % 7)}${remark}`;
  return `${vessel} now free ${10 + (k % 30)} total ${60 + (k % 80)} pH ${(3.2 + (k % 60) / 100).toFixed(2)}${remark}`;
}

function lineAt(k: number): string {
  const at = new Date(BEGIN + Math.floor(((END - BEGIN) / entries) * k)).toISOString();
  return JSON.stringify({
    id: String(k),
    chat: 'year',
    person: HANDS[k % HANDS.length],
    at,
    text: messageAt(k),
  });
}

/** The log of a file, and what people are called in it. */
async function logOf(
  file: string,
): Promise<{ log: readonly LoggedEntry[]; names: ReadonlyMap<number, string> }> {
  const reader = await openSqliteReader(file, { now: () => END });
  try {
    return await reader.look('cellar', async (view) => ({
      log: await view.entries({}),
      names: new Map((await view.people()).map(({ number, name = '' }) => [number, name])),
    }));
  } finally {
    await reader.close();
  }
}

/** A log by people's names: whoever brings it into another cellar is the first there, and has that number. */
const byName = ({ log, names }: Awaited<ReturnType<typeof logOf>>): object[] =>
  log.map((entry) => ({ ...entry, by: names.get(entry.by) }));

const withoutNumbers = (rows: readonly ForeignRow[]): object[] =>
  rows.map((row) => Object.fromEntries(Object.entries(row).filter(([heading]) => !heading.endsWith('[by]'))));

/** Asks the program for an export, and gives its bytes. */
async function exportOf(file: string, format: 'csv' | 'xlsx'): Promise<Buffer> {
  const said = await runProgram('main.ts', [], { dataFile: file, input: `export 2026 as ${format}\n\n` });
  const path = /Written: (\S+)/.exec(said)?.[1];
  if (path === undefined) throw new Error(`no export: ${said}`);
  return readFileSync(path);
}

const sheetOf = (file: string, day: string): Promise<string> =>
  runProgram('main.ts', [], { dataFile: file, input: `${day}\n\n` });

async function rowsOf(bytes: Buffer, format: 'csv' | 'xlsx'): Promise<readonly ForeignRow[]> {
  if (format === 'csv')
    return Papa.parse<ForeignRow>(bytes.toString().slice(1), { header: true, skipEmptyLines: true }).data;
  const [headings = [], ...cells]: unknown[][] = await readSheet(bytes, 1, { trim: false });
  return cells.map((row) => Object.fromEntries(row.map((cell, at) => [String(headings[at]), cell])));
}

const folder = mkdtempSync(join(tmpdir(), 'brimnote-year-'));
const file = join(folder, 'first', 'cellar.db');
const wrong: string[] = [];
try {
  const lines = Array.from({ length: entries }, (_, k) => lineAt(k));
  await runProgram('ask.ts', ['--jsonl', '--data', file], { input: `${lines.join('\n')}\n` });
  const kept = await logOf(file);
  const { log } = kept;
  const exported = { csv: await exportOf(file, 'csv'), xlsx: await exportOf(file, 'xlsx') };
  const sheet = withoutNumbers(await rowsOf(exported.csv, 'csv'));
  for (const format of ['csv', 'xlsx'] as const) {
    const rows = await rowsOf(exported[format], format);
    if (rows.length !== log.length) wrong.push(`${format}: ${rows.length} rows of ${log.length} entries`);
    const writing = format === 'csv' ? ({ apostrophe: true } as const) : {};
    wrong.push(...log.flatMap((entry, at) => differences(entry, rows[at] ?? {}, writing)));

    const other = join(folder, format, 'cellar.db');
    const name = join(dirname(file), 'exports', `cellar-2026.${format}`);
    await runProgram('main.ts', [], { dataFile: other, input: `import ${name}\n\n1\n\n` });
    if (!isDeepStrictEqual(byName(await logOf(other)), byName(kept)))
      wrong.push(`another log after ${format}`);
    const again = withoutNumbers(await rowsOf(await exportOf(other, 'csv'), 'csv'));
    if (!isDeepStrictEqual(again, sheet)) wrong.push(`another sheet after ${format}`);
    for (const day of ['5 Mar 2026', '17 Aug 2026'])
      if ((await sheetOf(other, day)) !== (await sheetOf(file, day)))
        wrong.push(`another ${day} after ${format}`);
  }
  process.stdout.write(
    `year: ${log.length} entries, CSV ${exported.csv.length} bytes, XLSX ${exported.xlsx.length} bytes, ` +
      `${wrong.length} differences\n`,
  );
} finally {
  rmSync(folder, { recursive: true });
}
for (const one of wrong.slice(0, 20)) process.stdout.write(`  ${one.slice(0, 500)}\n`);
process.exitCode = wrong.length === 0 ? 0 : 1;
