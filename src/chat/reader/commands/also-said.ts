import type { Board } from '../board.ts';
import { findingOf } from '../board.ts';
import { isToldAsFact } from '../finders/past-tense.ts';
import type { Marks } from '../understood.ts';

const DONE = ['racked', 'moved', 'topped', 'blended', 'acidified'] as const;

/** What was done to the vessel, where that is told beside its readings: `racked T4 6100 L free 21 pH 3.5`. */
export function alsoSaid(board: Board): Marks['alsoSaid'] {
  const vessel = findingOf(board, 'vessel');
  for (const [k, piece] of board.pieces.entries()) {
    if (piece.ids.length === 0) continue;
    const done = DONE.find((id) => piece.ids.includes(id));
    // `two barrels topped from it` is no matter of the vessel's.
    const isBeside = board.pieces[k + 1]?.from === vessel?.from || board.pieces[k - 1]?.to === vessel?.to;
    if (done !== undefined && vessel && isBeside && isToldAsFact(board, piece.from))
      return done === 'acidified' ? 'acid' : done;
  }
  return undefined;
}
