import type { Board } from './board.ts';

const CELLAR =
  /^(label|unit:(?!none|C|F|degree)|additive|style|category|product|stage|vessel|organic|cue:(cellar|variety|molecular|target|wine|ml)$)/;

/** Whether the message speaks of wine at all: a cellar word, a unit, or nothing but numbers. */
export function isCellarTalk(board: Board): boolean {
  const words = board.terms.filter((term) => term.kind === 'word');
  if (words.length === 0) return board.terms.some((term) => term.kind === 'number');
  return (
    board.findings.length > 0 ||
    board.terms.some((term) => term.kind === 'word' && term.tags.some((tag) => CELLAR.test(tag)))
  );
}
