import { readSheet } from 'read-excel-file/universal';
import type { Table, TableCell } from '../../chat/attachments/cell.ts';
import { checkExtent } from './check-extent.ts';
import { FileFault } from './file-fault.ts';
import { unpackXlsx } from './unpack-xlsx.ts';

/** The cells of the first sheet of a spreadsheet. Throws a `FileFault` for what is none, is broken, or is too big. */
export async function readXlsx(bytes: Uint8Array): Promise<Table> {
  const { sheets, plain } = unpackXlsx(bytes);
  for (const sheet of sheets) checkExtent(sheet);
  // Its type says that a date is the constructor of dates.
  const rows: unknown[][] = await readSheet(new Blob([new Uint8Array(plain)]), 1, { trim: false }).catch(
    (cause: unknown) => {
      throw new FileFault('broken', { cause });
    },
  );
  return { rows: rows.map((row) => row.map(plainCell)) };
}

function plainCell(cell: unknown): TableCell {
  if (typeof cell === 'string' || typeof cell === 'number' || cell instanceof Date) return cell;
  return typeof cell === 'boolean' ? String(cell) : undefined;
}
