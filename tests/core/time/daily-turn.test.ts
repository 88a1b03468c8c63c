import { expect, test } from 'vitest';
import { dailyTurn } from '../../../src/core/time/daily-turn.ts';
import { isQuiet } from '../../../src/core/time/is-quiet.ts';
import { isoWithZone } from '../../../src/core/time/iso-with-zone.ts';
import { minuteOfDay } from '../../../src/core/time/minute-of-day.ts';
import { nextDaily, type DailyHours } from '../../../src/core/time/next-daily.ts';

const zone = 'Europe/Madrid';
const NIGHT = { from_minute: 1200, to_minute: 360 }; // 20:00 to 6:00
const hours: DailyHours = { at_minute: 450, quiet: NIGHT, zone };
const iso = (at: number): string => isoWithZone(at, zone).slice(0, 16);

test.each([
  [1199, NIGHT, false],
  [1200, NIGHT, true],
  [0, NIGHT, true],
  [359, NIGHT, true],
  [360, NIGHT, false],
  [720, { from_minute: 720, to_minute: 780 }, true],
  [780, { from_minute: 720, to_minute: 780 }, false],
  [719, { from_minute: 720, to_minute: 780 }, false],
  [600, { from_minute: 600, to_minute: 600 }, false],
])('whether minute %i is quiet in %j: %s', (minute, quiet, is) => {
  expect(isQuiet(minute, quiet)).toBe(is);
});

test.each([
  ['the set hour', {}, '2026-11-12T07:29:59+01:00', '2026-11-12T07:30'],
  ['the set hour itself is over', {}, '2026-11-12T07:30:00+01:00', '2026-11-13T07:30'],
  [
    'an hour of the night moves to its end',
    { at_minute: 300 },
    '2026-11-12T12:00:00+01:00',
    '2026-11-13T06:00',
  ],
  [
    'an hour of the evening moves to the morning',
    { at_minute: 1320 },
    '2026-11-12T12:00:00+01:00',
    '2026-11-13T06:00',
  ],
  ['what moved here from last evening', { at_minute: 1320 }, '2026-11-12T05:00:00+01:00', '2026-11-12T06:00'],
  ['what moved here is over', { at_minute: 1320 }, '2026-11-12T06:00:00+01:00', '2026-11-13T06:00'],
  [
    'the end of the quiet hours is not quiet',
    { at_minute: 360 },
    '2026-11-12T05:00:00+01:00',
    '2026-11-12T06:00',
  ],
  ['the beginning is', { at_minute: 1200 }, '2026-11-12T12:00:00+01:00', '2026-11-13T06:00'],
  [
    'no quiet hours',
    { at_minute: 180, quiet: { from_minute: 0, to_minute: 0 } },
    '2026-11-12T12:00:00+01:00',
    '2026-11-13T03:00',
  ],
  ['clocks go forward in the night', {}, '2026-03-28T12:00:00+01:00', '2026-03-29T07:30'],
  ['clocks go back in the night', {}, '2026-10-24T12:00:00+02:00', '2026-10-25T07:30'],
  [
    'clocks skip into the quiet hours',
    { at_minute: 150, quiet: { from_minute: 190, to_minute: 360 } },
    '2026-03-28T12:00:00+01:00',
    '2026-03-29T06:00',
  ],
])('%s (%j after %s): %s', (_why, changed, after, next) => {
  expect(iso(nextDaily(Date.parse(after), { ...hours, ...changed }))).toBe(next);
});

test.each([
  ['on time', {}, '2026-11-12T07:30:00+01:00', 'now 2026-11-13T07:30'],
  ['a minute late', {}, '2026-11-12T07:31:00+01:00', 'now 2026-11-13T07:30'],
  ['hours late', {}, '2026-11-12T17:00:00+01:00', 'now 2026-11-13T07:30'],
  ['too late for today', {}, '2026-11-12T20:00:00+01:00', 'later 2026-11-13T07:30'],
  ['in the night', {}, '2026-11-12T02:00:00+01:00', 'later 2026-11-12T07:30'],
  ['from yesterday, with its next turn close', {}, '2026-11-12T06:30:00+01:00', 'later 2026-11-12T07:30'],
  [
    'already said today',
    { said_at: '2026-11-12T07:30:00+01:00' },
    '2026-11-12T09:00:00+01:00',
    'later 2026-11-13T07:30',
  ],
  [
    'the hour was changed after it was said',
    { at_minute: 1020, said_at: '2026-11-12T07:30:00+01:00' },
    '2026-11-12T09:00:00+01:00',
    'later 2026-11-13T17:00',
  ],
  [
    'said yesterday',
    { said_at: '2026-11-11T07:30:00+01:00' },
    '2026-11-12T07:30:00+01:00',
    'now 2026-11-13T07:30',
  ],
])(
  '%s (%j at %s): %s',
  (_why, { said_at, ...changed }: { said_at?: string; at_minute?: number }, at, expected) => {
    const said = said_at === undefined ? {} : { said_at: Date.parse(said_at) };
    const turn = dailyTurn(Date.parse(at), { ...hours, ...changed, ...said });
    expect(`${turn.is} ${iso(turn.next)}`).toBe(expected);
  },
);

test.each(['Europe/Madrid', 'America/New_York', 'Australia/Adelaide', 'America/Santiago'])(
  'in %s a year of turns is one a day and none in quiet hours, whatever hour is set',
  (place) => {
    for (const at_minute of [0, 150, 359, 450, 1199, 1200, 1439]) {
      const rules = { at_minute, quiet: NIGHT, zone: place };
      let at = Date.parse('2026-01-01T12:00Z');
      const days = new Set<string>();
      for (let times = 0; times < 365; times += 1) {
        const turn = dailyTurn((at = nextDaily(at, rules)), rules);
        expect(turn).toEqual({ is: 'now', next: nextDaily(at, rules) });
        expect(isQuiet(minuteOfDay(at, place), NIGHT)).toBe(false);
        days.add(isoWithZone(at, place).slice(0, 10));
      }
      expect(days.size).toBe(365);
    }
  },
);
