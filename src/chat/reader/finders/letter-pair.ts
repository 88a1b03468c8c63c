import type { Board } from '../board.ts';
import { figureAt, find, hasTag, isFree, isMark, refuse, termAt } from '../board.ts';

const FREE_LETTERS = new Set(['f', 'l']);

/** `F 18`, `F18`, `F: 18`: a letter with the figure it claims. */
function letterAt(board: Board, i: number, letters: ReadonlySet<string>): number | undefined {
  const term = board.terms[i];
  if (term?.kind !== 'word' || !letters.has(term.text)) return undefined;
  const at = isMark(board, i + 1, ':') || isMark(board, i + 1, '=') ? i + 2 : i + 1;
  return isFree(board, at) ? at : undefined;
}

/** `SO2 T 78`, `SO2 T: 78`: behind the name of SO2 a letter apart from its figure is the total, and no tank; `SO2 T4 18` is tank 4. */
function findTotalLetter(board: Board, i: number): void {
  if (!hasTag(board, i - 1, 'label:so2')) return;
  const total = letterAt(board, i, new Set(['t']));
  if (total === undefined || !termAt(board, total).gap || board.terms[total + 1]?.kind === 'number') return;
  find(board, 'total_mg_L', figureAt(board, total).value, 'labelled', i - 1, total);
}

const namesVessel = (board: Board, k: number): boolean =>
  (['tank', 'barrel', 'cask', 'other'] as const).some((kind) => hasTag(board, k, `vessel:${kind}`)) ||
  (board.terms[k]?.text === 't' && board.terms[k + 1]?.gap === false);

/** `libre 16 T 58`: a letter apart, right behind the free SO2 and above it: the total where a vessel is named elsewhere, else asked. */
function findTotalBehindFree(board: Board, i: number): void {
  const total = letterAt(board, i, new Set(['t']));
  if (total === undefined || !termAt(board, total).gap) return;
  const free = isMark(board, i - 1, ',') || isMark(board, i - 1, '/') ? i - 2 : i - 1;
  if (!hasTag(board, free - 1, 'label:free') || !isFree(board, free)) return;
  const { value } = figureAt(board, total);
  if (value <= figureAt(board, free).value) return;
  if (board.terms.some((_, k) => k !== i && namesVessel(board, k)))
    find(board, 'total_mg_L', value, 'labelled', i, total);
  else refuse(board, 'ambiguous-number', i, total);
}

/** Finds `F 18 T 60`, `F18 T60`, `L 18 T 60`: free and total, only side by side. */
export function findLetterPair(board: Board): void {
  for (let i = 1; i < board.terms.length; i++) {
    findTotalLetter(board, i);
    findTotalBehindFree(board, i);
  }
  for (let i = 0; i < board.terms.length; i++) {
    const free = letterAt(board, i, FREE_LETTERS);
    if (free === undefined || (board.terms[i - 1]?.kind === 'number' && !termAt(board, i).gap)) continue;
    const next = [',', '/', ';', '|'].some((mark) => isMark(board, free + 1, mark)) ? free + 2 : free + 1;
    // `F 18 G 60`: 18 grams, or free and "gesamt"?
    const grams = letterAt(board, next, new Set(['g']));
    if (grams !== undefined) {
      refuse(board, 'ambiguous-number', i, grams);
      return;
    }
    const total = letterAt(board, next, new Set(['t']));
    if (total === undefined) continue;
    find(board, 'free_mg_L', figureAt(board, free).value, 'labelled', i, free);
    find(board, 'total_mg_L', figureAt(board, total).value, 'labelled', next, total);
    return;
  }
}
