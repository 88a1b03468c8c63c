import type { Board } from '../board.ts';
import { isFree, refuse, termAt } from '../board.ts';

/** Letters that a thumb puts for a digit. */
const LOOK_ALIKE = /^[osbz]{1,2}$/;

/** Refuses a figure with a letter for a digit at its end: `free 2O`, `pH 3.5O`; without the letter it is another figure. */
export function findLookAlike(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    const next = board.terms[i + 1];
    if (!isFree(board, i) || next?.kind !== 'word' || next.gap || !LOOK_ALIKE.test(next.text)) continue;
    if (!termAt(board, i + 1).tags.some((tag) => tag.startsWith('unit:')))
      refuse(board, 'ambiguous-number', i, i + 1);
  }
}
