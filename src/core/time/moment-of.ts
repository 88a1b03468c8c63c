import { DAY_ms } from './durations.ts';
import { isDate } from './is-date.ts';
import type { LocalMinute } from './local-time.ts';
import { offsetAt } from './offset-at.ts';

/**
 * The moment, in milliseconds since 1970, at which the clocks of a zone show this minute. Where they are put back and
 * show it twice, the first time; where they are put forward over it, as much later as they skip, so that half past
 * two is half past three (both as in RFC 5545, section 3.3.5).
 *
 * Range: years from 1900 to 2999, minutes from 0:00 to 23:59.
 *
 * @throws RangeError for what no calendar or clock shows, and for a name that is no zone
 *
 * @example
 * ```ts
 * momentOf({ year: 2026, month: 11, day: 12, hour: 9, minute: 30 }, 'Europe/Madrid') // => Date.UTC(2026, 10, 12, 8, 30)
 * momentOf({ year: 2026, month: 3, day: 29, hour: 2, minute: 30 }, 'Europe/Madrid') // => Date.UTC(2026, 2, 29, 1, 30)
 * momentOf({ year: 2026, month: 10, day: 25, hour: 2, minute: 30 }, 'Europe/Madrid') // => Date.UTC(2026, 9, 25, 0, 30)
 * ```
 */
export function momentOf(local: LocalMinute, zone: string): number {
  const { year, month, day, hour, minute } = local;
  if (!isDate(local) || !isWhole(hour, 23) || !isWhole(minute, 59)) {
    throw new RangeError(`Cannot tell the moment of ${year}-${month}-${day} ${hour}:${minute}`);
  }
  const shown = Date.UTC(year, month - 1, day, hour, minute);
  // Clocks are not changed twice within two days, so that the offset is one of these two.
  const before = offsetAt(shown - DAY_ms, zone);
  const after = offsetAt(shown + DAY_ms, zone);
  const moments = [shown - before, shown - after].filter((at) => at + offsetAt(at, zone) === shown);
  return moments.length === 0 ? shown - before : Math.min(...moments);
}

const isWhole = (value: number, max: number): boolean =>
  Number.isInteger(value) && value >= 0 && value <= max;
