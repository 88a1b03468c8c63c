import { localTimeOf } from './local-time-of.ts';

/**
 * The minute of the day that the clocks of a zone show, from 0 to 1439.
 *
 * @param at in milliseconds since 1970, any year from 1900 on
 * @throws RangeError for a name that is no zone
 *
 * @example
 * ```ts
 * minuteOfDay(Date.UTC(2026, 10, 12, 6, 30), 'Europe/Madrid') // => 450
 * ```
 */
export function minuteOfDay(at: number, zone: string): number {
  const { hour, minute } = localTimeOf(at, zone);
  return hour * 60 + minute;
}
