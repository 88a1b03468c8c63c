import { DAY_ms } from './durations.ts';
import { isQuiet } from './is-quiet.ts';
import type { ClockSpan } from './local-time.ts';
import { minuteOfDay } from './minute-of-day.ts';
import { nextTimeOfDay } from './next-time-of-day.ts';

/** When the daily message of a chat goes out: a minute of the day in an IANA zone, and the hours that are quiet. */
export interface DailyHours {
  readonly at_minute: number;
  readonly quiet: ClockSpan;
  readonly zone: string;
}

/**
 * The next moment after `at`, never `at` itself, at which the daily message may go out. An hour that is quiet moves to
 * the end of the quiet hours.
 *
 * Range: minutes from 0 to 1439.
 *
 * @param at in milliseconds since 1970; so is what is returned
 * @throws RangeError for a minute that is none, and for a name that is no zone
 *
 * @example
 * ```ts
 * const hours = { at_minute: 450, quiet: { from_minute: 1200, to_minute: 360 }, zone: 'Europe/Madrid' };
 * nextDaily(Date.UTC(2026, 10, 12, 8), hours) // => Date.UTC(2026, 10, 13, 6, 30)
 * nextDaily(Date.UTC(2026, 10, 12, 8), { ...hours, at_minute: 300 }) // => Date.UTC(2026, 10, 13, 5)
 * ```
 */
export function nextDaily(at: number, { at_minute, quiet, zone }: DailyHours): number {
  // What was set for the hours before may have moved to after `at`.
  let set = at - DAY_ms - 1;
  for (;;) {
    set = nextTimeOfDay(set, { at_minute, zone });
    const allowed = isQuiet(minuteOfDay(set, zone), quiet)
      ? nextTimeOfDay(set, { at_minute: quiet.to_minute, zone })
      : set;
    if (allowed > at) return allowed;
  }
}
