import type { Board } from '../../board.ts';
import { findingOf, freshBoard, isMark, termAt, wordsOf } from '../../board.ts';
import type { Command } from '../../command.ts';
import { findVessel } from '../../finders/vessel.ts';
import type { Draft } from '../../understood.ts';
import { draftOfBoard } from '../../draft-of-board.ts';
import type { Term } from '../../split-terms.ts';

/** A name of a lot has not more terms; own threshold. */
const MOST_TERMS = 9;
const MOST_LETTERS = 60;

/** What tells that the words behind the sign are something of the wine or its treatment, and no name. */
const SPEAKS =
  /^(unit:(?!none)|label:|additive:|stage:|cue:(vessel-statement|past$|not$|if$|target|add$|need$|verb|how-much|question|ml$|in-store|buy|of$))/;

const isName = ({ kind, tags, text }: Term): boolean =>
  kind === 'word' && text.length > 1 && (tags.length === 0 || tags.includes('cue:variety'));

/** A number of a name: a vintage, or one that is joined to letters or a hyphen. */
const isNumberOfName = (board: Board, i: number): boolean => {
  const joined = (k: number): boolean => termAt(board, k).gap === false;
  return (
    /^(19|20)\d\d$/.test(termAt(board, i).text) ||
    joined(i) ||
    (joined(i + 1) && termAt(board, i + 1).text !== '.')
  );
};

/** Whether terms from `from` to the end are a name; after the word lot a number alone is one too. */
function isLot(board: Board, from: number, to: number, isWorded: boolean): boolean {
  const terms = board.terms.slice(from, to + 1);
  if (terms.length === 0 || terms.length > MOST_TERMS) return false;
  if (terms.some(({ kind, tags }) => kind === 'break' || tags.some((tag) => SPEAKS.test(tag)))) return false;
  if (terms.some(({ kind, text }) => kind === 'mark' && !/^[-/_.#&']$/.test(text))) return false;
  const numbers = terms.flatMap(({ kind }, k) => (kind === 'number' ? [from + k] : []));
  if (isWorded) {
    const isCapital = (i: number): boolean => board.folded.capital[termAt(board, i).start] === true;
    const words = terms.flatMap(({ kind }, k) => (kind === 'word' ? [from + k] : []));
    // `T4 lot 2026 arrived today` is a sentence; names have capitals, or one word.
    if (words.length > 1 && !words.every((i) => isCapital(i) || !termAt(board, i).gap)) return false;
    const isSingle = terms.length === 1;
    return (
      (numbers.length > 0 || isCapital(from)) && (isSingle || numbers.every((i) => isNumberOfName(board, i)))
    );
  }
  const isCode = terms.length > 1 && numbers.some((i) => termAt(board, i).gap === false);
  return (terms.some(isName) || isCode) && numbers.every((i) => isNumberOfName(board, i));
}

/** Where the name begins behind the vessel, and whether the word lot leads to it. */
function nameAt(board: Board, k: number): { from: number; isWorded: boolean } | undefined {
  let at = k;
  const isLotWord = (i: number): boolean =>
    board.pieces.some(({ from, ids }) => from === i && ids.includes('lot'));
  const isJoint = (i: number): boolean =>
    isMark(board, i, ':') || isMark(board, i, ',') || isMark(board, i, '=') ||
    board.pieces.some(({ from, ids }) => from === i && (ids.includes('is') || ids.includes('number'))); // prettier-ignore
  const isSigned = isMark(board, at, '=');
  while (isJoint(at)) at++;
  if (!isLotWord(at)) return isSigned ? { from: at, isWorded: false } : undefined;
  at++;
  while (isJoint(at) || isMark(board, at, '#') || isMark(board, at, '.')) at++;
  return { from: at, isWorded: true };
}

/** Reads which lot is in a vessel: `T4 = Blanca 2026`, `T4: lot BL-26`; the name is in the person's own words. */
export function readLot(board: Board): Draft | undefined {
  const own = freshBoard(board);
  findVessel(own);
  const vessel = findingOf(own, 'vessel');
  const isFirst = own.pieces.every(({ from, ids }) => from >= (vessel?.from ?? 0) || ids.includes('filler'));
  if (vessel === undefined || !isFirst) return undefined;
  const name = nameAt(own, vessel.to + 1);
  let to = own.terms.length - 1;
  while (to >= 0 && (termAt(own, to).kind === 'break' || /^[.!,]$/.test(termAt(own, to).text))) to--;
  if (!name || !isLot(own, name.from, to, name.isWorded)) return undefined;
  // `T4 = T5`: another tank is no lot.
  const other = own.findings.find(({ field, from }) => field === 'vessel' && from === name.from)?.value;
  const isVessel = typeof other === 'string' && /^(tank|barrel) /.test(other);
  if (isVessel) return undefined;
  const lot = wordsOf(own, name.from, to);
  const isToCome = own.pieces.some(({ ids }) => ids.includes('tomorrow') || ids.includes('next-week'));
  if (lot.length > MOST_LETTERS || isToCome) return undefined;
  own.findings.splice(0, own.findings.length, vessel);
  const command: Command = { name: 'lot', lot };
  return { ...draftOfBoard(own, 'command'), command };
}
