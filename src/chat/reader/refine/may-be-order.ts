import type { Board } from '../board.ts';
import { hasTag, isCue, isFound, isFree } from '../board.ts';
import { concentrationAt } from '../units.ts';

/** `50 mg/l SO2 zum Most`: what leads to the must, with an article between at most. */
function leadsToMust(board: Board, i: number): boolean {
  if (!isCue(board, i, 'into') && !isCue(board, i, 'to')) return false;
  return [i, i + 1, i + 2].some((k) => hasTag(board, k, 'stage:must'));
}

/** `50 ppm in 12 hl kmbs` may be what is to go in. */
const mayGoIn = (board: Board, i: number): boolean => {
  const unit = concentrationAt(board, i + 1);
  const into = unit !== undefined && isCue(board, unit.to + 1, 'into');
  return (
    into &&
    isFound(board, 'additive') &&
    board.findings.some(({ field, from }) => field === 'volume_L' && from === unit.to + 2)
  );
};

/** `2 t`: tonnes, or a tank without its number. */
const isTonnes = (board: Board, i: number): boolean =>
  board.terms[i + 1]?.text === 't' && board.terms[i + 2]?.kind !== 'number';

/** `again 20 ppm`, `20 ppm to the must`, `20 mg/l braucht T4`: what is to go in, or what is there? Nobody can tell. */
export function mayBeOrder(board: Board, i: number): boolean {
  if (isCue(board, i - 1, 'again') || isTonnes(board, i)) return true;
  const unit = concentrationAt(board, i + 1);
  if (unit === undefined) return false;
  const next = hasTag(board, unit.to + 1, 'label:so2') ? unit.to + 2 : unit.to + 1;
  if (isCue(board, next, 'again') || (isCue(board, next, 'need') && !isFree(board, next + 1))) return true;
  return leadsToMust(board, next) || mayGoIn(board, i);
}
