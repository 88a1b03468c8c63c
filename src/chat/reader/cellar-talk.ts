import type { Board } from './board.ts';

const CELLAR =
  /^(label:(?!aside|free|total|volume|temperature)|additive|style|category|product|stage|vessel|organic|cue:(cellar|variety|molecular|target|wine|ml)$)/;

/** A unit says something only behind a figure: `size L` is no litre. */
const UNIT = /^unit:(?!none|C|F|degree)/;

/** Words that everybody uses (`free`, `total`) speak of wine only with a figure of their own, which is a finding. */
function speaksOfWine(board: Board, i: number): boolean {
  const term = board.terms[i];
  if (term?.kind !== 'word') return false;
  const counted = board.terms[i - 1]?.kind === 'number';
  return term.tags.some((tag) => CELLAR.test(tag) || (counted && UNIT.test(tag)));
}

/** Whether the message speaks of wine at all: a cellar word, a unit, or nothing but numbers. */
export function isCellarTalk(board: Board): boolean {
  if (board.findings.length > 0 || board.terms.some((_, i) => speaksOfWine(board, i))) return true;
  return (
    board.terms.every(({ kind }) => kind !== 'word') && board.terms.some(({ kind }) => kind === 'number')
  );
}
