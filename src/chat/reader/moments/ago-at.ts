import type { SaidDay } from '../../../core/time/said-when.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import { countAt, daysAt } from './count-at.ts';

/** How long ago, and the last piece that says so. */
export type AgoAt =
  { readonly hours_ago: number; readonly to: number } | { readonly day: SaidDay; readonly to: number };

/** So many days ago, as a day. */
function dayAgo(days: number): SaidDay | undefined {
  if (!Number.isInteger(days) || days < 1) return undefined;
  if (days === 1) return { is: 'yesterday' };
  return days === 2 ? { is: 'before-yesterday' } : { is: 'days-ago', days };
}

/** `hace 2 horas`, `vor 3 Tagen`: the word that says ago stands before the number. */
function agoBefore(pieces: readonly Piece[], i: number): AgoAt | undefined {
  const days = daysAt(pieces, i + 1);
  if (days) {
    const day = dayAgo(days.count);
    return day && { day, to: days.to };
  }
  const counted = countAt(pieces, i + 1);
  const unit = (counted?.to ?? i) + 1;
  const share = isOwn(pieces, unit, 'hour') ? 1 : isOwn(pieces, unit, 'minute') ? 1 / 60 : undefined;
  return counted && share !== undefined ? { hours_ago: counted.count * share, to: unit } : undefined;
}

/** `2 hours ago`, `half an hour ago`, `30 min ago`, `3 days ago` at a piece. */
export function agoAt(pieces: readonly Piece[], i: number): AgoAt | undefined {
  if (isOwn(pieces, i, 'ago-before')) return agoBefore(pieces, i);
  const days = daysAt(pieces, i);
  if (days) {
    const day = isOwn(pieces, days.to + 1, 'ago') ? dayAgo(days.count) : undefined;
    return day && { day, to: days.to + 1 };
  }
  const counted = countAt(pieces, i);
  if (!counted || !isOwn(pieces, counted.to + 2, 'ago')) return undefined;
  const unit = counted.to + 1;
  const share = isOwn(pieces, unit, 'hour') ? 1 : isOwn(pieces, unit, 'minute') ? 1 / 60 : undefined;
  return share === undefined ? undefined : { hours_ago: counted.count * share, to: unit + 1 };
}
