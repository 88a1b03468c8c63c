import { readSheet } from 'read-excel-file/universal';
import type { Table, TableCell } from '../../chat/attachments/cell.ts';
import { checkExtent } from './check-extent.ts';
import { FileFault } from './file-fault.ts';
import { FILE_LIMITS } from './file-limits.ts';
import { unpackXlsx } from './unpack-xlsx.ts';

/** The cells of the first sheet of a spreadsheet. Throws a `FileFault` for what is none, is broken, or is too big. */
export async function readXlsx(bytes: Uint8Array): Promise<Table> {
  const { sheets, texts, plain } = unpackXlsx(bytes);
  if (bytes.length > FILE_LIMITS.bytes && !holdsOwnHeadings(texts)) throw new FileFault('too-large');
  for (const sheet of sheets) checkExtent(sheet);
  // Its type says that a date is the constructor of dates.
  const rows: unknown[][] = await readSheet(new Blob([new Uint8Array(plain)]), 1, { trim: false }).catch(
    (cause: unknown) => {
      throw new FileFault('broken', { cause });
    },
  );
  return { rows: rows.map((row) => row.map(plainCell)) };
}

/** Only our own export may be large: the first texts in it are its headings. */
function holdsOwnHeadings(texts: Uint8Array): boolean {
  return new TextDecoder().decode(texts.subarray(0, BEGINNING_bytes)).includes('[noted_at]');
}

const BEGINNING_bytes = 16_384;

function plainCell(cell: unknown): TableCell {
  if (typeof cell === 'string' || typeof cell === 'number' || cell instanceof Date) return cell;
  return typeof cell === 'boolean' ? String(cell) : undefined;
}
