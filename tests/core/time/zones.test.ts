import { expect, test } from 'vitest';
import { dayBounds } from '../../../src/core/time/day-bounds.ts';
import { isoWithZone } from '../../../src/core/time/iso-with-zone.ts';
import { localTimeOf } from '../../../src/core/time/local-time-of.ts';
import { momentOf } from '../../../src/core/time/moment-of.ts';
import { offsetAt } from '../../../src/core/time/offset-at.ts';
import { written } from './written.ts';
import { CHANGES, DAYS, LOCAL_TIMES } from './zone-reference.ts';

test.each(LOCAL_TIMES)('in %s the clocks show at %s what the reference says', (zone, utc, local, weekday) => {
  const at = Date.parse(utc);
  expect(isoWithZone(at, zone)).toBe(local);
  expect(localTimeOf(at, zone)).toEqual({ ...written(local.slice(0, 16)), weekday });
  expect(localTimeOf(at + 59_999, zone).minute).toBe(localTimeOf(at, zone).minute);
});

test.each(LOCAL_TIMES)(
  'in %s the minute that clocks show at %s leads back to it, or to its first time',
  (zone, utc) => {
    const at = Date.parse(utc);
    const back = momentOf(localTimeOf(at, zone), zone);
    expect(back).toBeLessThanOrEqual(at);
    expect({ ...localTimeOf(back, zone) }).toEqual(localTimeOf(at, zone));
  },
);

test.each(CHANGES)('in %s a %s minute, %s, is %s', (zone, _kind, local, utc, shown) => {
  expect(momentOf(written(local), zone)).toBe(Date.parse(utc));
  expect(isoWithZone(Date.parse(utc), zone)).toBe(shown);
});

test.each(DAYS)('in %s the day %s begins at %s and ends at %s', (zone, day, from, to, hours) => {
  expect(dayBounds(written(day), zone)).toEqual({ from: Date.parse(from), to: Date.parse(to) });
  expect((Date.parse(to) - Date.parse(from)) / 3_600_000).toBe(hours);
});

test('a day that a zone left out has no length', () => {
  const { from, to } = dayBounds({ year: 2011, month: 12, day: 30 }, 'Pacific/Apia');
  expect(to - from).toBe(0);
});

test.each(['Nowhere/Land', '', 'toString', '__proto__', 'constructor'])(
  '%j is no zone to tell a time in',
  (zone) => {
    expect(() => offsetAt(0, zone)).toThrow(RangeError);
  },
);

test.each([
  '2026-02-29T10:00',
  '2026-13-01T10:00',
  '2026-00-01T10:00',
  '2026-04-31T10:00',
  '2026-04-30T24:00',
  '2026-04-30T10:60',
  '0026-04-30T10:00',
])('no calendar and no clock shows %s', (local) => {
  expect(() => momentOf(written(local), 'UTC')).toThrow(RangeError);
});
