import type { Entry } from '../../core/cellar/entry.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import type { TableCell } from './cell.ts';
import { cellText, isBlank } from './cell-text.ts';
import type { RecordColumn } from './columns.ts';
import { entryOfFields } from './entry-of-fields.ts';
import type { EntryField } from './entry-fields.ts';
import type { FieldValue } from './fields-of-entry.ts';
import { isText, readField } from './read-field.ts';

/** An entry as it stands in a file: with its line, who noted it, and what took it back. */
export interface LogRow {
  readonly entry: Entry;
  readonly line: number; // counted from 1: a position
  readonly name?: string;
  readonly struck_by?: number; // the number of an entry
}

/** The longest name of a person that is kept, in UTF-16 units; own threshold. */
const LONGEST_NAME = 200;

/** The entry of a row; undefined where a cell holds what its column cannot, or the cells make no entry. */
export function readLogRow(
  cells: readonly TableCell[],
  columns: readonly (RecordColumn | undefined)[],
  mark: DecimalMark,
): Omit<LogRow, 'line'> | undefined {
  const fields: Partial<Record<EntryField, FieldValue>> = {};
  let name: string | undefined;
  let struck_by: number | undefined;
  for (const [i, cell] of cells.entries()) {
    const column = columns[i];
    if (column === undefined) {
      // A cell beside all columns: the line was cut wrongly, and no figure in it can be trusted.
      if (i >= columns.length && !isBlank(cell)) return undefined;
      continue;
    }
    if (isBlank(cell)) continue;
    if (column === 'name') {
      name = cellText(cell);
      if (!isText(name, LONGEST_NAME)) return undefined;
      continue;
    }
    const value = readField(column === 'struck_by' ? 'corrects' : column, cell, mark);
    if (value === undefined) return undefined;
    if (column === 'struck_by') struck_by = Number(value);
    else fields[column] = value;
  }
  const entry = entryOfFields(fields);
  return (
    entry && { entry, ...(name !== undefined && { name }), ...(struck_by !== undefined && { struck_by }) }
  );
}
