import type { LocalDate } from './local-time.ts';
import { momentOf } from './moment-of.ts';

/**
 * The first moment of a day of the calendar, in milliseconds since 1970. Where clocks are put forward at midnight it
 * is the one at which they show 1:00.
 *
 * Range: years from 1900 to 2999.
 *
 * @throws RangeError for a date that is none, and for a name that is no zone
 *
 * @example
 * ```ts
 * startOfDay({ year: 2026, month: 11, day: 12 }, 'Europe/Madrid') // => Date.UTC(2026, 10, 11, 23)
 * ```
 */
export function startOfDay({ year, month, day }: LocalDate, zone: string): number {
  return momentOf({ year, month, day, hour: 0, minute: 0 }, zone);
}
