import { MOST_LINES, readSheetText } from '../../reader/read-message.ts';
import type { ReaderSettings } from '../../reader/understood.ts';
import type { Table } from '../cell.ts';
import { cellText, isBlank } from '../cell-text.ts';
import type { RoundInFile } from '../import-read.ts';
import type { ListReading } from '../read-vessels.ts';
import { readRoundHeadings, roundLine } from './round-line.ts';

/** A line of the file as a line of a message; undefined where it is none. */
interface Written {
  readonly text: string | undefined;
  readonly line: number; // a position
}

/**
 * The readings of a table as the lines of a round: by its headings, or as they stand there where a text file has none. The
 * reader judges them then as it judges a message. Undefined where fewer than two vessels have readings, or where anything
 * is told as done.
 */
export function readRoundTable(table: Table, { reader }: ListReading): RoundInFile | undefined {
  const written = table.rows.length > MOST_LINES + 2 ? [] : writtenLines(table, reader);
  const lines = written.flatMap(({ text }) => text ?? []);
  if (lines.length < 2 || lines.length > MOST_LINES) return undefined;
  const text = lines.join('\n');
  const { readings, shared } = readSheetText(text, reader);
  const measured = readings.filter(
    ({ fields }) => fields.ph !== undefined || fields.free_mg_L !== undefined || fields.target !== undefined,
  );
  const isOther = readings.some(
    ({ intent, problems }) => problems.length === 0 && intent !== 'dose' && intent !== 'reading',
  );
  if (measured.length < 2 || isOther) return undefined;
  const asksDose = [shared, ...readings.map(({ fields }) => fields)].some(
    ({ target, additive }) => target !== undefined || additive !== undefined,
  );
  return {
    text,
    count: readings.length,
    means: asksDose ? 'dose' : 'either',
    format: table.lines === undefined ? 'xlsx' : 'csv',
    left: written.flatMap(({ text: own, line }) => (own === undefined ? line : [])),
  };
}

function writtenLines({ rows, lines }: Table, settings: ReaderSettings): Written[] {
  const first = rows.findIndex((row) => !row.every(isBlank));
  const headings = readRoundHeadings(rows[first] ?? []);
  if (headings === undefined) {
    const own = lines ?? rows.map((row) => row.map(cellText).join(', '));
    return own.flatMap((text, i) => (text.trim() === '' ? [] : [{ text: text.trim(), line: i + 1 }]));
  }
  return rows
    .slice(first + 1)
    .flatMap((cells, i) =>
      cells.every(isBlank) ? [] : [{ text: roundLine(cells, headings, settings), line: first + i + 2 }],
    );
}
