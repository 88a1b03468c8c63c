import { expect, test } from 'vitest';
import { addDays } from '../../../src/core/time/add-days.ts';
import { isDate } from '../../../src/core/time/is-date.ts';
import { monthBounds } from '../../../src/core/time/month-bounds.ts';
import { yearBounds } from '../../../src/core/time/year-bounds.ts';
import { written } from './written.ts';

// Python 3.11 datetime: `date.fromisoformat(a) + timedelta(days=n)`.
test.each([
  ['2026-11-12', 30, '2026-12-12'],
  ['2026-12-31', 1, '2027-01-01'],
  ['2028-02-28', 1, '2028-02-29'],
  ['2026-02-28', 1, '2026-03-01'],
  ['2100-02-28', 1, '2100-03-01'],
  ['2026-03-29', -30, '2026-02-27'],
  ['2026-01-01', -366, '2024-12-31'],
  ['2026-06-30', 0, '2026-06-30'],
])('%s and %i days is %s', (date, count, later) => {
  const { hour: _hour, minute: _minute, ...expected } = written(later);
  expect(addDays(written(date), count)).toEqual(expected);
});

test.each(['2026-02-29', '2026-00-10', '2026-13-10', '2026-06-31', '2026-06-00', '2100-02-29', '1899-12-31'])(
  '%s is no date to count with',
  (date) => {
    expect(isDate(written(date))).toBe(false);
    expect(() => addDays(written(date), 1)).toThrow(RangeError);
  },
);

test('half a day is no day of the calendar', () => {
  expect(() => addDays({ year: 2026, month: 1, day: 1 }, 0.5)).toThrow(RangeError);
});

// Python 3.11 zoneinfo, tzdata 2025b.
test.each([
  ['Europe/Madrid', 2026, 11, '2026-10-31T23:00Z', '2026-11-30T23:00Z'],
  ['Europe/Madrid', 2026, 10, '2026-09-30T22:00Z', '2026-10-31T23:00Z'],
  ['Europe/Madrid', 2026, 12, '2026-11-30T23:00Z', '2026-12-31T23:00Z'],
  ['Australia/Adelaide', 2028, 2, '2028-01-31T13:30Z', '2028-02-29T13:30Z'],
])('in %s the month %i-%i lasts from %s to %s', (zone, year, month, from, to) => {
  expect(monthBounds({ year, month }, zone)).toEqual({ from: Date.parse(from), to: Date.parse(to) });
});

test.each([
  ['Europe/Madrid', 2026, '2025-12-31T23:00Z', '2026-12-31T23:00Z'],
  ['America/New_York', 2028, '2028-01-01T05:00Z', '2029-01-01T05:00Z'],
  ['Australia/Adelaide', 2026, '2025-12-31T13:30Z', '2026-12-31T13:30Z'],
])('in %s the year %i lasts from %s to %s', (zone, year, from, to) => {
  expect(yearBounds(year, zone)).toEqual({ from: Date.parse(from), to: Date.parse(to) });
});
