import type { Board } from '../board.ts';
import { claim, holdsCue, isCue, isFree, isMark, refuse } from '../board.ts';
import { concentrationAt } from '../units.ts';

const isAdditive = (board: Board, i: number): boolean =>
  board.terms[i]?.tags.some(
    (tag) =>
      tag.startsWith('additive:') && tag !== 'additive:none' && tag !== 'additive:sulfur-dioxide-solution',
  ) === true;

const isSO2 = (board: Board, i: number): boolean =>
  board.terms[i]?.tags.some((tag) => tag === 'label:so2' || tag === 'label:free' || tag === 'label:total') ===
  true;

const isLabelled = (board: Board, i: number): boolean => {
  let k = i - 1;
  while (
    isMark(board, k, ':') ||
    isMark(board, k, '=') ||
    isCue(board, k, 'is') ||
    isCue(board, k, 'to') ||
    isCue(board, k, 'target') ||
    isMark(board, k, '->') ||
    isMark(board, k, '→')
  ) {
    if (
      isCue(board, k, 'to') ||
      isCue(board, k, 'target') ||
      board.terms[k]?.text.includes('>') ||
      board.terms[k]?.text === '→'
    )
      return true;
    k--;
  }
  return board.terms[k]?.tags.some((tag) => tag.startsWith('label:') && tag !== 'label:so2') === true;
};

/**
 * Refuses a concentration that could be of the powder or of its SO2, a factor of 1.7: `50 ppm PMS`,
 * `3 g/hL de meta`, and any `g/hL` that does not say of what.
 */
export function findPowderOrSO2(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    const unit = isFree(board, i) ? concentrationAt(board, i + 1) : undefined;
    if (!unit || isLabelled(board, i)) continue;
    // `20 ppm copper` is a figure of something else; `20 g/hl bentonite` is a dose of it, and never a free SO2 of 200.
    if (unit.id !== 'g/hL' && board.terms[unit.to + 1]?.tags.includes('additive:none') === true) continue;
    const after = isCue(board, unit.to + 1, 'of') ? unit.to + 2 : unit.to + 1;
    const before = isMark(board, i - 1, ':') ? i - 2 : i - 1;
    const beside =
      isAdditive(board, after) ||
      (isAdditive(board, before) && !isSO2(board, after) && !isCue(board, after, 'addition'));
    const perHectolitre =
      unit.id === 'g/hL' &&
      (!isSO2(board, after) ||
        (board.terms[after]?.tags.includes('label:so2') === true &&
          !(['add', 'add-behind', 'addition', 'raise', 'past'] as const).some((cue) =>
            holdsCue(board, cue),
          )));
    const perLitre = unit.id === 'g/L' && (isAdditive(board, after) || isAdditive(board, before));
    const other = [after, before].find((k) => board.terms[k]?.tags.includes('additive:none') === true);
    if (perHectolitre && other !== undefined && !beside) {
      claim(board, i, unit.to);
      refuse(board, 'unknown-additive', other, other);
    } else if (beside || perHectolitre || perLitre)
      refuse(
        board,
        'ambiguous-number',
        i,
        Math.max(unit.to, beside && isAdditive(board, after) ? after : unit.to),
      );
  }
}
