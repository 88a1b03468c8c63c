import { expect, test } from 'vitest';
import { localTimeOf } from '../../../src/core/time/local-time-of.ts';
import { minuteOfDay } from '../../../src/core/time/minute-of-day.ts';
import { nextTimeOfDay } from '../../../src/core/time/next-time-of-day.ts';

const at = (utc: string): number => Date.parse(utc);

// The moments of the changes are those of the reference; 24 hours or the hour that a change takes or gives lie between.
test.each([
  ['Europe/Madrid', 450, '2026-11-12T06:29Z', '2026-11-12T06:30Z'],
  ['Europe/Madrid', 450, '2026-11-12T06:30Z', '2026-11-13T06:30Z'],
  ['Europe/Madrid', 450, '2026-03-28T06:30Z', '2026-03-29T05:30Z'],
  ['Europe/Madrid', 150, '2026-03-28T12:00Z', '2026-03-29T01:30Z'], // skipped: 3:30
  ['Europe/Madrid', 150, '2026-03-29T01:30Z', '2026-03-30T00:30Z'],
  ['Europe/Madrid', 150, '2026-10-24T12:00Z', '2026-10-25T00:30Z'], // the first of two
  ['Europe/Madrid', 150, '2026-10-25T00:30Z', '2026-10-26T01:30Z'], // and not the second
  ['America/New_York', 90, '2026-11-01T05:30Z', '2026-11-02T06:30Z'],
  ['Australia/Adelaide', 450, '2026-10-02T22:00Z', '2026-10-03T21:00Z'],
  ['America/Santiago', 0, '2025-09-06T12:00Z', '2025-09-07T04:00Z'], // midnight is skipped
  ['Pacific/Apia', 450, '2011-12-29T17:30Z', '2011-12-30T17:30Z'], // 30 December is left out
])('in %s minute %i after %s is %s', (zone, at_minute, from, next) => {
  expect(nextTimeOfDay(at(from), { at_minute, zone })).toBe(at(next));
});

test.each([
  'Europe/Madrid',
  'America/New_York',
  'Australia/Adelaide',
  'Australia/Lord_Howe',
  'America/Santiago',
])('in %s a year of 365 days has every minute of the day 365 times, and only skipped ones late', (zone) => {
  for (const at_minute of [0, 90, 110, 150, 450, 1439]) {
    const days = new Set<string>();
    let moment = nextTimeOfDay(at('2026-01-01T12:00Z'), { at_minute, zone });
    const end = moment + 365 * 86_400_000;
    for (let times = 0; times < 365; times += 1) {
      const { year, month, day } = localTimeOf(moment, zone);
      days.add(`${year}-${month}-${day}`);
      const late = minuteOfDay(moment, zone) - at_minute;
      expect([0, 30, 60]).toContain(late);
      moment = nextTimeOfDay(moment, { at_minute, zone });
    }
    expect(days.size).toBe(365);
    expect(moment).toBe(end);
  }
});

test.each([-1, 1440, Number.NaN])('%d is no minute of a day', (at_minute) => {
  expect(() => nextTimeOfDay(0, { at_minute, zone: 'UTC' })).toThrow(RangeError);
});
