import type { Board } from '../board.ts';
import { hasTag, isCue, isFree, isMark, termAt } from '../board.ts';
import { MASS_UNITS, VOLUME_UNITS, concentrationAt, unitAt } from '../units.ts';

/** One vessel as it stands in the text. */
export interface Named {
  readonly name: string;
  readonly kind: string;
  readonly number?: number;
  readonly from: number;
  readonly to: number;
}

/** Whether a whole number that could be a vessel's stands at `i`. */
export const isWholeAt = (board: Board, i: number): boolean =>
  isFree(board, i) && termAt(board, i).value === undefined && /^\d{1,4}$/.test(termAt(board, i).text);

/** Whether the number at `i` is a figure with a unit of its own, so that no vessel word may claim it. */
export function hasOwnUnit(board: Board, i: number): boolean {
  return (
    unitAt(board, i + 1, VOLUME_UNITS) !== undefined ||
    unitAt(board, i + 1, MASS_UNITS) !== undefined ||
    concentrationAt(board, i + 1) !== undefined ||
    isMark(board, i + 1, '%') ||
    isMark(board, i + 1, '°') ||
    (isCue(board, i + 1, 'thousand') && termAt(board, i + 1).gap === false) ||
    (isMark(board, i + 1, '/') && !termAt(board, i + 1).gap)
  );
}

/** What kind of vessel the word at `i` names. */
export const kindOf = (board: Board, i: number): string | undefined => {
  if (hasTag(board, i, 'vessel:tank')) return 'tank';
  if (hasTag(board, i, 'vessel:barrel') || hasTag(board, i, 'vessel:cask')) return 'barrel';
  return hasTag(board, i, 'vessel:other') ? termAt(board, i).text.toUpperCase() : undefined;
};
