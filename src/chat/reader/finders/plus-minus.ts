import type { Board } from '../board.ts';
import { claim, decimalAt, isFree, isMark, labelBefore, hasTag, refuse, setAside, termAt } from '../board.ts';
import { isOwn } from '../own-pieces.ts';
import { concentrationAt } from '../units.ts';

/** The largest ± that a pH is told with, and its bounds (no unit; own thresholds). */
const PH = { most: 0.5, from: 2.5, to: 4.8 } as const;

/** Where a ± that begins at term `i` ends: `±`, `+/-`, `+-`. */
function signEnd(board: Board, i: number): number | undefined {
  if (isMark(board, i, '±')) return i;
  if (!isMark(board, i, '+')) return undefined;
  if (isMark(board, i + 1, '-') && !termAt(board, i + 1).gap) return i + 1;
  const isSlashed = isMark(board, i + 1, '/') && isMark(board, i + 2, '-') && !termAt(board, i + 1).gap;
  return isSlashed ? i + 2 : undefined;
}

/** The figure that a ± is of: right before it, or with its unit between. */
function figureBefore(board: Board, i: number): number | undefined {
  if (board.terms[i - 1]?.kind === 'number') return i - 1;
  return [i - 2, i - 4].find(
    (k) => board.terms[k]?.kind === 'number' && concentrationAt(board, k + 1)?.to === i - 1,
  );
}

/**
 * `pH 3.58±0.03`, `free 21 ± 2`, `free 21 ± 10 %`: how sure a figure is. The dose is told as a range then. A ± of
 * anything else is set aside, and one that cannot be is asked about.
 */
export function findPlusMinus(board: Board): void {
  for (const [k, { from, to }] of board.pieces.entries()) {
    if (!isOwn(board.pieces, k, 'lab-range')) continue;
    board.marks.wantsRange = true;
    claim(board, from, to);
  }
  for (let i = 0; i < board.terms.length; i++) {
    const sign = signEnd(board, i);
    if (sign === undefined || !isFree(board, sign + 1)) continue;
    const of = figureBefore(board, i);
    if (of === undefined) continue;
    readOne(board, of, { from: i, figure: sign + 1 });
  }
}

function readOne(
  board: Board,
  of: number,
  { from, figure }: { readonly from: number; readonly figure: number /* its position */ },
): void {
  const isPercent = isMark(board, figure + 1, '%');
  const to = isPercent ? figure + 1 : (concentrationAt(board, figure + 1)?.to ?? figure);
  const { value } = decimalAt(board, figure);
  const base = decimalAt(board, of).value;
  const label = labelBefore(board, of);
  const isLabelled = (name: 'label:ph' | 'label:free'): boolean =>
    label !== undefined && hasTag(board, label, name);
  const isPH = isLabelled('label:ph') || (label === undefined && base >= PH.from && base <= PH.to);
  if (!isPH && label !== undefined && !isLabelled('label:free')) return setAside(board, from, to);
  if (isPH && (isPercent || value > PH.most)) return refuse(board, 'value-out-of-range', from, to);
  const free_mg_L = isPercent ? (base * value) / 100 : value;
  if (!isPH && free_mg_L > base) return refuse(board, 'value-out-of-range', from, to);
  board.marks.wantsRange = true;
  if (isPH) board.marks.ph_plus_minus = value;
  else board.marks.free_plus_minus_mg_L = free_mg_L;
  claim(board, from, to);
}
