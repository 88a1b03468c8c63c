import type { LocalDate } from './local-time.ts';

/**
 * Whether the calendar has this day. Years from 1900 to 2999 (own range), months from 1 to 12.
 *
 * @example
 * ```ts
 * isDate({ year: 2028, month: 2, day: 29 }) // => true
 * isDate({ year: 2026, month: 11, day: 31 }) // => false
 * ```
 */
export function isDate({ year, month, day }: LocalDate): boolean {
  if (!(year >= 1900 && year <= 2999)) return false;
  const date = new Date(Date.UTC(year, month - 1, day));
  return date.getUTCFullYear() === year && date.getUTCMonth() === month - 1 && date.getUTCDate() === day;
}
