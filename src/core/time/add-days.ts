import { DAY_ms } from './durations.ts';
import { isDate } from './is-date.ts';
import type { LocalDate } from './local-time.ts';

/**
 * The day so many days of the calendar later; earlier where the number is negative.
 *
 * Range: years from 1900 to 2999.
 *
 * @param count how many days, a whole number
 * @throws RangeError for a date that is none
 *
 * @example
 * ```ts
 * addDays({ year: 2026, month: 12, day: 31 }, 1) // => { year: 2027, month: 1, day: 1 }
 * addDays({ year: 2028, month: 3, day: 1 }, -1) // => { year: 2028, month: 2, day: 29 }
 * ```
 */
export function addDays(date: LocalDate, count: number): LocalDate {
  const { year, month, day } = date;
  if (!isDate(date) || !Number.isInteger(count)) {
    throw new RangeError(`Cannot add ${count} days to ${year}-${month}-${day}`);
  }
  const later = new Date(Date.UTC(year, month - 1, day) + count * DAY_ms);
  return { year: later.getUTCFullYear(), month: later.getUTCMonth() + 1, day: later.getUTCDate() };
}
