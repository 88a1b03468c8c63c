import type { Board } from '../board.ts';
import { concentrationAt } from '../units.ts';
import { holdsCue, isCue, isFree, isMark, placeOf, refuse, setAside, termAt } from '../board.ts';

/** Whether a cue stands somewhere between two terms. */
function cueBetween(
  board: Board,
  from: number,
  to: number,
  cue: 'not' | 'if' | 'not-yet' | 'should',
): boolean {
  for (let k = Math.max(0, from); k < to; k++) if (isCue(board, k, cue)) return true;
  return false;
}

/** How far before its verb a negation may stand, in terms; one more of them is of something else. */
const REACH = 5;

/**
 * `nicht 90 g KDS in Tank 4 gegeben`: where the verb closes its clause, all of the clause stands between. In English
 * the verb comes early.
 */
function clauseFrom(board: Board, verb: number): number {
  const next = board.terms[verb + 1];
  const closes = next === undefined || next.kind === 'break' || next.kind === 'mark';
  if (board.lexicon.language === 'en' || !closes) return verb - REACH;
  let from = verb;
  while (from > 0 && termAt(board, from - 1).kind !== 'break' && !isMark(board, from - 1, ',')) from--;
  return Math.min(from, verb - REACH);
}

/** `no sulfites added`. */
const saysNo = (board: Board, i: number): boolean => [i - 1, i - 2, i - 3].some((k) => isCue(board, k, 'no'));

/** `didn't add`, `do not add`: the negation stands right before the verb. */
const declines = (board: Board, i: number): boolean =>
  isCue(board, isCue(board, i - 1, 'to') ? i - 2 : i - 1, 'not');

const isWrittenWithAccent = (board: Board, i: number): boolean =>
  /\P{ASCII}/u.test(placeOf(board, i, i).text);

/** `ajouté` is past; without its accent it may be `ajoute`. */
const isPast = (board: Board, i: number): boolean =>
  isCue(board, i, 'past') || (isCue(board, i, 'past-if-accented') && isWrittenWithAccent(board, i));

/** In English the order of words tells a question; elsewhere it may be the mark alone. */
const isQuestion = (board: Board): boolean =>
  board.lexicon.language !== 'en' && isMark(board, board.terms.length - 1, '?');

/** The verb that leaves open whether something was done or is to be done, in a message without any accent. */
function findUnclearVerb(board: Board): void {
  const at = board.terms.findIndex((_, i) => isCue(board, i, 'past-if-accented') && isCue(board, i, 'add'));
  if (at < 0 || /\P{ASCII}/u.test(board.message) || !board.terms.some((_, i) => isFree(board, i))) return;
  if (isCue(board, at - 1, 'pronoun') || termAt(board, at).text.includes("'")) return;
  refuse(board, 'ambiguous-number', at, at);
}

/** Whether the verb at term `i` tells what was done: neither asked, negated, conditional nor still to come. */
export function isToldAsFact(board: Board, i: number): boolean {
  const first = board.terms.findIndex(({ kind }) => kind === 'word');
  const asks = first >= 0 && first < i && isCue(board, first, 'question');
  return (
    !asks &&
    !isMark(board, i + 1, '?') &&
    !isQuestion(board) &&
    !cueBetween(board, clauseFrom(board, i), i, 'not') &&
    !saysNo(board, i) &&
    !cueBetween(board, 0, i, 'if') &&
    !cueBetween(board, 0, i, 'not-yet') &&
    !cueBetween(board, 0, i, 'should')
  );
}

/** `T4 got 120 g`: behind a vessel's number. */
const isGot = (board: Board, i: number): boolean =>
  isCue(board, i, 'got') && board.terms[i - 1]?.kind === 'number';

/** Finds that something was added: a past-tense verb that is neither negated, conditional, asked nor still to come. */
export function findPastTense(board: Board): void {
  if (board.marks.pastLine) board.pastTense = true;
  const declined = board.terms.some((_, i) => isCue(board, i, 'add') && declines(board, i));
  if (declined) board.notes.push({ id: 'negated', text: '' });
  const said = board.terms.findIndex(
    (_, i) =>
      board.taken[i] !== true &&
      (isPast(board, i) || ((isCue(board, i, 'put') || isGot(board, i)) && holdsCue(board, 'past-time'))),
  );
  const notPut = board.terms.findIndex((_, i) => isCue(board, i, 'put') && isCue(board, i - 1, 'not'));
  if (notPut >= 0) passOverFigure(board, notPut);
  if (said < 0 && !declined && !board.pastTense) findUnclearVerb(board);
  if (said < 0 || declined) return;
  board.pastTense = isToldAsFact(board, said);
  const negated = cueBetween(board, clauseFrom(board, said), said, 'not') || saysNo(board, said);
  if (!negated) return;
  board.notes.push({ id: 'negated', text: '' });
  passOverFigure(board, said);
}

/** `haven't added 25 ppm`: what did not go in is no reading. */
function passOverFigure(board: Board, verb: number): void {
  const unit = isFree(board, verb + 1) ? concentrationAt(board, verb + 2) : undefined;
  if (unit !== undefined) setAside(board, verb + 1, unit.to);
}
