import { DAY_ms } from '../time/durations.ts';

/**
 * When somebody is reminded who asked for it under an addition: exactly 24 hours after it went in, whatever clocks
 * show then and also in quiet hours, as it is what they asked for. In milliseconds since 1970.
 *
 * Range: any moment.
 *
 * @param added_at when it went in, in milliseconds since 1970
 *
 * @example
 * ```ts
 * reminderAt(Date.UTC(2026, 10, 12, 21, 5)) // => Date.UTC(2026, 10, 13, 21, 5)
 * ```
 */
export function reminderAt(added_at: number): number {
  return added_at + DAY_ms;
}
