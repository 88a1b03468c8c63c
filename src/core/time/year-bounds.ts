import type { TimeRange } from './local-time.ts';
import { startOfDay } from './start-of-day.ts';

/**
 * A year of the calendar as a stretch of time in milliseconds since 1970.
 *
 * @param year from 1900 to 2998
 * @throws RangeError outside that, and for a name that is no zone
 *
 * @example
 * ```ts
 * yearBounds(2026, 'UTC') // => { from: Date.UTC(2026, 0, 1), to: Date.UTC(2027, 0, 1) }
 * ```
 */
export function yearBounds(year: number, zone: string): TimeRange {
  return {
    from: startOfDay({ year, month: 1, day: 1 }, zone),
    to: startOfDay({ year: year + 1, month: 1, day: 1 }, zone),
  };
}
