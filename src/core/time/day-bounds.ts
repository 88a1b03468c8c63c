import { addDays } from './add-days.ts';
import type { LocalDate, TimeRange } from './local-time.ts';
import { startOfDay } from './start-of-day.ts';

/**
 * A day of the calendar as a stretch of time in milliseconds since 1970: 24 hours, or 23 or 25 when clocks are
 * changed. For the day of a moment hand in its `localTimeOf`.
 *
 * Range: years from 1900 to 2998.
 *
 * @throws RangeError for a date that is none, and for a name that is no zone
 *
 * @example
 * ```ts
 * const { from, to } = dayBounds({ year: 2026, month: 10, day: 25 }, 'Europe/Madrid');
 * (to - from) / 3600000 // => 25
 * ```
 */
export function dayBounds(date: LocalDate, zone: string): TimeRange {
  return { from: startOfDay(date, zone), to: startOfDay(addDays(date, 1), zone) };
}
