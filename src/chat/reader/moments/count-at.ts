import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';

/** So many of something, and the last piece that says so. */
export interface CountAt {
  readonly count: number;
  readonly to: number;
}

const COUNTS: readonly (readonly [OwnWordId, number])[] = [
  ['count-half', 1 / 2],
  ['count-1', 1],
  ['count-2', 2],
  ['count-3', 3],
  ['count-4', 4],
  ['count-5', 5],
  ['count-6', 6],
];

/** The number at a piece, in figures or as a word. */
export function countAt(pieces: readonly Piece[], i: number): CountAt | undefined {
  const piece = pieces[i];
  if (piece?.kind === 'number')
    return /^\d{1,4}$/.test(piece.text) ? { count: Number(piece.text), to: i } : undefined;
  const count = COUNTS.find(([id]) => isOwn(pieces, i, id))?.[1];
  return count === undefined ? undefined : { count, to: i };
}

/** A number of days at a piece: `3 days`, `two weeks`, `a week`. */
export function daysAt(pieces: readonly Piece[], i: number): CountAt | undefined {
  const counted = countAt(pieces, i);
  if (!counted) return undefined;
  const unit = counted.to + 1;
  if (isOwn(pieces, unit, 'day')) return { count: counted.count, to: unit };
  return isOwn(pieces, unit, 'week') ? { count: counted.count * 7, to: unit } : undefined;
}
