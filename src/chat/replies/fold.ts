import type { Line } from './reply.ts';

/** Letters in a row that a small phone shows. */
export const PHONE_COLUMNS = 45;
/** Rows of it that a reply may take. */
export const MOST_ROWS = 25;

/** A line with its finished text. */
export interface SpokenLine {
  readonly line: Pick<Line, 'room'>;
  readonly text: string;
}

/**
 * How many rows of `columns` letters a text takes when words are wrapped whole.
 *
 * @example
 * ```ts
 * rowsOf('one two', 45) // => 1
 * rowsOf('one two', 4) // => 2
 * rowsOf('a\nb', 45) // => 2
 * ```
 */
export function rowsOf(text: string, columns: number): number {
  // Most texts have no letter that counts as two.
  const hasPairs = /[\uD800-\uDFFF]/.test(text);
  let rows = 0;
  for (const paragraph of text.split('\n')) {
    rows += 1;
    let used = 0;
    for (const word of paragraph.split(' ')) {
      const length = hasPairs ? Array.from(word).length : word.length;
      if (used > 0 && used + 1 + length > columns) {
        rows += 1;
        used = length;
      } else used += (used > 0 ? 1 : 0) + length;
    }
  }
  return rows;
}

const textOf = (lines: readonly SpokenLine[]): string => lines.map(({ text }) => text).join('\n');

/**
 * The text of a reply: a line a row, and where that is more than a phone shows, first the working, then the
 * warnings but the weightiest, then that one too stand behind the button `More`. Cautions and assumptions always stay.
 *
 * @example
 * ```ts
 * fold([{ line: { room: 'first' }, text: 'a' }, { line: { room: 'working' }, text: 'b' }], () => 'more') // => "a\nb"
 * ```
 */
export function fold(lines: readonly SpokenLine[], saidOfFolded: () => string): string {
  const isFoldable = ({ line }: SpokenLine): boolean => line.room === 'working' || line.room === 'warning';
  const whole = textOf(lines);
  if (rowsOf(whole, PHONE_COLUMNS) <= MOST_ROWS || !lines.some(isFoldable)) return whole;
  const note: SpokenLine = { line: { room: 'working' }, text: saidOfFolded() };
  const withoutWorking = lines.filter(({ line }) => line.room !== 'working');
  const folded = textOf([...withoutWorking, note]);
  if (rowsOf(folded, PHONE_COLUMNS) <= MOST_ROWS) return folded;
  const firstWarning = lines.find(({ line }) => line.room === 'warning');
  const withWarning = (kept: SpokenLine | undefined): string =>
    textOf([...withoutWorking.filter((one) => one.line.room !== 'warning' || one === kept), note]);
  const withOne = withWarning(firstWarning);
  return rowsOf(withOne, PHONE_COLUMNS) <= MOST_ROWS ? withOne : withWarning(undefined);
}
