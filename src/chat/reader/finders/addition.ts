import type { Board } from '../board.ts';
import { hasTag, isCue, isFound, isFree, labelBefore } from '../board.ts';
import { concentrationAt } from '../units.ts';
import { aimAt, keepAddition } from './aim.ts';

const isLabelBefore = (board: Board, i: number): boolean => {
  const label = labelBefore(board, i);
  return label !== undefined && !hasTag(board, label, 'label:so2');
};

/** Finds a concentration that is an addition by what follows it, or by the past tense: `28 ppm addition`, `60 ppm SO2 added`. */
export function findAddition(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    const aim = isFree(board, i) && concentrationAt(board, i + 1) ? aimAt(board, i) : undefined;
    if (!aim || aim.kind !== undefined || isLabelBefore(board, i)) continue;
    if (isCue(board, aim.to + 1, 'addition') && !hasTag(board, aim.to + 1, 'label:total'))
      keepAddition(board, { ...aim, to: aim.to + 1 }, i);
    else if (board.pastTense && !isFound(board, 'added_mg_L')) keepAddition(board, aim, i);
  }
}
