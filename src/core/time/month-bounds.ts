import type { LocalDate, TimeRange } from './local-time.ts';
import { startOfDay } from './start-of-day.ts';

/**
 * A month of the calendar as a stretch of time in milliseconds since 1970.
 *
 * Range: years from 1900 to 2998, months from 1 to 12.
 *
 * @throws RangeError for a month that is none, and for a name that is no zone
 *
 * @example
 * ```ts
 * monthBounds({ year: 2026, month: 12 }, 'UTC') // => { from: Date.UTC(2026, 11, 1), to: Date.UTC(2027, 0, 1) }
 * ```
 */
export function monthBounds({ year, month }: Pick<LocalDate, 'year' | 'month'>, zone: string): TimeRange {
  const next = month === 12 ? { year: year + 1, month: 1 } : { year, month: month + 1 };
  return { from: startOfDay({ year, month, day: 1 }, zone), to: startOfDay({ ...next, day: 1 }, zone) };
}
