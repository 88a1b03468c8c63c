import type { Table, TableCell } from './cell.ts';
import { cellText } from './cell-text.ts';
import { COLUMNS } from './columns.ts';
import type { RecordColumn } from './columns.ts';

/** Where the headings of our own export stand in a table, and what each column is. */
export interface HeadingRow {
  readonly index: number;
  /** Undefined for a column that is for the eye. */
  readonly columns: readonly (RecordColumn | undefined)[];
  /** Names in brackets that we do not know, or that stand there twice. */
  readonly unknown: readonly string[];
  /** Columns without which no entry can be read; others may be younger than the file. */
  readonly missing: readonly string[];
}

/** Columns without which a table is no export of ours, and so many of them show that it wants to be one. */
const NEEDED: readonly RecordColumn[] = ['entry', 'kind', 'key', 'at', 'noted_at', 'by', 'vessels'];
const ENOUGH = 4;
/** Somebody may have put a title above; own threshold. */
const MOST_ROWS_ABOVE = 10;

const RECORDS: ReadonlyMap<string, RecordColumn> = new Map(
  COLUMNS.flatMap((column) => ('record' in column ? [[column.record, column.record] as const] : [])),
);

const bracketed = (cell: TableCell): string | undefined => /\[(\w+)\]\s*$/.exec(cellText(cell))?.[1];

/** The headings of our own export, in whatever language; undefined where a table is something else. */
export function headingRowOf({ rows }: Pick<Table, 'rows'>): HeadingRow | undefined {
  for (const [index, row] of rows.slice(0, MOST_ROWS_ABOVE).entries()) {
    const names = row.map(bracketed);
    const there = NEEDED.filter((name) => names.includes(name));
    if (there.length < ENOUGH) continue;
    return {
      index,
      columns: names.map((name) => RECORDS.get(name ?? '')),
      unknown: names.flatMap((name, i) =>
        name !== undefined && (!RECORDS.has(name) || names.indexOf(name) !== i) ? [name] : [],
      ),
      missing: NEEDED.filter((name) => !names.includes(name)),
    };
  }
  return undefined;
}
