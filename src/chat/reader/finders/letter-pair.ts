import type { Board } from '../board.ts';
import { figureAt, find, isFree, isMark, termAt } from '../board.ts';

const FREE_LETTERS = new Set(['f', 'l']);

/** `F 18`, `F18`, `F: 18`: a letter with the figure it claims. */
function letterAt(board: Board, i: number, letters: ReadonlySet<string>): number | undefined {
  const term = board.terms[i];
  if (term?.kind !== 'word' || !letters.has(term.text)) return undefined;
  const at = isMark(board, i + 1, ':') || isMark(board, i + 1, '=') ? i + 2 : i + 1;
  return isFree(board, at) ? at : undefined;
}

/** Finds `F 18 T 60`, `F18 T60`, `L 18 T 60`: free and total, only side by side. */
export function findLetterPair(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    const free = letterAt(board, i, FREE_LETTERS);
    if (free === undefined || (board.terms[i - 1]?.kind === 'number' && !termAt(board, i).gap)) continue;
    const next = isMark(board, free + 1, ',') || isMark(board, free + 1, '/') ? free + 2 : free + 1;
    const total = letterAt(board, next, new Set(['t']));
    if (total === undefined) continue;
    find(board, 'free_mg_L', figureAt(board, free).value, 'labelled', i, free);
    find(board, 'total_mg_L', figureAt(board, total).value, 'labelled', next, total);
    return;
  }
}
