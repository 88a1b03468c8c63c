import fc from 'fast-check';
import { expect, test } from 'vitest';
import { addDays } from '../../../src/core/time/add-days.ts';
import { momentOf } from '../../../src/core/time/moment-of.ts';
import { createDailyBot } from './daily-bot.ts';
import { createFlyingClock } from './flying-clock.ts';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const quiet = { from_minute: 1200, to_minute: 360 };
const hoursIn = (zone: string) => ({ at_minute: 450, quiet, zone });

/** The days of a zone from one on, as they are written. */
const days = (from: { year: number; month: number; day: number }, count: number): string[] =>
  Array.from({ length: count }, (_, index) => {
    const { year, month, day } = addDays(from, index);
    return new Date(Date.UTC(year, month - 1, day)).toISOString().slice(0, 10);
  });

test.each(['Europe/Madrid', 'America/New_York', 'Australia/Adelaide'])(
  'a year in %s is one list a day at 7:30 by its clocks, also when they are changed',
  async (zone) => {
    const first = { year: 2026, month: 1, day: 1 };
    const clock = createFlyingClock(momentOf({ ...first, hour: 0, minute: 0 }, zone));
    const bot = await createDailyBot(clock, { hours: hoursIn(zone), longest_wait_ms: HOUR });
    bot.start();
    await clock.flyTo(momentOf({ year: 2027, month: 1, day: 1, hour: 0, minute: 0 }, zone));
    await bot.stop();
    expect(bot.sent.map((time) => time.slice(0, 19))).toEqual(
      days(first, 365).map((day) => `${day}T07:30:03`),
    );
  },
);

// Each stop is written as it is lived: by the clock of Madrid.
test.each([
  ['none', [], ['11-10 07:30', '11-11 07:30', '11-12 07:30', '11-13 07:30']],
  [
    'over the hour',
    [['11-11T07:00', '11-11T11:00']],
    ['11-10 07:30', '11-11 11:00', '11-12 07:30', '11-13 07:30'],
  ],
  ['until the night', [['11-11T07:00', '11-11T22:00']], ['11-10 07:30', '11-12 07:30', '11-13 07:30']],
  [
    'until shortly before the hour',
    [['11-11T07:00', '11-12T06:30']],
    ['11-10 07:30', '11-12 07:30', '11-13 07:30'],
  ],
  [
    'until shortly after the hour',
    [['11-11T07:00', '11-12T07:35']],
    ['11-10 07:30', '11-12 07:35', '11-13 07:30'],
  ],
  [
    'right after it went out',
    [['11-11T07:31', '11-11T09:00']],
    ['11-10 07:30', '11-11 07:30', '11-12 07:30', '11-13 07:30'],
  ],
  [
    'forty days, into a night',
    [['10-01T12:00', '11-10T03:00']],
    ['11-10 07:30', '11-11 07:30', '11-12 07:30', '11-13 07:30'],
  ],
  [
    'forty days, into a day',
    [['10-01T12:00', '11-10T15:00']],
    ['11-10 15:00', '11-11 07:30', '11-12 07:30', '11-13 07:30'],
  ],
])('a stop, %s: %j', async (_what, stops, expected) => {
  const zone = 'Europe/Madrid';
  const moment = (written: string): number => {
    const [month = 0, day = 0, hour = 0, minute = 0] = written.split(/[-T:]/).map(Number);
    return momentOf({ year: 2026, month, day, hour, minute }, zone);
  };
  const clock = createFlyingClock(moment(stops[0]?.[0] ?? '11-10T00:00') - 32 * HOUR);
  const bot = await createDailyBot(clock, { hours: hoursIn(zone) });
  bot.start();
  for (const [from = '', to = ''] of stops) {
    await clock.flyTo(moment(from));
    await bot.stop();
    await clock.flyTo(moment(to));
    bot.start();
  }
  await clock.flyTo(moment('11-14T00:00'));
  await bot.stop();
  const sent = bot.sent.map((time) => time.slice(5, 16).replace('T', ' '));
  expect(sent.filter((time) => time >= '11-10')).toEqual(expected);
});

/** Whether a list could go out on that day: a killed bot leaves a lease, and two failures cost three minutes. */
function hadTime(ran: { readonly from: number; readonly to: number }, date: string, zone: string): boolean {
  const [year = 0, month = 0, day = 0] = date.split('-').map(Number);
  const opens = momentOf({ year, month, day, hour: 7, minute: 30 }, zone);
  const closes = momentOf({ year, month, day, hour: 20, minute: 0 }, zone);
  return Math.min(ran.to, closes) - Math.max(ran.from, opens) > 5 * MINUTE;
}

/** What happens next to a bot: how long it runs, how it ends, and for how long it is down. */
const phase = fc.record({
  up_minutes: fc.integer({ min: 1, max: 3 * 24 * 60 }),
  ends: fc.constantFrom('stop', 'kill'),
  down_minutes: fc.oneof(fc.integer({ min: 0, max: 120 }), fc.integer({ min: 0, max: 3 * 24 * 60 })),
  /** Kills come also in the few seconds in which a list is being made. */
  odd_ms: fc.oneof(fc.constant(0), fc.integer({ min: 0, max: 10_000 })),
});

test('however it is stopped and killed, there is at most one list a day, none in quiet hours, and none is missing where it ran', async () => {
  const zones = fc.constantFrom('Europe/Madrid', 'America/New_York', 'Australia/Adelaide');
  const starts = fc.constantFrom(
    '2026-03-05',
    '2026-03-26',
    '2026-04-02',
    '2026-10-01',
    '2026-10-22',
    '2026-10-29',
  );
  await fc.assert(
    fc.asyncProperty(
      zones,
      starts,
      fc.array(phase, { minLength: 1, maxLength: 12 }),
      fc.infiniteStream(fc.integer({ min: 0, max: 9 })),
      async (zone, start, phases, dice) => {
        const clock = createFlyingClock(Date.parse(`${start}T12:00Z`));
        let inRow = 0;
        const fails = (): boolean => {
          inRow = dice.next().value < 3 && inRow < 2 ? inRow + 1 : 0;
          return inRow > 0;
        };
        const bot = await createDailyBot(clock, {
          hours: hoursIn(zone),
          fails,
          longest_wait_ms: 10 * MINUTE,
        });
        const ran: { from: number; to: number }[] = [];
        for (const { up_minutes, ends, down_minutes, odd_ms } of phases) {
          const from = clock.now();
          bot.start();
          await clock.flyTo(from + up_minutes * MINUTE + odd_ms);
          ran.push({ from, to: clock.now() });
          if (ends === 'kill') bot.kill();
          else await Promise.all([bot.stop(), clock.flyTo(clock.now() + 5000)]);
          await clock.flyTo(clock.now() + down_minutes * MINUTE);
        }
        const sentOn = bot.sent.map((time) => time.slice(0, 10));
        const hour = bot.sent.map((time) => time.slice(11, 16));
        const [year = 0, month = 0, day = 0] = start.split('-').map(Number);
        const missing = days({ year, month, day: day + 1 }, 80).filter(
          (date) => ran.some((span) => hadTime(span, date, zone)) && !sentOn.includes(date),
        );
        const twice = sentOn.filter((date, index) => sentOn.indexOf(date) !== index);
        const atNight = hour.filter((time) => time < '07:30' || time >= '20:00');
        expect({ missing, twice, atNight }).toEqual({ missing: [], twice: [], atNight: [] });
      },
    ),
    { numRuns: 80 },
  );
});
