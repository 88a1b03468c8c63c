import type { Board } from '../board.ts';
import { isCellarTalk } from '../cellar-talk.ts';
import { isPhLike } from '../ph-like.ts';
import { concentrationAt } from '../units.ts';
import { find, isCue, isFree, isMark, refuse, hasTag, isLabelled } from '../board.ts';
import { MOST_BARE_MOLECULAR_mg_L, aimAt, isArrow, keepTarget, kindAt, skipJoins } from './aim.ts';

/** A step of less than this between two figures may be a range, not a way from one to the other. */
const SMALLEST_CLEAR_STEP_mg_L = 5;

const isPhNamed = (board: Board): boolean => board.terms.some((_, k) => hasTag(board, k, 'label:ph'));

/** `from 18 to 32`, `free 18 to 32`, `18 -> 32`: where it is and where it should go. */
/** `6 barricas de 16 a 28`: counted barrels have no numbers. */
const isCounted = (board: Board, i: number): boolean => board.terms[i - 1]?.kind === 'number';

function findWayAt(board: Board, i: number): boolean {
  const first = aimAt(board, i);
  if (!first || (first.kind !== undefined && first.kind !== 'free')) return false;
  const joint = first.to + 1;
  const arrow = isArrow(board, joint);
  if (!arrow && !isCue(board, joint, 'to')) return false;
  const second = aimAt(board, skipJoins(board, joint + 1));
  if (!second) return false;
  const labelAt =
    isMark(board, i - 1, ':') || isMark(board, i - 1, '=') || isCue(board, i - 1, 'is') ? i - 2 : i - 1;
  const before = kindAt(board, labelAt);
  // `alc 13.5 -> 35`, `total 170 to 30 free`: the first figure is its label's own.
  if (before === undefined && isLabelled(board, i) && !hasTag(board, labelAt, 'label:so2')) return false;
  if (before === 'total' && (second.kind === 'free' || second.kind === 'molecular')) return false;
  // `pH 3.5 free to 32`: the pH is its label's own, and the word behind it opens the next field.
  if (before === 'ph' && first.kind === 'free' && isPhLike(board, i) && !isPhLike(board, second.from))
    return false;
  // `3.5 free to 32` with no pH named: a pH, or a free SO2 of 3.5?
  const isBare =
    before === undefined && !isCue(board, i - 1, 'from') && concentrationAt(board, i + 1) === undefined;
  if (isBare && first.kind === 'free' && isPhLike(board, i) && !isPhNamed(board)) {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  const isBy = isCue(board, i - 1, 'by') && !isCue(board, i - 1, 'from') && !isCue(board, i - 1, 'from-too');
  // `um 15 ppm auf 35 ppm`, `by 15 to 35`: what is added and where it ends, and no reading.
  if (before === 'ph' || before === 'molecular' || (isBy && !isCue(board, i - 1, 'from-too'))) {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  const falls =
    second.kind !== 'molecular' && second.mg_L > MOST_BARE_MOLECULAR_mg_L && second.mg_L < first.mg_L;
  if (isCue(board, i - 1, 'lately') || falls) {
    refuse(board, 'ambiguous-number', i - 1, second.to);
    return true;
  }
  const firm =
    before !== undefined ||
    arrow ||
    [first, second].some(({ from }) => concentrationAt(board, from + 1) !== undefined);
  if (!firm && !isCellarTalk(board)) return false;
  const isFrom = (k: number): boolean => isCue(board, k, 'from') || isCue(board, k, 'from-too');
  const said = isFrom(i - 1) || isFrom(labelAt - 1);
  // `target 30 to 35`, `add 20 to 25`: a range of what is wanted, and no way from one to the other.
  if (!arrow && (isCue(board, i - 1, 'target') || isCue(board, isFrom(i - 1) ? i - 2 : i - 1, 'add'))) {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  // `barrique da 16 a 28`: one barrel from level to level, or thirteen of them?
  if (
    before === undefined &&
    isFrom(i - 1) &&
    hasTag(board, i - 2, 'vessel:barrel') &&
    !isCounted(board, i - 2) &&
    !board.cues.has('label:free')
  ) {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  const start = isFrom(i - 1) ? i - 1 : before ? labelAt : i;
  if (second.kind === 'molecular') {
    find(board, 'free_mg_L', first.mg_L, 'labelled', start, first.to);
    keepTarget(board, second, joint);
    return true;
  }
  if (
    before === 'total' ||
    second.kind === 'total' ||
    (!arrow &&
      !said &&
      Math.abs(second.mg_L - first.mg_L) < SMALLEST_CLEAR_STEP_mg_L &&
      second.mg_L > MOST_BARE_MOLECULAR_mg_L)
  ) {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  find(board, 'free_mg_L', first.mg_L, 'labelled', start, first.to);
  keepTarget(board, second, joint);
  return true;
}

/** Finds where free SO2 is and where it should go, in one breath: `from 18 to 32`, `free 18 to 32`, `18 -> 32`. */
export function findWay(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) if (isFree(board, i)) findWayAt(board, i);
}
