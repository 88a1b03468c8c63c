import type { Board } from '../board.ts';
import { hasTag, holdsCue, isCue, isMark, refuse, termAt } from '../board.ts';
import { isCellarTalk } from '../cellar-talk.ts';
import { concentrationAt } from '../units.ts';
import type { Aim } from './aim.ts';
import { aimAt, isArrow, keepAddition, keepTarget, kindAt, skipJoins } from './aim.ts';

/** The figure that a verb at term `i` governs: `add 28 ppm`, `target free 35`. */
function governed(board: Board, i: number): { aim: Aim; label?: Aim['kind'] } | undefined {
  let k = skipJoins(board, i + 1);
  const label = kindAt(board, k) ?? (hasTag(board, k, 'label:so2') ? 'free' : undefined);
  if (label !== undefined) k = skipJoins(board, k + 1);
  const aim = aimAt(board, k);
  return aim && { aim, ...(label ? { label } : {}) };
}

function findVerb(board: Board, i: number): void {
  if (isCue(board, i, 'need') && isCue(board, i + 1, 'to')) return;
  const found = governed(board, i);
  if (!found) return;
  const { aim, label } = found;
  const isPlain = aim.kind === undefined && label === undefined;
  if (isArrow(board, i) || isCue(board, i, 'target')) return keepTarget(board, aim, i, label);
  if (isCue(board, i, 'need')) {
    const more = isCue(board, aim.to + 1, 'addition') || isCue(board, aim.to + 1, 'past');
    if (more) return keepAddition(board, { ...aim, to: aim.to + 1 }, i);
    return isPlain || (label === undefined && aim.kind === undefined)
      ? refuse(board, 'ambiguous-number', i, aim.to)
      : keepTarget(board, aim, i, label);
  }
  if (isCue(board, i, 'add') || isCue(board, i, 'raise') || isCue(board, i, 'by'))
    return keepAddition(board, aim, i);
  const isPlainTo = aim.kind === undefined && label === undefined && !concentrationAt(board, aim.from + 1);
  if (isPlainTo && !isCellarTalk(board)) return;
  if (isCue(board, i, 'to')) keepTarget(board, aim, i, label);
}

const isVerb = (board: Board, i: number): boolean =>
  isArrow(board, i) ||
  (isCue(board, i, 'by') && holdsCue(board, 'raise')) ||
  (['target', 'add', 'raise', 'need', 'to'] as const).some((cue) => isCue(board, i, cue));

/** `+25 ppm`: a plus sign glued to its figure. */
function findPlus(board: Board, i: number): void {
  const opens = termAt(board, i).gap || board.terms[i - 1]?.kind !== 'number';
  const aim = opens && board.terms[i + 1]?.gap === false ? aimAt(board, i + 1) : undefined;
  if (aim) keepAddition(board, aim, i);
}

/** Finds what a verb, an arrow or a plus sign aims at: a level of SO2, or a stated addition. */
export function findTarget(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true) continue;
    if (isMark(board, i, '+')) findPlus(board, i);
    else if (termAt(board, i).kind !== 'number' && isVerb(board, i)) findVerb(board, i);
  }
}
