import type { Board } from '../board.ts';
import { freshBoard, placeOf } from '../board.ts';
import { findWhen } from '../finders/when.ts';
import type { Piece } from '../own-pieces.ts';
import { isStockAmountAt } from './stock-amount.ts';

/** Longer names and purposes nobody types; own threshold. */
const LONGEST = 60;

/** The words behind a small word up to a lot, a moment, an amount or the end, as they were written. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly text: string;
}

/** `… from Norte, pH 3.5, free 20`: a figure of a wine is no part of a name. */
const tellsOfWine = ({ terms }: Board, from: number, to: number): boolean =>
  terms
    .slice(from, to + 1)
    .some(
      ({ kind, text, tags }) =>
        (kind === 'number' && !/^\d+$/.test(text)) ||
        tags.some((tag) => /^(label:(ph|free|total|so2)|cue:target)$/.test(tag)),
    );

/** The stretch behind a small word: whom something came from, what it was used for. */
export function stretchBehind(board: Board, opener: Piece): Stretch | undefined {
  const seen = freshBoard(board, { tells: true });
  findWhen(seen);
  const behind = board.pieces.slice(board.pieces.indexOf(opener) + 1);
  const ends = behind.findIndex(
    (piece) =>
      piece.ids.includes('lot') ||
      seen.ofWhen?.has(piece) === true ||
      piece.kind === 'break' ||
      /^[:;!]$/.test(piece.text) ||
      isStockAmountAt(board, piece.from),
  );
  const words = ends < 0 ? behind : behind.slice(0, ends);
  const last = words.at(-1);
  if (last === undefined) return undefined;
  // An address may stand behind a comma; one at the end parts what follows.
  const to = last.text === '.' || last.text === ',' ? last.to - 1 : last.to;
  const text = placeOf(board, opener.from, to).text.slice(opener.text.length).trim();
  const isSaid = /\p{L}{2}/u.test(text) && text.length <= LONGEST && !tellsOfWine(board, opener.from, to);
  return isSaid ? { from: opener.from, to, text } : undefined;
}
