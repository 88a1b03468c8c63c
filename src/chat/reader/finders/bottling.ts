import { BOUNDS } from '../../../core/bounds.ts';
import { SO2_PER_OXYGEN_BOUNDS } from '../../../core/dose/oxygen-loss.ts';
import type { Board } from '../board.ts';
import { claim, figureAt, isCue, isFree, isMark, refuse, termAt } from '../board.ts';
import { concentrationAt, mg_L_IN } from '../units.ts';

/** `oxygen`; of DO only the capitals, as the word is also a verb. */
const isOxygen = (board: Board, i: number): boolean =>
  isCue(board, i, 'oxygen') || (termAt(board, i).text === 'do' && termAt(board, i).capital === true);

/** `at 2.5`, `x 2.5` behind the oxygen: how much SO2 one of it takes. */
function findFactor(board: Board, i: number): number {
  if (!(isCue(board, i, 'clock-before') || isCue(board, i, 'times') || isMark(board, i, '×'))) return i - 1;
  if (!isFree(board, i + 1) || concentrationAt(board, i + 2)) return i - 1;
  const { value } = figureAt(board, i + 1);
  const { min, max } = SO2_PER_OXYGEN_BOUNDS;
  if (!(value >= min && value <= max)) refuse(board, 'value-out-of-range', i, i + 1);
  else board.marks.SO2_mg_per_mg_O2 = value;
  return i + 1;
}

function findOxygen(board: Board, i: number): void {
  let at = i + 1;
  while (isMark(board, at, ':') || isMark(board, at, '=') || isCue(board, at, 'is') || isCue(board, at, 'of'))
    at++;
  const isBefore = !isFree(board, at);
  const unitBefore = isBefore
    ? ([i - 1, i - 3].find((k) => concentrationAt(board, k)?.to === i - 1) ?? i)
    : i;
  const figure = isBefore ? unitBefore - 1 : at;
  if (!isFree(board, figure)) return;
  const unit = concentrationAt(board, figure + 1);
  const { value, unsure, from } = figureAt(board, figure);
  const last = isBefore ? i : (unit?.to ?? figure);
  const oxygen_mg_L = value * ((unit && mg_L_IN[unit.id]) ?? 1);
  const start = Math.min(i, from);
  if (unsure) return refuse(board, 'ambiguous-number', start, last);
  if (!(oxygen_mg_L >= 0)) return refuse(board, 'negative-value', start, last);
  if (oxygen_mg_L > BOUNDS.oxygen_mg_L.max) return refuse(board, 'value-out-of-range', start, last);
  const known = board.marks.oxygen_mg_L;
  if (known !== undefined && known !== oxygen_mg_L) return refuse(board, 'conflicting-values', start, last);
  board.marks.oxygen_mg_L = oxygen_mg_L;
  claim(board, start, Math.max(last, findFactor(board, last + 1)));
}

/**
 * Finds that a wine is to be bottled, and the oxygen that it is to be allowed for. What is kept for bottling is the
 * law's, and a wine that is bottled is past it.
 */
export function findBottling(board: Board): void {
  const at = board.terms.findIndex((_, i) => isCue(board, i, 'bottling') && board.taken[i] !== true);
  if (at < 0) return;
  board.marks.bottling = true;
  claim(board, at, at);
  for (let i = 0; i < board.terms.length; i++)
    if (isOxygen(board, i) && board.taken[i] !== true) findOxygen(board, i);
}
