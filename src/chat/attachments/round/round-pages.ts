import type { RoundRow } from './round-sheet.ts';

/** Rows of a picture: a phone shows them all at once and still to be read. */
const ROWS_A_PAGE = 20;

/** More pictures than this nobody looks through: the file has all. */
export const MOST_PAGES = 10;

/** The rows with an amount in pages of a picture each; at least one page. */
export function roundPages(rows: readonly RoundRow[]): RoundRow[][] {
  const done = rows.filter(({ is }) => is !== 'open');
  const count = Math.max(1, Math.min(MOST_PAGES, Math.ceil(done.length / ROWS_A_PAGE)));
  return Array.from({ length: count }, (_, at) => done.slice(at * ROWS_A_PAGE, (at + 1) * ROWS_A_PAGE));
}
