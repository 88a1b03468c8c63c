import type { Board } from '../board.ts';
import { isPhLike } from '../ph-like.ts';
import {
  findingOf,
  hasTag,
  holdsCue,
  isCue,
  isFound,
  isFree,
  placeOf,
  refuse,
  termAt,
  setAside,
} from '../board.ts';

const CHEMICAL_SLIP = /^(meta)?(bi)?sul(f|ph)(at|id)es?$|(meta|di|pyro)sul(f|ph)(at|id)$/;

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
  board.terms[i].tags.every((tag) => tag === 'label:aside') &&
  CHEMICAL_SLIP.test(board.terms[i].text);

const isStrangerIn = (board: Board, i: number): boolean =>
  board.terms[i]?.kind === 'word' && board.taken[i] !== true;

const isPlainWord = (board: Board, i: number): boolean => {
  const term = board.terms[i];
  return term?.kind === 'word' && board.taken[i] !== true && term.tags.length === 0 && term.text.length >= 3;
};

/** `500 g malo bacteria`, `500 g of water`: right behind an amount it is what the amount is of, whatever else it says. */
const isNamedAsStuff = (board: Board, i: number): boolean =>
  hasTag(board, i, 'additive:none') || isCue(board, i, 'water');

/** Another chemical beside a sulfite: named as not used; in a solution with water it is refused, for acid or chlorine sets gas free. */
function nameOnly(board: Board, i: number): void {
  if (board.marks.solutionUse !== undefined) return refuseWord(board, i);
  if (!isPassedOver(board, i) && !isCue(board, i, 'salt-word')) setAside(board, i, i);
}

/** `no sorbate`, `after bentonite`, `sorbate yesterday`: talk of it, and no wish to add it now. */
const isPassedOver = (board: Board, i: number): boolean =>
  isCue(board, i - 1, 'not') ||
  isCue(board, i - 1, 'no') ||
  isCue(board, i - 1, 'ml-over') ||
  isCue(board, i - 1, 'clock-before') ||
  isCue(board, i - 1, 'article');

/** A chemical named at the end, or after "with": in the additive's place. */
function isOffered(board: Board, i: number): boolean {
  const next = board.terms[i + 1];
  const ends =
    next === undefined ||
    next.kind === 'break' ||
    (next.kind === 'mark' && next.text !== '-') ||
    isFreeStrength(board, i + 1);
  return ends && !isPassedOver(board, i);
}

const isFreeStrength = (board: Board, i: number): boolean =>
  board.terms[i]?.kind === 'number' && board.terms[i + 1]?.text === '%';

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
    if (!named && isNamedAsStuff(board, after)) return refuseWord(board, after);
    if (isNone(before)) return refuseWord(board, before);
    if (!named && isPlainWord(board, after) && after <= amount.to + 2 && !isBetween(board, after))
      return refuseWord(board, after);
  }
  const anywhere = board.terms.findIndex(
    (_, i) => board.taken[i] !== true && (hasTag(board, i, 'additive:none') || isSulfateWord(board, i)),
  );
  if (anywhere < 0) return;
  if (named) return nameOnly(board, anywhere);
  const isWick = isCue(board, anywhere, 'wick') && isFound(board, 'vessel');
  const slip = CHEMICAL_SLIP.test(termAt(board, anywhere).text.split(' ').at(-1) ?? '');
  const isFigure =
    isFound(board, 'ph') ||
    isFound(board, 'free_mg_L') ||
    board.terms.some((_, i) => isFree(board, i) && isPhLike(board, i));
  if (isWick || (isFigure && (slip || isOffered(board, anywhere)))) return refuseWord(board, anywhere);
  const wanted =
    board.terms[anywhere - 1]?.kind === 'number' ||
    amount !== undefined ||
    board.pastTense ||
    holdsCue(board, 'how-much') ||
    holdsCue(board, 'add') ||
    board.marks.spoon === true ||
    board.marks.solutionUse !== undefined;
  if (wanted && !(isFigure && amount === undefined && !board.pastTense)) refuseWord(board, anywhere);
}
