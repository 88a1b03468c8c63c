import type { Board } from '../board.ts';
import { isCue, isFree } from '../board.ts';
import { unitAt } from '../units.ts';

/** Where the size of counted bottles stands whose words end before term `i`: `of 750 mL`, `75 cl`. */
export function sizeOfBottles(board: Board, i: number): number | undefined {
  const at = isCue(board, i, 'of') ? i + 1 : i;
  return isFree(board, at) && unitAt(board, at + 1, ['L', 'mL', 'cL']) ? at : undefined;
}
