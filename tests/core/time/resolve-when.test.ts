import { expect, test } from 'vitest';
import type { SaidWhen } from '../../../src/chat/reader/command.ts';
import { isoWithZone } from '../../../src/core/time/iso-with-zone.ts';
import { resolveWhen } from '../../../src/core/time/resolve-when.ts';

const zone = 'Europe/Madrid';

/** What it comes to in few words, said on a Thursday at 9:30. */
function resolved(said: Omit<SaidWhen, 'text'>, now = '2026-11-12T09:30:00+01:00'): string {
  // What the reader makes of it is taken as it stands.
  const read: SaidWhen = { ...said, text: 'as it was said' };
  const when = resolveWhen(read, { at: Date.parse(now), zone });
  if (when.is === 'moment' || when.is === 'future') return `${when.is} ${isoWithZone(when.at, zone)}`;
  return when.is === 'day' ? `day ${when.date.year}-${when.date.month}-${when.date.day}` : when.is;
}

test.each<[Omit<SaidWhen, 'text'>, string]>([
  [{}, 'moment 2026-11-12T09:30:00+01:00'],
  [{ hour: 8, minute: 30 }, 'moment 2026-11-12T08:30:00+01:00'],
  [{ hour: 8 }, 'moment 2026-11-12T08:00:00+01:00'],
  [{ hour: 0, minute: 5 }, 'moment 2026-11-12T00:05:00+01:00'],
  [{ hour: 9, minute: 30 }, 'moment 2026-11-12T09:30:00+01:00'],
  // Up to an hour ahead is a fast clock and means now; no sample is from the future.
  [{ hour: 9, minute: 45 }, 'moment 2026-11-12T09:30:00+01:00'],
  [{ hour: 10, minute: 30 }, 'moment 2026-11-12T09:30:00+01:00'],
  [{ hour: 10, minute: 31 }, 'future 2026-11-12T10:31:00+01:00'],
  [{ hour: 17 }, 'future 2026-11-12T17:00:00+01:00'],
  [{ day: { is: 'today' }, hour: 17 }, 'future 2026-11-12T17:00:00+01:00'],
  [{ hours_ago: 2 }, 'moment 2026-11-12T07:30:00+01:00'],
  [{ hours_ago: 30 }, 'moment 2026-11-11T03:30:00+01:00'],
  [{ hours_ago: 0.5 }, 'moment 2026-11-12T09:00:00+01:00'],
  [{ day: { is: 'today' } }, 'day 2026-11-12'],
  [{ day: { is: 'yesterday' } }, 'day 2026-11-11'],
  [{ day: { is: 'before-yesterday' } }, 'day 2026-11-10'],
  [{ day: { is: 'days-ago', days: 12 } }, 'day 2026-10-31'],
  [{ day: { is: 'yesterday' }, hour: 17 }, 'moment 2026-11-11T17:00:00+01:00'],
  [{ day: { is: 'weekday', weekday: 4 } }, 'day 2026-11-5'],
  [{ day: { is: 'weekday', weekday: 3 } }, 'day 2026-11-11'],
  [{ day: { is: 'weekday', weekday: 5 }, hour: 9 }, 'moment 2026-11-06T09:00:00+01:00'],
  [{ day: { is: 'weekday', weekday: 7 } }, 'day 2026-11-8'],
  [{ day: { is: 'date', day: 12, month: 11 } }, 'day 2026-11-12'],
  [{ day: { is: 'date', day: 13, month: 11 } }, 'day 2025-11-13'],
  [{ day: { is: 'date', day: 12, month: 11 }, hour: 17 }, 'future 2026-11-12T17:00:00+01:00'],
  [{ day: { is: 'date', day: 29, month: 2 } }, 'day 2024-2-29'],
  [{ day: { is: 'date', day: 29, month: 2, year: 2026 } }, 'no-such-day'],
  [{ day: { is: 'date', day: 31, month: 11 } }, 'no-such-day'],
  [{ day: { is: 'date', day: 0, month: 1 } }, 'no-such-day'],
  [{ day: { is: 'date', day: 1, month: 13 } }, 'no-such-day'],
  [{ day: { is: 'date', day: 1, month: 9, year: 26 } }, 'no-such-day'],
  [{ day: { is: 'date', day: 1, month: 9, year: 2026 } }, 'day 2026-9-1'],
  [{ day: { is: 'date', day: 13, month: 11, year: 2026 } }, 'future 2026-11-13T00:00:00+01:00'],
  [{ day: { is: 'date', day: 13, month: 11, year: 2026 }, hour: 8 }, 'future 2026-11-13T08:00:00+01:00'],
])('%j is %s', (said, expected) => {
  expect(resolved(said)).toBe(expected);
});

test.each<[string, Omit<SaidWhen, 'text'>, string, string]>([
  ['just after midnight', { day: { is: 'yesterday' } }, '2026-11-12T00:10:00+01:00', 'day 2026-11-11'],
  [
    'just after midnight',
    { hour: 23, minute: 50 },
    '2026-11-12T00:10:00+01:00',
    'future 2026-11-12T23:50:00+01:00',
  ],
  ['at the turn of the year', { day: { is: 'yesterday' } }, '2027-01-01T08:00:00+01:00', 'day 2026-12-31'],
  [
    'at the turn of the year',
    { day: { is: 'date', day: 30, month: 12 } },
    '2027-01-01T08:00:00+01:00',
    'day 2026-12-30',
  ],
  [
    'the morning after clocks went forward',
    { hour: 2, minute: 30 },
    '2026-03-29T08:00:00+02:00',
    'moment 2026-03-29T03:30:00+02:00',
  ],
  [
    'the morning after clocks went back',
    { hour: 2, minute: 30 },
    '2026-10-25T08:00:00+01:00',
    'moment 2026-10-25T02:30:00+02:00',
  ],
  [
    'while an hour is repeated',
    { hour: 2, minute: 45 },
    '2026-10-25T02:15:00+01:00',
    'moment 2026-10-25T02:45:00+02:00',
  ],
  [
    'a day after clocks went back',
    { hours_ago: 24 },
    '2026-10-25T08:00:00+01:00',
    'moment 2026-10-24T09:00:00+02:00',
  ],
])('%s: %j said at %s is %s', (_when, said, now, expected) => {
  expect(resolved(said, now)).toBe(expected);
});

test('hours that no clock shows, and hours to come, are wrong calls', () => {
  expect(() => resolved({ hour: 24 })).toThrow(RangeError);
  expect(() => resolved({ hours_ago: -1 })).toThrow(RangeError);
});
