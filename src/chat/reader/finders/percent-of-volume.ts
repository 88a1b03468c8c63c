import type { Board } from '../board.ts';
import { hasTag, isCue, isMark } from '../board.ts';

/** `12.5 vol%`, `12,5 Vol.-%`: where the per cent stands behind the word for volume at term `i`. */
export function percentOfVolume(board: Board, i: number): number | undefined {
  if (!hasTag(board, i, 'label:volume')) return undefined;
  let k = i + 1;
  while (isMark(board, k, '.') || isMark(board, k, '-')) k++;
  return isMark(board, k, '%') || isCue(board, k, 'percent') ? k : undefined;
}
