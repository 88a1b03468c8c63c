import type { Board } from './board.ts';
import { findingOf, holdsCue, isFound, placeOf, termAt } from './board.ts';
import { alsoSaid } from './commands/also-said.ts';
import { readOwn } from './commands/read-own.ts';
import { draftOfBoard } from './draft-of-board.ts';
import { USUAL_BARREL_L } from './finders/barrels.ts';
import { isForeignTalk } from './message-language.ts';
import { decideIntent } from './refine/intent.ts';
import { runFinders } from './run-finders.ts';
import { isStranger } from './stranger.ts';
import { readTitration } from './titration/read-titration.ts';
import type { Draft } from './understood.ts';

/** One numbered barrel without a size counts as a usual one. */
function assumeBarrel(board: Board): void {
  const vessel = findingOf(board, 'vessel')?.value;
  if (vessel?.startsWith('barrel ') && !isFound(board, 'volume_L') && !board.marks.casksWithoutSize)
    board.marks.barrelsAssumed_L ??= USUAL_BARREL_L;
}

/** `puncheon 3`: the word names the vessel, and says too that its size is not a barrel's. */
function noteCask(board: Board): void {
  const named = findingOf(board, 'vessel');
  if (
    named &&
    board.terms
      .slice(named.from, named.to + 1)
      .some((_, k) => termAt(board, named.from + k).tags.includes('vessel:cask'))
  )
    board.marks.casksWithoutSize = true;
}

/** More figures than one reading can hold; own threshold, so that no text takes long. */
const MOST_FIGURES = 100;

const holdsTooMany = ({ terms }: Board): boolean =>
  terms.length > MOST_FIGURES && terms.filter(({ kind }) => kind === 'number').length > MOST_FIGURES;

/** Nobody can tell which of so many figures is which. */
const tooManyFigures = (board: Board): Draft => ({
  intent: 'dose',
  fields: {},
  problems: [{ code: 'ambiguous-number', about: placeOf(board, 0, 5).text }],
  setAside: [],
  notes: [],
  marks: {},
  where: {},
});

/** Words of another language beside a reading: what they said is not in it, and that has to be told. */
function noteUnread(board: Board, intent: Draft['intent']): void {
  if (intent === 'chat' || !isForeignTalk(board.terms, board.lexicon)) return;
  const unread = board.terms.flatMap((_, i) => (isStranger(board, i) ? [placeOf(board, i, i).text] : []));
  if (unread.length > 0) board.notes.push({ id: 'unread-words', text: unread.slice(0, 6).join(', ') });
}

/**
 * Reads a board: one of the bot's own words or a statement, which take the whole of it, else whatever the finders find;
 * and says what the message wants.
 *
 * @param board The table with the terms of one line or message; it is written on.
 * @param how Whether it is certain to be a reading.
 */
export function readDraft(board: Board, how: { readonly isNoTalk?: boolean } = {}): Draft {
  if (holdsTooMany(board)) return tooManyFigures(board);
  const titration = readTitration(board);
  if (titration) return titration;
  const own = how.isNoTalk ? undefined : readOwn(board);
  if (own) return own;
  runFinders(board);
  noteCask(board);
  assumeBarrel(board);
  const intent = decideIntent(board);
  const draft = draftOfBoard(board, intent);
  if (intent === 'dose' && isFound(board, 'mass_g'))
    board.notes.push({ id: 'mass-beside-readings', text: '' });
  if (board.marks.fruitByWeight) board.notes.push({ id: 'fruit-by-weight', text: '' });
  noteUnread(board, intent);
  if (holdsCue(board, 'wick')) board.marks.wick = true;
  if (board.pieces.some(({ ids }) => ids.includes('if'))) board.marks.conditional = true;
  if (board.pieces.some(({ ids }) => ids.includes('acid'))) board.marks.acid = true;
  const toCome = board.pieces.find(({ ids }) => ids.includes('tomorrow') || ids.includes('next-week'));
  if (toCome) board.marks.toCome = toCome.text;
  const also = intent === 'chat' ? undefined : alsoSaid(board);
  if (also) board.marks.alsoSaid = also;
  return draft;
}
