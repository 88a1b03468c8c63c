import type { Table } from '../../chat/attachments/cell.ts';
import { headingRowOf } from '../../chat/attachments/heading-row.ts';
import type { ImportRead } from '../../chat/attachments/import-read.ts';
import { nothingRead } from '../../chat/attachments/import-read.ts';
import { readTable } from '../../chat/attachments/read-table.ts';
import type { ListReading } from '../../chat/attachments/read-vessels.ts';
import { decodeText } from './decode-text.ts';
import { FileFault } from './file-fault.ts';
import { FILE_LIMITS } from './file-limits.ts';
import { readCsv } from './read-csv.ts';
import { readXlsx } from './read-xlsx.ts';

/** What a file holds. It never throws for what is in the file; it may take long, and more memory than there is. */
export async function readFile(bytes: Uint8Array, reading: ListReading): Promise<ImportRead> {
  try {
    const table = await tableOf(bytes);
    checkTable(table, bytes.length);
    return readTable(table, reading);
  } catch (fault) {
    if (fault instanceof FileFault) return nothingRead(fault.code);
    throw fault;
  }
}

const ZIP = [0x50, 0x4b, 0x03, 0x04];
/** Compound files: spreadsheets of before 2007, and those that a password locks. */
const COMPOUND = [0xd0, 0xcf, 0x11, 0xe0];
const begins = (bytes: Uint8Array, mark: readonly number[]): boolean =>
  mark.every((byte, i) => bytes[i] === byte);

async function tableOf(bytes: Uint8Array): Promise<Table> {
  if (bytes.length === 0) throw new FileFault('empty');
  if (bytes.length > FILE_LIMITS.own_bytes) throw new FileFault('too-large');
  if (begins(bytes, COMPOUND)) throw new FileFault('old-spreadsheet');
  if (begins(bytes, ZIP)) return readXlsx(bytes);
  const text = decodeText(bytes);
  // Only our own export may be long: its headings tell it before the rest is read.
  if (bytes.length > FILE_LIMITS.bytes) {
    const beginning = readCsv(text.slice(0, BEGINNING).replace(/[\r\n][^\r\n]*$/, ''));
    if (headingRowOf(beginning) === undefined) throw new FileFault('too-large');
  }
  return readCsv(text);
}

/** So many letters hold the headings of our own export, and a title above. */
const BEGINNING = 16_384;

function checkTable(table: Table, bytes: number): void {
  const isOwn = headingRowOf(table) !== undefined;
  if (bytes > FILE_LIMITS.bytes && !isOwn) throw new FileFault('too-large');
  // Headings stand above the rows; a line end stands below them.
  const rows = isOwn ? table.rows.length : Math.max(table.rows.length, table.lines?.length ?? 0);
  if (rows > FILE_LIMITS.rows + 2) throw new FileFault('too-many-rows');
  for (const row of table.rows) {
    if (row.length > FILE_LIMITS.columns) throw new FileFault('too-many-columns');
    if (row.some((cell) => typeof cell === 'string' && cell.length > FILE_LIMITS.letters))
      throw new FileFault('cell-too-long');
  }
}
