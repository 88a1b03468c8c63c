import type { Board } from '../board.ts';
import { claim, placeOf, wordsOf } from '../board.ts';
import { isOwn } from '../own-pieces.ts';

/** Longer than any lot on a label; own threshold. */
const MOST_LETTERS = 24;

/** The last term of a code that begins at term `from`: figures, letters and marks with no blank between. */
function codeEnd({ terms }: Board, from: number): number {
  let to = from;
  while (terms[to + 1]?.gap === false && terms[to + 1]?.kind !== 'break') to++;
  while (to > from && terms[to]?.kind === 'mark') to--;
  return to;
}

/** `to lot 4471`, `of batch 2`: a lot of wine. */
const isOfWine = ({ pieces }: Board, k: number): boolean => isOwn(pieces, k - 1, 'to', 'from', 'of', 'with');

/** Finds the lot on the additive's label, in an addition that was made or is ordered: `lot 4471`, `batch KM-22`. */
export function findChemicalLot(board: Board): void {
  if (!board.pastTense && !board.orders) return;
  for (const [k, piece] of board.pieces.entries()) {
    if (!isOwn(board.pieces, k, 'lot') || isOfWine(board, k)) continue;
    let at = k + 1;
    while (isOwn(board.pieces, at, 'number') || /^[:#.]$/.test(board.pieces[at]?.text ?? '')) at++;
    const from = board.pieces[at]?.from;
    if (from === undefined || board.pieces[at]?.kind === 'mark') continue;
    const to = codeEnd(board, from);
    const code = placeOf(board, from, to).text;
    if (!/\d/.test(code) || code.length > MOST_LETTERS) continue;
    board.chemicalLot = { code, words: wordsOf(board, piece.from, to) };
    claim(board, piece.from, to);
    return;
  }
}
