import type { Board } from '../board.ts';
import { claim, isCue, placeOf } from '../board.ts';

/** Finds that one sample was mixed from several vessels: its figures are their mean. */
export function findMixedSample(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true || !isCue(board, i, 'mixed-sample')) continue;
    board.marks.mixedSample = placeOf(board, i, i).text;
    claim(board, i, i);
  }
}
