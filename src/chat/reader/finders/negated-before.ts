import type { Board } from '../board.ts';
import { isCue } from '../board.ts';

/** Whether `no`, `not`, `without` stands right before term `i`, or one word further. */
export function isNegatedBefore(board: Board, i: number): boolean {
  return [i - 1, i - 2].some((k) => isCue(board, k, 'not') || isCue(board, k, 'no'));
}
