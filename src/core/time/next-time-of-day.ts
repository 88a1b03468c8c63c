import { assertBetween } from '../bounds.ts';
import { addDays } from './add-days.ts';
import { localTimeOf } from './local-time-of.ts';
import { momentOf } from './moment-of.ts';

/**
 * The next moment after `at`, never `at` itself, at which the clocks of a zone show this minute of the day. There is
 * one on each day of the calendar: where clocks show the minute twice the first time, and where they skip it as much
 * later as they skip.
 *
 * Range: minutes from 0 (midnight) to 1439, any year from 1900 to 2998.
 *
 * @param at in milliseconds since 1970; so is what is returned
 * @throws RangeError for a minute that is none, and for a name that is no zone
 *
 * @example
 * ```ts
 * nextTimeOfDay(Date.UTC(2026, 9, 24, 5, 30), { at_minute: 450, zone: 'Europe/Madrid' }) // => Date.UTC(2026, 9, 25, 6, 30)
 * nextTimeOfDay(Date.UTC(2026, 9, 24, 5, 29), { at_minute: 450, zone: 'Europe/Madrid' }) // => Date.UTC(2026, 9, 24, 5, 30)
 * ```
 */
export function nextTimeOfDay(
  at: number,
  { at_minute, zone }: { readonly at_minute: number; readonly zone: string },
): number {
  assertBetween('find the next time of day', 'at_minute', at_minute, 0, 1439);
  const today = localTimeOf(at, zone);
  const hour = Math.floor(at_minute / 60);
  for (let days = 0; ; days += 1) {
    const moment = momentOf({ ...addDays(today, days), hour, minute: at_minute % 60 }, zone);
    if (moment > at) return moment;
  }
}
