import type { ClockSpan } from './local-time.ts';

/**
 * Whether a minute of the day lies in quiet hours. They may wrap midnight; from and to the same minute there are none.
 *
 * @param minute of the day, from 0 to 1439
 *
 * @example
 * ```ts
 * isQuiet(1200, { from_minute: 1200, to_minute: 360 }) // => true
 * isQuiet(360, { from_minute: 1200, to_minute: 360 }) // => false
 * ```
 */
export function isQuiet(minute: number, { from_minute, to_minute }: ClockSpan): boolean {
  if (from_minute <= to_minute) return minute >= from_minute && minute < to_minute;
  return minute >= from_minute || minute < to_minute;
}
