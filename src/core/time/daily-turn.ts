import { isQuiet } from './is-quiet.ts';
import { localTimeOf } from './local-time-of.ts';
import { minuteOfDay } from './minute-of-day.ts';
import { nextDaily, type DailyHours } from './next-daily.ts';

/** Whether the daily message goes out at a moment, and when its next turn is, in milliseconds since 1970. */
export interface DailyTurn {
  readonly is: 'now' | 'later';
  readonly next: number;
}

/**
 * Decides about a daily message whose time has come, be it just now or long ago: it goes out once on a day of the
 * calendar, and never in quiet hours. What is late waits for the next turn where that comes on the same day or where
 * the hours are quiet, so that after a long stop there is one message and not two.
 *
 * Range: any moment; minutes of the day from 0 to 1439.
 *
 * @param at in milliseconds since 1970
 * @param hours with the last time that it went out, where it did (`said_at`)
 * @throws RangeError for a minute that is none, and for a name that is no zone
 *
 * @example
 * ```ts
 * const hours = { at_minute: 450, quiet: { from_minute: 1200, to_minute: 360 }, zone: 'UTC' };
 * dailyTurn(Date.UTC(2026, 10, 12, 7, 30), hours) // => { is: 'now', next: Date.UTC(2026, 10, 13, 7, 30) }
 * dailyTurn(Date.UTC(2026, 10, 12, 15, 10), hours) // => { is: 'now', next: Date.UTC(2026, 10, 13, 7, 30) }
 * dailyTurn(Date.UTC(2026, 10, 12, 7, 10), hours) // => { is: 'later', next: Date.UTC(2026, 10, 12, 7, 30) }
 * dailyTurn(Date.UTC(2026, 10, 12, 23), hours) // => { is: 'later', next: Date.UTC(2026, 10, 13, 7, 30) }
 * ```
 */
export function dailyTurn(at: number, hours: DailyHours & { readonly said_at?: number }): DailyTurn {
  const { zone, said_at } = hours;
  const next = nextDaily(at, hours);
  const saidToday = said_at !== undefined && isOneDay(said_at, at, zone);
  if (saidToday) return { is: 'later', next: isOneDay(next, at, zone) ? nextDaily(next, hours) : next };
  const waits = isQuiet(minuteOfDay(at, zone), hours.quiet) || isOneDay(next, at, zone);
  return { is: waits ? 'later' : 'now', next };
}

function isOneDay(one_at: number, other_at: number, zone: string): boolean {
  const one = localTimeOf(one_at, zone);
  const other = localTimeOf(other_at, zone);
  return one.year === other.year && one.month === other.month && one.day === other.day;
}
