import { expect, test } from 'vitest';
import { TICK_STEPS, timeTicks } from '../../../../src/chat/attachments/chart/time-ticks.ts';
import { localTimeOf } from '../../../../src/core/time/local-time-of.ts';

const ISO = (moments: readonly number[]): string[] => moments.map((at) => new Date(at).toISOString());

test('days begin at midnight of the zone, also where its clocks are put back', () => {
  const span = { from: Date.UTC(2026, 9, 24, 9), to: Date.UTC(2026, 9, 27, 9) };
  expect(ISO(timeTicks(span, { days: 1 }, 'Europe/Madrid'))).toEqual([
    '2026-10-24T22:00:00.000Z',
    '2026-10-25T23:00:00.000Z',
    '2026-10-26T23:00:00.000Z',
  ]);
});

test('weeks begin on Mondays, half-years in January and July, decades in years that end in 0', () => {
  const span = { from: Date.UTC(1999, 0, 5), to: Date.UTC(2031, 5, 1) };
  const days = (step: (typeof TICK_STEPS)[number]): ReturnType<typeof localTimeOf>[] =>
    timeTicks(span, step, 'UTC').map((at) => localTimeOf(at, 'UTC'));
  expect(new Set(days({ days: 7 }).map(({ weekday }) => weekday))).toEqual(new Set([1]));
  expect(new Set(days({ months: 6 }).map(({ month, day }) => `${month}-${day}`))).toEqual(
    new Set(['7-1', '1-1']),
  );
  expect(days({ months: 120 }).map(({ year }) => year)).toEqual([2000, 2010, 2020, 2030]);
});

test.each(TICK_STEPS)('marks of %j rise and stay inside', (step) => {
  const span = { from: Date.UTC(1969, 10, 2, 3), to: Date.UTC(1971, 2, 2, 3) };
  const ticks = timeTicks(span, step, 'America/Santiago');
  expect(ticks).toEqual(ticks.toSorted((a, b) => a - b));
  expect(ticks.filter((at) => at < span.from || at > span.to)).toEqual([]);
});
