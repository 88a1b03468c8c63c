import { addDays } from './add-days.ts';
import { isDate } from './is-date.ts';
import type { LocalDate, ZonedMoment } from './local-time.ts';
import { localTimeOf } from './local-time-of.ts';
import type { SaidDay } from './said-when.ts';

/** A day of the calendar, today or before; or one that is still to come; or one that no calendar has. */
export type ResolvedDay =
  | { readonly is: 'day'; readonly date: LocalDate }
  | { readonly is: 'future'; readonly date: LocalDate }
  | { readonly is: 'no-such-day' };

/** So far back a leap day is looked for: around a century without one, eight years pass. */
const LEAP_DAY_YEARS = 8;

/**
 * The day of the calendar that somebody means. A date without a year is the last one that is not in the future; a day
 * of the week is never today, and at most seven days ago.
 *
 * @param here when and where it is said, in milliseconds since 1970
 * @throws RangeError for a name that is no zone
 *
 * @example
 * ```ts
 * const here = { at: Date.UTC(2026, 10, 12, 8), zone: 'Europe/Madrid' };
 * resolveDay({ is: 'yesterday' }, here) // => { is: 'day', date: { year: 2026, month: 11, day: 11 } }
 * resolveDay({ is: 'date', day: 24, month: 12 }, here) // => { is: 'day', date: { year: 2025, month: 12, day: 24 } }
 * resolveDay({ is: 'date', day: 31, month: 11 }, here) // => { is: 'no-such-day' }
 * ```
 */
export function resolveDay(said: SaidDay, here: ZonedMoment): ResolvedDay {
  const today = localTimeOf(here.at, here.zone);
  const before = (days: number): ResolvedDay => ({ is: 'day', date: addDays(today, -days) });
  switch (said.is) {
    case 'today':
      return before(0);
    case 'yesterday':
      return before(1);
    case 'before-yesterday':
      return before(2);
    case 'days-ago':
      return before(said.days);
    case 'weekday':
      return before((today.weekday - said.weekday + 7) % 7 || 7);
    case 'date':
      return resolveDate(said, today);
  }
}

function resolveDate(said: SaidDay & { readonly is: 'date' }, today: LocalDate): ResolvedDay {
  const { day, month } = said;
  if (said.year !== undefined) {
    const date = { year: said.year, month, day };
    if (!isDate(date)) return { is: 'no-such-day' };
    return { is: isAfter(date, today) ? 'future' : 'day', date };
  }
  for (let year = today.year; year >= today.year - LEAP_DAY_YEARS; year -= 1) {
    const date = { year, month, day };
    if (isDate(date) && !isAfter(date, today)) return { is: 'day', date };
  }
  return { is: 'no-such-day' };
}

const isAfter = (one: LocalDate, other: LocalDate): boolean => orderOf(one) > orderOf(other);
const orderOf = ({ year, month, day }: LocalDate): number => (year * 100 + month) * 100 + day;
