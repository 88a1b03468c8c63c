import type { Person } from '../../core/cellar/cellar-store.ts';
import type { Entry } from '../../core/cellar/entry.ts';
import { touches } from '../../core/cellar/touches.ts';
import type { Table } from './cell.ts';
import { isBlank } from './cell-text.ts';
import { decimalMarkOf } from './decimal-mark-of.ts';
import { FIELD_FORMS } from './entry-fields.ts';
import type { HeadingRow } from './heading-row.ts';
import { nothingRead } from './import-read.ts';
import type { ImportProblem, ImportRead } from './import-read.ts';
import { readLogRow } from './read-log-row.ts';
import type { LogRow } from './read-log-row.ts';

/** The entries of our own export, in the order of their numbers. Beside anything that is wrong nothing can be taken. */
export function readLog(table: Table, heading: HeadingRow): ImportRead {
  if (heading.unknown.length > 0)
    return nothingRead('columns-unknown', { about: heading.unknown.join(', ') });
  if (heading.missing.length > 0)
    return nothingRead('columns-missing', { about: heading.missing.join(', ') });
  const body = table.rows.slice(heading.index + 1);
  const numeric = heading.columns.flatMap((column, i) =>
    column !== undefined &&
    column in FIELD_FORMS &&
    FIELD_FORMS[column as keyof typeof FIELD_FORMS].is === 'number'
      ? [i]
      : [],
  );
  const mark = decimalMarkOf(
    body.flatMap((row) => numeric.map((i) => row[i])),
    table.delimiter,
  );
  if (mark === undefined) return nothingRead('unclear-numbers');

  const rows: LogRow[] = [];
  const notUnderstood: number[] = [];
  for (const [i, cells] of body.entries()) {
    if (cells.every(isBlank)) continue;
    const line = heading.index + i + 2;
    const row = readLogRow(cells, heading.columns, mark);
    if (row === undefined) notUnderstood.push(line);
    else rows.push({ ...row, line });
  }
  rows.sort((a, b) => a.entry.entry - b.entry.entry);
  if (rows.length + notUnderstood.length === 0) return nothingRead('empty');
  const entries = rows.map(({ entry }) => entry);
  return {
    kind: 'log',
    entries,
    lines: rows.map(({ line }) => line),
    people: peopleOf(rows),
    vessels: new Set(entries.flatMap(touches)).size,
    notUnderstood,
    notTaken: [],
    problems: problemsOf(rows, notUnderstood),
  };
}

function peopleOf(rows: readonly LogRow[]): Person[] {
  const names = new Map<number, string | undefined>();
  for (const { entry, name } of rows) names.set(entry.by, name ?? names.get(entry.by));
  return [...names]
    .toSorted(([a], [b]) => a - b)
    .map(([number, name]) => (name === undefined ? { number } : { number, name }));
}

function problemsOf(rows: readonly LogRow[], notUnderstood: readonly number[]): ImportProblem[] {
  const numbers = new Map(rows.map(({ entry }) => [entry.entry, entry]));
  const keys = new Set<string>();
  const seen = new Set<number>();
  const doubled = rows.filter(({ entry }) => {
    const isAgain = keys.has(entry.key) || seen.has(entry.entry);
    keys.add(entry.key);
    seen.add(entry.entry);
    return isAgain;
  });
  const outside = rows.filter((row) => refersOutside(row, numbers));
  const found = (code: ImportProblem['code'], lines: readonly number[]): ImportProblem[] =>
    lines.length === 0 ? [] : [{ code, lines: lines.toSorted((a, b) => a - b) }];
  return [
    ...found('not-understood', notUnderstood),
    ...found('doubled', linesOf(doubled)),
    ...found('refers-outside', linesOf(outside)),
  ];
}

const linesOf = (rows: readonly LogRow[]): number[] => rows.map(({ line }) => line);

/** Whether an entry names one that is not before it in the file, or was taken back by one that is not in it. */
function refersOutside({ entry, struck_by }: LogRow, entries: ReadonlyMap<number, Entry>): boolean {
  if (entry.kind === 'correction' && !(entry.corrects < entry.entry && entries.has(entry.corrects)))
    return true;
  if (entry.kind === 'addition' && entry.order !== undefined) {
    if (!(entry.order < entry.entry && entries.has(entry.order))) return true;
  }
  if (struck_by === undefined) return false;
  const by = entries.get(struck_by);
  return !(by?.kind === 'correction' && by.corrects === entry.entry);
}
