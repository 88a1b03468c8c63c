import type { Board } from '../board.ts';
import { decimalAt, figureAt, find, hasTag, isFound, isFree, isMark, refuse, setAside } from '../board.ts';
import { strangerBefore } from '../stranger.ts';
import { isPhLike } from '../ph-like.ts';
import { concentrationAt } from '../units.ts';

/** Below this ratio the second figure may be the next mark of a scale, not the total. */
const LEAST_CLEAR_RATIO = 1.2;

const isSlash = (board: Board, i: number): boolean => isMark(board, i, '/');

/** Whether SO2 is named or a unit stands beside the pair, so that it is no date. */
function isNamed(board: Board, from: number, to: number): boolean {
  const tags = [from - 1, from - 2, to + 1].flatMap((k) => board.terms[k]?.tags ?? []);
  return (
    concentrationAt(board, to + 1) !== undefined ||
    tags.some((tag) => tag === 'label:so2' || tag === 'label:free' || tag === 'label:total')
  );
}

const isDate = (a: number, b: number): boolean =>
  (a >= 1 && a <= 31 && b >= 1 && b <= 12) || (b >= 1 && b <= 31 && a >= 1 && a <= 12);

function findFreeAndTotal(board: Board, i: number, from: number): void {
  const [free, total] = [figureAt(board, i).value, figureAt(board, i + 2).value];
  const unit = concentrationAt(board, i + 3);
  const to = unit?.to ?? i + 2;
  if (unit?.id === 'g/L') return refuse(board, 'unit-mismatch', i, to);
  if (from === i && !isNamed(board, i, i + 2) && isDate(free, total))
    return refuse(board, 'ambiguous-number', i, to);
  if (total < free) return refuse(board, 'total-below-free', i, to);
  if (total < LEAST_CLEAR_RATIO * free && from === i) return refuse(board, 'ambiguous-number', i, to);
  const scale = unit?.id === 'g/hL' ? 10 : 1;
  if (unit?.id === 'ppm' || unit?.id === 'mg/L') board.marks.concentrationUnit ??= unit.id;
  find(board, 'free_mg_L', free * scale, 'labelled', i, to);
  find(board, 'total_mg_L', total * scale, 'labelled', i, to);
}

/** `free/total 18/60`. */
const isFreeBefore = (board: Board, i: number): boolean =>
  hasTag(board, i - 2, 'label:free') || (isSlash(board, i - 2) && hasTag(board, i - 3, 'label:free'));

/** Finds `18/60` (free and total), `3.6/18` and `3.6/18/60` (with the pH first). */
export function findPairs(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (!isFree(board, i) || !isSlash(board, i + 1) || !isFree(board, i + 2)) continue;
    const stranger = board.findings.some(({ said }) => said === 'labelled')
      ? strangerBefore(board, i)
      : undefined;
    if (stranger !== undefined && !isNamed(board, i, i + 2)) setAside(board, stranger, i + 2);
    else if (isPhLike(board, i) && !isFound(board, 'ph')) {
      const three = isSlash(board, i + 3) && isFree(board, i + 4);
      find(board, 'ph', decimalAt(board, i).value, 'labelled', i, i);
      const unit = three ? undefined : concentrationAt(board, i + 3);
      if (three) findFreeAndTotal(board, i + 2, i);
      else if (unit?.id === 'g/L') refuse(board, 'unit-mismatch', i + 2, unit.to);
      else find(board, 'free_mg_L', figureAt(board, i + 2).value, 'labelled', i + 2, unit?.to ?? i + 2);
    } else if (hasTag(board, i - 1, 'label:total') && !isFreeBefore(board, i))
      refuse(board, 'ambiguous-number', i, i + 2);
    else findFreeAndTotal(board, i, i);
  }
}
