import type { Board } from '../board.ts';
import { holdsCue, isCue, isFound } from '../board.ts';

/** A measured figure: then "clean" and "rinse" are talk beside a reading. */
const speaksOfReading = (board: Board): boolean =>
  ['label:ph', 'label:free', 'label:total'].some((tag) => board.cues.has(tag as 'label:ph')) ||
  holdsCue(board, 'molecular');

/** A figure of wine: with one, "mix" and "make" are cellar work and no recipe. */
const speaksOfWine = (board: Board): boolean =>
  isFound(board, 'vessel') || isFound(board, 'vessels') || speaksOfReading(board);

/** `in 100 mL water`, `in water`: the liquid is water and no wine. */
function isInWater(board: Board): boolean {
  return board.terms.some(
    (_, i) =>
      isCue(board, i, 'water') &&
      board.terms
        .slice(Math.max(0, i - 4), i)
        .some(
          (term, k, before) =>
            isCue(board, i - before.length + k, 'in') ||
            isCue(board, i - before.length + k, 'per') ||
            term.kind === 'number',
        ),
  );
}

/** Finds that a solution in water is meant: to hold barrels, to clean, or a stock to make up. */
export function findSolutionUse(board: Board): void {
  if (holdsCue(board, 'holding')) board.marks.solutionUse = 'holding';
  else if (holdsCue(board, 'cleaning') && !speaksOfReading(board)) board.marks.solutionUse = 'cleaning';
  else if (
    !speaksOfWine(board) &&
    !holdsCue(board, 'past') &&
    (isInWater(board) || holdsCue(board, 'make-up'))
  )
    board.marks.solutionUse = 'make-up';
}
