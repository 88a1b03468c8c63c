import type { Board } from '../board.ts';
import { figureAt, hasTag, isCue, isFree } from '../board.ts';
import { unitAt } from '../units.ts';

/** Litres above which a size is no bottle's: `300 bottles from 225 L`; own threshold. */
const LARGEST_BOTTLE_L = 30;

/** `of 750 mL`, `da 750 ml`, `zu 0,75 l`: one small word behind the bottles that leads to their size. */
export const isOfSize = (board: Board, i: number): boolean =>
  isCue(board, i - 1, 'bottle-unit') &&
  board.terms[i]?.kind === 'word' &&
  !board.terms[i]?.tags.some((tag) => /^(vessel|label|unit|additive):/.test(tag));

/** Where the size of counted bottles stands whose words end before term `i`: `of 750 mL`, `75 cl`. */
export function sizeOfBottles(board: Board, i: number): number | undefined {
  const at = isOfSize(board, i) ? i + 1 : i;
  if (!isFree(board, at) || !unitAt(board, at + 1, ['L', 'mL', 'cL'])) return undefined;
  const isLarge = hasTag(board, at + 1, 'unit:L') && figureAt(board, at).value > LARGEST_BOTTLE_L;
  return isLarge ? undefined : at;
}
