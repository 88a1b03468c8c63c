import type { Board } from '../board.ts';
import { hasTag, isCue } from '../board.ts';

/** What may stand between a wish and the level that is wished: the vessel and small words. */
const isBetween = (board: Board, k: number): boolean =>
  board.taken[k] === true ||
  (['article', 'with', 'is', 'of', 'in', 'into'] as const).some((cue) => isCue(board, k, cue)) ||
  hasTag(board, k, 'vessel:tank') ||
  hasTag(board, k, 'vessel:barrel');

/**
 * Whether the level that begins at term `from` is wished for and not measured: `quero a T4 com 30 de livre`, `deve ter
 * 30 de livre`. Read as what is there, the wine would get nothing.
 */
export function isWishedLevel(board: Board, from: number): boolean {
  if (isCue(board, from - 1, 'should')) return true;
  if (!isCue(board, from - 1, 'with')) return false;
  let k = from - 2;
  while (k >= 0 && isBetween(board, k) && !isCue(board, k, 'need') && !isCue(board, k, 'raise')) k--;
  return isCue(board, k, 'need') || isCue(board, k, 'raise') || isCue(board, k, 'should');
}
