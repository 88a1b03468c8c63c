import { stringify } from 'csv-stringify/sync';
import type { Cell, Sheet } from '../../chat/attachments/cell.ts';
import type { DecimalMark } from '../../chat/replies/number-text.ts';
import { markMarked } from './formula-mark.ts';

/**
 * A sheet as CSV that a spreadsheet opens by a double click: UTF-8 with its mark, lines ended as RFC 4180 has them,
 * and where numbers have a decimal comma the cells parted by semicolons. No text can become a formula.
 */
export function writeCsv(sheet: Sheet, mark: DecimalMark): Uint8Array {
  const text = stringify([sheet.columns.map(({ heading }) => heading), ...sheet.rows.map(plain)], {
    bom: true,
    delimiter: mark === ',' ? ';' : ',',
    record_delimiter: '\r\n',
    escape_formulas: true,
    // A lone line feed or carriage return too, as readers differ in what ends a line.
    quoted_match: /^\s|\s$|[\r\n]/,
    cast: { number: (value) => String(value).replace('.', mark) },
  });
  return new TextEncoder().encode(text);
}

function plain(row: readonly Cell[]): (string | number | undefined)[] {
  return row.map((cell) => {
    if (typeof cell === 'string') return markMarked(cell);
    return typeof cell === 'object' ? wallTime(cell.local_ms) : cell;
  });
}

/** `2026-11-12 10:42`: every spreadsheet reads it as a time, and as text it sorts too. */
function wallTime(local_ms: number): string {
  return new Date(local_ms).toISOString().slice(0, 16).replace('T', ' ');
}
