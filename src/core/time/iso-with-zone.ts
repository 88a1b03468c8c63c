import { MINUTE_ms } from './durations.ts';
import { offsetAt } from './offset-at.ts';

/**
 * A moment as ISO 8601 and RFC 3339 write it, by the clock of a zone and with its offset; seconds are cut, not rounded.
 *
 * @param at in milliseconds since 1970, years from 1900 to 2999
 * @throws RangeError for a name that is no zone
 *
 * @example
 * ```ts
 * isoWithZone(Date.UTC(2026, 10, 12, 8, 30), 'Europe/Madrid') // => '2026-11-12T09:30:00+01:00'
 * isoWithZone(Date.UTC(2026, 10, 12, 8, 30), 'UTC') // => '2026-11-12T08:30:00+00:00'
 * ```
 */
export function isoWithZone(at: number, zone: string): string {
  const offset_ms = offsetAt(at, zone);
  const minutes = Math.round(Math.abs(offset_ms) / MINUTE_ms);
  const shown = new Date(at + offset_ms).toISOString().slice(0, 19);
  return `${shown}${offset_ms < 0 ? '-' : '+'}${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;
}

const two = (count: number): string => String(count).padStart(2, '0');
