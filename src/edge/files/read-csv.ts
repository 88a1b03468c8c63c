import { CsvError, parse } from 'csv-parse/sync';
import type { Table } from '../../chat/attachments/cell.ts';
import { delimiterOf } from './delimiter-of.ts';
import { FileFault } from './file-fault.ts';
import { FILE_LIMITS } from './file-limits.ts';
import { unmark } from './formula-mark.ts';

/** The cells of a text whose lines are rows. Throws a `FileFault` for one that is too big or ends within a cell. */
export function readCsv(text: string): Table {
  const delimiter = delimiterOf(text);
  let rows: string[][];
  try {
    rows = parse(text, {
      delimiter,
      record_delimiter: ['\r\n', '\n', '\r'],
      relax_column_count: true,
      relax_quotes: true,
      // More than may be, so that too many are noticed.
      to: FILE_LIMITS.rows + 3,
      max_record_size: FILE_LIMITS.columns * FILE_LIMITS.letters,
    });
  } catch (cause) {
    if (!(cause instanceof CsvError)) throw cause;
    throw new FileFault(cause.code === 'CSV_MAX_RECORD_SIZE' ? 'cell-too-long' : 'broken', { cause });
  }
  return {
    rows: rows.map((row) => row.map(unmark)),
    delimiter,
    lines: text.split(/\r\n|\n|\r/),
  };
}
