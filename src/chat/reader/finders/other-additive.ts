import type { Board } from '../board.ts';
import { findingOf, hasTag, holdsCue, isCue, isFound, placeOf, refuse, termAt } from '../board.ts';

const CHEMICAL_SLIP = /^(meta)?(bi)?sul(f|ph)(at|id)es?$/;

/** What may stand between an amount and its additive. */
const isBetween = (board: Board, i: number): boolean =>
  isCue(board, i, 'of') || isCue(board, i, 'article') || board.terms[i]?.kind === 'mark';

/** The term in the additive's place: right after or before the amount. */
function placeAfter(board: Board, to: number): number {
  let k = to + 1;
  while (k <= to + 2 && isBetween(board, k)) k++;
  return k;
}

function refuseWord(board: Board, i: number): void {
  const { text } = placeOf(board, i, i);
  if (CHEMICAL_SLIP.test(termAt(board, i).text.split(' ').at(-1) ?? ''))
    board.notes.push({ id: 'did-you-mean', text });
  refuse(board, 'unknown-additive', i, i);
}

const isSulfateWord = (board: Board, i: number): boolean =>
  board.terms[i]?.kind === 'word' &&
  board.terms[i].tags.length === 0 &&
  CHEMICAL_SLIP.test(board.terms[i].text);

const isStrangerIn = (board: Board, i: number): boolean =>
  board.terms[i]?.kind === 'word' && board.taken[i] !== true;

const isPlainWord = (board: Board, i: number): boolean => {
  const term = board.terms[i];
  return term?.kind === 'word' && board.taken[i] !== true && term.tags.length === 0 && term.text.length >= 3;
};

/** Refuses a word in the additive's place that is none: bentonite, a sulphur wick, a sulfate. */
export function findOtherAdditive(board: Board): void {
  const amount =
    findingOf(board, 'mass_g') ?? findingOf(board, 'additive_volume_mL') ?? findingOf(board, 'rate_mg_L');
  const named = isFound(board, 'additive') || board.marks.unnamedAdditive === true;
  const isNone = (i: number): boolean =>
    board.taken[i] !== true &&
    (hasTag(board, i, 'additive:none') || hasTag(board, i, 'label:aside') || isSulfateWord(board, i));
  if (amount) {
    const after = placeAfter(board, amount.to);
    const before = isBetween(board, amount.from - 1) ? amount.from - 2 : amount.from - 1;
    const bag = isCue(board, amount.to + 1, 'bag');
    if (isNone(after) || (bag && isStrangerIn(board, after))) return refuseWord(board, after);
    if (isNone(before)) return refuseWord(board, before);
    if (!named && isPlainWord(board, after) && after <= amount.to + 2 && !isBetween(board, after))
      return refuseWord(board, after);
  }
  if (named) return;
  const anywhere = board.terms.findIndex(
    (_, i) => board.taken[i] !== true && (hasTag(board, i, 'additive:none') || isSulfateWord(board, i)),
  );
  if (anywhere < 0) return;
  const isWick = isCue(board, anywhere, 'wick') && isFound(board, 'vessel');
  const counted = isWick || board.terms[anywhere - 1]?.kind === 'number';
  const wanted =
    counted ||
    amount !== undefined ||
    board.pastTense ||
    holdsCue(board, 'how-much') ||
    holdsCue(board, 'add') ||
    board.marks.spoon === true;
  const isFigure = isFound(board, 'ph') || isFound(board, 'free_mg_L');
  const slip = CHEMICAL_SLIP.test(termAt(board, anywhere).text.split(' ').at(-1) ?? '');
  if (slip && isFigure) return refuseWord(board, anywhere);
  if (wanted && !(isFigure && amount === undefined && !board.pastTense)) refuseWord(board, anywhere);
}
