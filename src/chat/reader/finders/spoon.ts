import type { Board } from '../board.ts';
import { claim, hasTag, isCue, isFree, placeOf } from '../board.ts';

/** Finds an amount in spoons, which is never a dose: the mass is asked. */
export function findSpoon(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (!hasTag(board, i, 'unit:spoon')) continue;
    const from =
      isFree(board, i - 1) || isCue(board, i - 1, 'number-word') || isCue(board, i - 1, 'article')
        ? i - 1
        : i;
    board.marks.spoon = true;
    board.notes.push({ id: 'spoon', text: placeOf(board, from, i).text });
    claim(board, from, i);
  }
}
