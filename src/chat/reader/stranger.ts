import type { Board } from './board.ts';
import { isCue } from './board.ts';

/** Whether term `i` is a word that the reader does not know, so that a figure beside it may be that word's. */
export function isStranger(board: Board, i: number): boolean {
  const term = board.terms[i];
  return term?.kind === 'word' && board.taken[i] !== true && term.tags.length === 0 && term.text.length >= 2;
}

/** The stranger before a figure: right before it, or with "of" between (`crew of 18`). */
export function strangerBefore(board: Board, i: number): number | undefined {
  if (isStranger(board, i - 1)) return i - 1;
  return isCue(board, i - 1, 'of') && isStranger(board, i - 2) ? i - 2 : undefined;
}
