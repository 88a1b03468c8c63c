import { assertBetween } from '../bounds.ts';
import { HOUR_ms } from './durations.ts';
import type { LocalDate, ZonedMoment } from './local-time.ts';
import { momentOf } from './moment-of.ts';
import { resolveDay } from './resolve-day.ts';
import type { SaidWhen } from './said-when.ts';
import { startOfDay } from './start-of-day.ts';

/** What a said moment comes to, in milliseconds since 1970. */
export type ResolvedWhen =
  | { readonly is: 'moment'; readonly at: number }
  /** A day without an hour: no moment is known, and none is made up. */
  | { readonly is: 'day'; readonly date: LocalDate }
  /** It is still to come, so that nothing can have happened then: whoever said it is asked. */
  | { readonly is: 'future'; readonly at: number }
  | { readonly is: 'no-such-day' };

/** A clock on a wall is forgiven so much: what it calls the next hour is now (own choice). */
const FAST_CLOCK_ms = HOUR_ms;

/**
 * The moment that somebody means by what they said of something that has happened. An hour alone is today's; up to an
 * hour ahead it is taken as now, further ahead it is `future` and never yesterday's. Nothing said is now.
 *
 * Range: hours from 0 to 23, minutes from 0 to 59, `hours_ago` at least 0.
 *
 * @param here when and where it is said, in milliseconds since 1970
 * @throws RangeError for an hour that no clock shows, and for a name that is no zone
 *
 * @example
 * ```ts
 * const here = { at: Date.UTC(2026, 10, 12, 8, 30), zone: 'Europe/Madrid' };
 * resolveWhen({ hour: 8, minute: 10 }, here) // => { is: 'moment', at: Date.UTC(2026, 10, 12, 7, 10) }
 * resolveWhen({ hour: 17 }, here) // => { is: 'future', at: Date.UTC(2026, 10, 12, 16) }
 * resolveWhen({ day: { is: 'yesterday' } }, here) // => { is: 'day', date: { year: 2026, month: 11, day: 11 } }
 * ```
 */
export function resolveWhen(said: SaidWhen, here: ZonedMoment): ResolvedWhen {
  const { hour, minute = 0, hours_ago } = said;
  if (hours_ago !== undefined) {
    assertBetween('tell the moment', 'hours_ago', hours_ago, 0);
    return { is: 'moment', at: here.at - hours_ago * HOUR_ms };
  }
  if (said.day === undefined && hour === undefined) return { is: 'moment', at: here.at };
  const day = resolveDay(said.day ?? { is: 'today' }, here);
  if (day.is === 'no-such-day') return day;
  if (hour === undefined) {
    return day.is === 'day' ? day : { is: 'future', at: startOfDay(day.date, here.zone) };
  }
  const at = momentOf({ ...day.date, hour, minute }, here.zone);
  if (at - here.at > FAST_CLOCK_ms) return { is: 'future', at };
  return { is: 'moment', at: Math.min(at, here.at) };
}
