import type { Board } from '../board.ts';
import { decimalAt, isCue, isFree, refuse } from '../board.ts';
import { MOST_BARE_MOLECULAR_mg_L, aimAt, isOther, keepTarget, skipJoins } from './aim.ts';

/** `0.8 molecular`, `mol 0.5`. A measured "molecular is 0.4 now" is no aim. */
function findMolecularAt(board: Board, i: number): void {
  const states = isCue(board, i + 1, 'states');
  const at = skipJoins(board, i + 1);
  const after = isFree(board, at) && !isOther(board, at + 1) ? at : undefined;
  const unit = board.terms[i - 1]?.tags.some((tag) => tag === 'unit:ppm' || tag === 'unit:mg/L')
    ? i - 2
    : i - 1;
  const before = isFree(board, unit) ? unit : undefined;
  const both = after !== undefined && before !== undefined;
  const chosen = both
    ? decimalAt(board, before).value <= MOST_BARE_MOLECULAR_mg_L
      ? before
      : after
    : (before ?? after);
  if (chosen === undefined) return;
  const aim = aimAt(board, chosen);
  // `mol so2 at 3.45 and 28 free?` asks for it at that pH.
  const isPh = aim !== undefined && aim.mg_L >= 2.7 && aim.mg_L <= 4.5 && !Number.isInteger(aim.mg_L);
  if (!aim || isPh) return;
  const [from, to] = [Math.min(i, chosen), Math.max(i, chosen === after ? aim.to : i)];
  if (states) refuse(board, 'ambiguous-number', from, to);
  else keepTarget(board, { ...aim, kind: 'molecular', to }, from);
}

/** Finds a target in molecular SO2. */
export function findMolecular(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] !== true && isCue(board, i, 'molecular')) findMolecularAt(board, i);
  }
}
