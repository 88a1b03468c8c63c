import type { LocalTime } from './local-time.ts';
import { offsetAt } from './offset-at.ts';

/**
 * What clock and calendar of a zone show at a moment; a minute that has begun is that minute.
 *
 * @param at in milliseconds since 1970, any year from 1900 on
 * @throws RangeError for a name that is no zone
 *
 * @example
 * ```ts
 * localTimeOf(Date.UTC(2026, 10, 12, 8, 30), 'Europe/Madrid') // => { year: 2026, month: 11, day: 12, hour: 9, minute: 30, weekday: 4 }
 * ```
 */
export function localTimeOf(at: number, zone: string): LocalTime {
  const shown = new Date(at + offsetAt(at, zone));
  return {
    year: shown.getUTCFullYear(),
    month: shown.getUTCMonth() + 1,
    day: shown.getUTCDate(),
    hour: shown.getUTCHours(),
    minute: shown.getUTCMinutes(),
    weekday: shown.getUTCDay() || 7,
  };
}
