import type { Person } from '../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import { stockMove } from '../../core/cellar/stock-move.ts';
import { touches } from '../../core/cellar/touches.ts';
import type { Cell, Sheet, SheetColumn } from './cell.ts';
import { COLUMNS } from './columns.ts';
import type { Column, RecordColumn } from './columns.ts';
import { FIELD_FORMS } from './entry-fields.ts';
import { exactTime } from './exact-time.ts';
import type { ExportWords } from './export-words.ts';
import { fieldsOfEntry } from './fields-of-entry.ts';
import { joinNames } from './name-list.ts';
import { SHOWN_CELLS } from './shown-cells.ts';
import type { RecordRow } from './shown-cells.ts';
import { stockThen } from './stock-then.ts';
import { wineThen } from './wine-then.ts';

/** What is taken away: times in milliseconds since 1970, `from` included and `to` not; one vessel, or all. */
export interface ExportSpan {
  readonly from?: number;
  readonly to?: number;
  readonly vessel?: string;
  /** Only what did something to the chemical store. */
  readonly of?: 'stock';
}

/** What a sheet is made of. */
export interface SheetSource {
  /** The entries from the beginning of the log on: what was known of a wine follows from them. */
  readonly entries: readonly LoggedEntry[];
  /** Which of them get a row; all where it is left out. */
  readonly wanted?: ExportSpan;
  readonly people: readonly Person[];
  /** The time zone whose clock the times are told by. */
  readonly zone: string;
  readonly words: ExportWords;
}

/**
 * The sheet of a cellar's entries, a row each in the order of their numbers. A column that is read again has its name
 * in brackets behind the heading: `Free SO2 mg/L [free_mg_L]`, the same in every language.
 */
export function makeSheet({ entries, wanted, people, zone, words }: SheetSource): Sheet {
  const known = wineThen(entries);
  const left = stockThen(entries);
  const names = new Map(people.map(({ number, name }) => [number, name]));
  const rows = entries
    .filter((entry) => isWanted(entry, wanted))
    .filter((entry) => wanted?.of !== 'stock' || left.has(entry.entry) || isStruckMove(entry))
    .toSorted((a, b) => a.entry - b.entry)
    .map((entry) => {
      const name = names.get(entry.by);
      const person = name ?? words.unnamed[entry.by] ?? String(entry.by);
      return {
        entry,
        zone,
        person,
        wine: known.get(entry.entry) ?? {},
        left: left.get(entry.entry),
        words: words.words,
        name,
      };
    });
  return {
    columns: COLUMNS.map((column) => columnOf(column, words)),
    rows: rows.map((row) => cellsOf(row, row.name)),
    struck: rows.map(({ entry }) => entry.struck !== undefined),
  };
}

function isWanted(entry: LoggedEntry, { from, to, vessel }: ExportSpan = {}): boolean {
  const isThen = entry.at >= (from ?? -Infinity) && entry.at < (to ?? Infinity);
  return isThen && (vessel === undefined || touches(entry).includes(vessel));
}

/** What was taken back stays in the sheet of the store too. */
const isStruckMove = (entry: LoggedEntry): boolean =>
  entry.struck !== undefined && stockMove(entry) !== undefined;

function columnOf(column: Column, { words }: ExportWords): SheetColumn {
  const { letters, decimals } = column;
  const heading = 'shown' in column ? words[column.shown] : `${words[column.record]} [${column.record}]`;
  return { heading, letters, ...(decimals !== undefined && { decimals }) };
}

function cellsOf(row: RecordRow, name: string | undefined): Cell[] {
  const fields = fieldsOfEntry(row.entry);
  const recordCell = (column: RecordColumn): Cell => {
    if (column === 'name') return name;
    if (column === 'struck_by') return row.entry.struck?.entry;
    const value = fields[column];
    if (typeof value === 'boolean') return value ? 'yes' : 'no';
    if (typeof value === 'object') return joinNames(value);
    if (typeof value === 'number' && FIELD_FORMS[column].is === 'time') return exactTime(value, row.zone);
    return value;
  };
  return COLUMNS.map((column) =>
    'shown' in column ? SHOWN_CELLS[column.shown](row) : recordCell(column.record),
  );
}
