import { tzOffset } from '@date-fns/tz/tzOffset';

import { MINUTE_ms } from './durations.ts';

/**
 * How far the clocks of a zone are ahead of UTC at a moment, in milliseconds; negative in the west. This is all that
 * is asked of the time zone database; it is the one that Node carries.
 *
 * @param at in milliseconds since 1970, any year from 1900 on
 * @throws RangeError for a name that is no zone
 *
 * @example
 * ```ts
 * offsetAt(Date.UTC(2026, 0, 1), 'Europe/Madrid') // => 3600000
 * offsetAt(Date.UTC(2026, 6, 1), 'Australia/Adelaide') // => 34200000
 * offsetAt(0, 'Nowhere/Land') // => throws RangeError
 * ```
 */
export function offsetAt(at: number, zone: string): number {
  const offset: unknown = tzOffset(zone, new Date(at));
  // A name such as `toString` finds something else than a number in the library's cache.
  if (typeof offset !== 'number' || !Number.isFinite(offset)) {
    throw new RangeError(`Cannot tell the time at ${at} in the zone "${zone}"`);
  }
  return offset * MINUTE_ms;
}
