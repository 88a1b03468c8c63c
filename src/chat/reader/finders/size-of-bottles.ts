import type { Board } from '../board.ts';
import { isCue, isFree } from '../board.ts';
import { unitAt } from '../units.ts';

/** `of 750 mL`, `da 750 ml`, `zu 0,75 l`: what leads from the bottles to their size. */
export const isOfSize = (board: Board, i: number): boolean =>
  (['of', 'from-too', 'also-at', 'to'] as const).some((cue) => isCue(board, i, cue));

/** Where the size of counted bottles stands whose words end before term `i`: `of 750 mL`, `75 cl`. */
export function sizeOfBottles(board: Board, i: number): number | undefined {
  const at = isOfSize(board, i) ? i + 1 : i;
  return isFree(board, at) && unitAt(board, at + 1, ['L', 'mL', 'cL']) ? at : undefined;
}
