import type { Board } from '../board.ts';
import { findingOf, freshBoard, termAt } from '../board.ts';
import { findVessel } from '../finders/vessel.ts';
import type { Piece } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';

/** A message as talk to the bot: what it says beside a vessel, without the marks that only part its words. */
export interface Talk {
  /** A fresh board on which the vessel is found and nothing else. */
  readonly board: Board;
  readonly said: readonly Piece[];
  readonly isOfVessel: boolean;
  readonly isQuestion: boolean;
  /** It begins with a stroke, as chat platforms mark their commands. */
  readonly isSlashed: boolean;
}

const STOPS = new Set([',', '.', '!', '?', '¿', ';', '…']);

/** A colon between figures is the clock's. */
const isClocks = (pieces: readonly Piece[], k: number): boolean =>
  pieces[k]?.gap === false && pieces[k + 1]?.kind === 'number' && pieces[k + 1]?.gap === false;

const partsWords = (pieces: readonly Piece[], k: number): boolean => {
  const piece = pieces[k];
  if (piece?.kind === 'break') return true;
  if (piece?.kind !== 'mark') return false;
  const isJoint = piece.text === '_' && !piece.gap;
  return STOPS.has(piece.text) || isJoint || (piece.text === ':' && !isClocks(pieces, k));
};

/** `/today@some_bot`: the pieces between the stroke and the name of the bot, and what follows. */
function withoutAddress(pieces: readonly Piece[]): readonly Piece[] {
  if (pieces[0]?.text !== '/' || pieces[1]?.gap !== false) return pieces;
  const at = pieces.findIndex(({ text, gap }) => text === '@' && !gap);
  if (at < 0) return pieces.slice(1);
  let k = at + 1;
  while (pieces[k]?.gap === false) k++;
  return [...pieces.slice(1, at), ...pieces.slice(k)];
}

/** A message as talk to the bot, its vessel found. */
export function talkOf(board: Board): Talk {
  const own = freshBoard(board);
  findVessel(own);
  const { pieces } = own;
  const addressed = withoutAddress(pieces);
  const said = addressed.filter((piece, k) => !partsWords(addressed, k) && own.taken[piece.from] !== true);
  return {
    board: own,
    said,
    isOfVessel: findingOf(own, 'vessel') !== undefined && own.findings.length === 1,
    isQuestion: termAt(own, own.terms.length - 1).text === '?',
    isSlashed: addressed.length < pieces.length,
  };
}

/** Whether something in the message is one of those words. */
export const says = ({ said }: Talk, ...ids: readonly OwnWordId[]): boolean =>
  said.some((piece) => piece.ids.some((id) => ids.includes(id)));

/** Whether every piece is one of those words, or courtesy, or among the pieces that are read otherwise. */
export const saysOnly = (
  { said }: Talk,
  ids: readonly OwnWordId[],
  others: ReadonlySet<Piece> = new Set(),
): boolean =>
  said.every((piece) => others.has(piece) || piece.ids.some((id) => id === 'filler' || ids.includes(id)));
