import type { Board } from '../board.ts';
import { claim, hasTag, isCue, isFound, isFree, labelBefore } from '../board.ts';
import { concentrationAt } from '../units.ts';
import { aimAt, keepAddition } from './aim.ts';

const isLabelBefore = (board: Board, i: number): boolean => {
  const label = labelBefore(board, i);
  return label !== undefined && !hasTag(board, label, 'label:so2');
};

/** The clause ends here, or another figure begins. */
const ends = (board: Board, k: number): boolean => {
  const term = board.terms[k];
  return term === undefined || term.kind === 'break' || /^[,.;?!]$/.test(term.text) || isFree(board, k);
};

/** `22 mg/l in Tank 3 zugeben`: the verb that closes the clause behind a figure. */
function verbBehind(board: Board, from: number): number | undefined {
  for (let k = from; k <= from + FARTHEST && !ends(board, k); k++)
    if (isCue(board, k, 'add-behind') && board.taken[k] !== true) return k;
  return undefined;
}

/** A verb farther behind its figure than this is another's; own threshold, in words. */
const FARTHEST = 8;

/** Finds a concentration that is an addition by what follows it, or by the past tense: `28 ppm addition`, `60 ppm SO2 added`. */
export function findAddition(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    const hasUnit = concentrationAt(board, i + 1) !== undefined;
    const isLed = hasUnit || isCue(board, i + 1, 'add-behind');
    const aim = isFree(board, i) && isLed ? aimAt(board, i) : undefined;
    if (!aim || aim.kind !== undefined || isLabelBefore(board, i)) continue;
    const verb = verbBehind(board, aim.to + 1);
    if (verb !== undefined) {
      keepAddition(board, aim, i);
      claim(board, verb, verb);
    } else if (isCue(board, aim.to + 1, 'addition') && !hasTag(board, aim.to + 1, 'label:total'))
      keepAddition(board, { ...aim, to: aim.to + 1 }, i);
    else if (board.pastTense && !isFound(board, 'added_mg_L')) keepAddition(board, aim, i);
  }
}
