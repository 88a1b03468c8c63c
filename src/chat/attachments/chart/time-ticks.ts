import { addDays } from '../../../core/time/add-days.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import { localTimeOf } from '../../../core/time/local-time-of.ts';
import { startOfDay } from '../../../core/time/start-of-day.ts';
import type { LocalDate, TimeRange } from '../../../core/time/local-time.ts';

/** So many months. */
interface MonthStep {
  /** How many, of the calendar. */
  readonly months: number;
}

/** From one mark of the time to the next: so many days, or so many months. */
export type TickStep = { readonly days: number } | MonthStep;

/** Steps that people count in, from narrow to wide. */
export const TICK_STEPS: readonly TickStep[] = [
  ...[1, 2, 7, 14].map((days) => ({ days })),
  ...[1, 2, 3, 6, 12, 24, 60, 120, 240, 600, 1200].map((months) => ({ months })),
];

/** The beginnings of days or months within a stretch of time, as the calendar of a zone has them. */
export function timeTicks({ from, to }: TimeRange, step: TickStep, zone: string): number[] {
  const found: number[] = [];
  let date = firstDate(localTimeOf(from, zone), step);
  for (;;) {
    const moment = startOfDay(date, zone);
    if (moment > to) return found;
    if (moment >= from) found.push(moment);
    date = nextDate(date, step);
  }
}

/** The last mark on or before a day. Days are counted from a Monday, so that weeks begin there. */
function firstDate({ year, month, day }: LocalDate, step: TickStep): LocalDate {
  if ('days' in step) {
    const count = Date.UTC(year, month - 1, day) / DAY_ms - MONDAY;
    return addDays({ year, month, day }, -(((count % step.days) + step.days) % step.days));
  }
  const count = year * 12 + month - 1;
  return dateOf(count - (count % step.months));
}

function nextDate(date: LocalDate, step: TickStep): LocalDate {
  return 'days' in step ? addDays(date, step.days) : dateOf(date.year * 12 + date.month - 1 + step.months);
}

const dateOf = (months: number): LocalDate => ({
  year: Math.floor(months / 12),
  month: (months % 12) + 1,
  day: 1,
});

/** 5 January 1970, in days since 1970. */
const MONDAY = 4;
