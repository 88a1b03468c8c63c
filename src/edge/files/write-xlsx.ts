import writeXlsxFile from 'write-excel-file/node';
import type { CellObject } from 'write-excel-file/node';
import type { Cell, Sheet } from '../../chat/attachments/cell.ts';
import { escapeXlsx } from './xlsx-text.ts';

/**
 * A sheet as a spreadsheet's own file: numbers and times are numbers and times, texts are never formulas, the headings
 * stay in sight, and what was taken back is struck out.
 */
export async function writeXlsx({ columns, rows, struck }: Sheet): Promise<Uint8Array> {
  const headings = columns.map(({ heading }): CellObject => ({
    value: escapeXlsx(heading),
    type: String,
    fontWeight: 'bold',
    wrap: true,
    alignVertical: 'top',
  }));
  const body = rows.map((row, r) =>
    row.map((cell, c): CellObject | null => {
      const written = cellObject(cell, columns[c]?.decimals);
      return written && struck[r] === true
        ? { ...written, textDecoration: { strikethrough: true } }
        : written;
    }),
  );
  return writeXlsxFile([headings, ...body], {
    sheet: 'log',
    columns: columns.map(({ letters }) => ({ width: letters })),
    stickyRowsCount: 1,
  }).toBuffer();
}

function cellObject(cell: Cell, decimals: number | undefined): CellObject | null {
  if (cell === undefined || cell === '') return null;
  if (typeof cell === 'string') return { value: escapeXlsx(cell), type: String };
  if (typeof cell === 'object')
    return { value: new Date(cell.local_ms), type: Date, format: 'yyyy-mm-dd hh:mm' };
  return { value: cell, type: Number, ...(decimals !== undefined && { format: shownTo(decimals) }) };
}

/** `0.00` shows two decimals; the cell keeps them all. */
const shownTo = (decimals: number): string => `0.${'0'.repeat(decimals)}`;
