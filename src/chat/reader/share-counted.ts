import type { Board } from './board.ts';
import { findingOf, holdsCue, placeOf } from './board.ts';

/** No barrel holds more, in litres; common practice, no source. */
const LARGEST_BARREL_L = 700;

/** From this on the share of one is a barrel as well, in litres, so that nobody knows; common practice, no source. */
const USUAL_BARREL_FROM_L = 200;

/** Whether a volume beside several barrels can only be of each: shared out it would be no barrel. */
export function isOfEach(volume_L: number, count: number): boolean {
  return volume_L <= LARGEST_BARREL_L && volume_L / count < USUAL_BARREL_FROM_L;
}

/**
 * `34 barrels, mixed sample …, 225 L`: a volume that stands away from the number of barrels is of each where shared out it
 * would be none, which is said; `3 barrels …, 675 L` is asked.
 */
export function shareCounted(board: Board, fields: Record<string, unknown>): void {
  const place = findingOf(board, 'volume_L');
  const { barrelsCounted, containers: count = 1, statedEach, statedTotal } = board.marks;
  if (!barrelsCounted || count < 2 || place === undefined) return;
  const { text } = placeOf(board, place.from, place.to);
  const isEach = statedEach || holdsCue(board, 'each');
  if (isEach || (!isAll(board, statedTotal) && isOfEach(place.value, count))) {
    fields['volume_L'] = place.value * count;
    if (!isEach) board.notes.push({ id: 'each-or-total', text });
  } else if (!isAll(board, statedTotal) && place.value <= LARGEST_BARREL_L) {
    delete fields['volume_L'];
    board.marks.eachOrTotal = true;
    board.problems.push({ code: 'ambiguous-number', about: text });
    board.notes.push({ id: 'each-or-total', text: '' });
  }
}

const isAll = (board: Board, stated: true | undefined): boolean =>
  stated === true || holdsCue(board, 'altogether');
