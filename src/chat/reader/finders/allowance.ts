import type { Board } from '../board.ts';
import { figureAt, find, isCue, isFree, isMark, refuse, termAt } from '../board.ts';

const isPercent = (board: Board, i: number): boolean => isMark(board, i, '%') || isCue(board, i, 'percent');

const SHARES = [
  ['third', 1 / 3],
  ['half', 1 / 2],
  ['quarter', 1 / 4],
  ['two-thirds', 2 / 3],
  ['three-quarters', 3 / 4],
] as const;

/** Whether "binds" stands within two terms after `i`, with no figure between. */
function bindsAfter(board: Board, i: number): number | undefined {
  for (let k = i; k <= i + 2; k++) {
    if (board.terms[k]?.kind === 'number' || board.terms[k]?.kind === 'break') return undefined;
    if (isCue(board, k, 'binds')) return k;
  }
  return undefined;
}

function findShareAt(board: Board, value: number, from: number, to: number): boolean {
  const after = bindsAfter(board, to + 1);
  const before = isCue(board, from - 1, 'binding');
  if (after === undefined && !before) return false;
  if (value > 0.8) refuse(board, 'value-out-of-range', from, after ?? to);
  else find(board, 'binding_share', value, 'labelled', before ? from - 1 : from, after ?? to);
  return true;
}

function findPercentAt(board: Board, i: number): boolean {
  const { value } = figureAt(board, i);
  const plus = isMark(board, i - 1, '+') || isCue(board, i - 1, 'plus');
  const after = isPercent(board, i + 1) && isCue(board, i + 2, 'extra') ? i + 2 : undefined;
  const colon = isMark(board, i - 1, ':') || isMark(board, i - 1, '=') ? i - 2 : i - 1;
  const before = isCue(board, colon, 'binding');
  if (!(isPercent(board, i + 1) && (plus || after !== undefined)) && !before) return false;
  const to = after ?? (isPercent(board, i + 1) ? i + 1 : i);
  if (value > 400 || value < 0) refuse(board, 'value-out-of-range', i, to);
  else find(board, 'binding_allowance_percent', value, 'labelled', before ? colon : plus ? i - 1 : i, to);
  return true;
}

/** `1/3`: two whole numbers with nothing but the stroke between. */
const isFraction = (board: Board, i: number): boolean =>
  isMark(board, i + 1, '/') &&
  [i, i + 2].every((k) => isFree(board, k) && /^\d{1,2}$/.test(termAt(board, k).text)) &&
  !termAt(board, i + 1).gap &&
  !termAt(board, i + 2).gap;

/** Finds the allowance (`+30%`, `binding 40%`) and the share that binds (`1/3 binds`, `half gets bound`). */
export function findAllowance(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (isCue(board, i, 'no-binding')) find(board, 'binding_allowance_percent', 0, 'labelled', i, i);
    else if (isFraction(board, i)) {
      const value = figureAt(board, i).value / figureAt(board, i + 2).value;
      if (value < 1 && findShareAt(board, value, i, i + 2)) i += 2;
    } else if (isFree(board, i)) {
      const { value } = figureAt(board, i);
      if (!findPercentAt(board, i) && value < 1 && termAt(board, i).value !== undefined)
        findShareAt(board, value, i, i);
    } else {
      const share = SHARES.find(([cue]) => isCue(board, i, cue));
      if (share) findShareAt(board, share[1], i, i);
    }
  }
}
