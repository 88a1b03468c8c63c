import { expect, test } from 'vitest';
import { crossingOf, type FreePoint } from '../../../src/core/forecast/decline.ts';
import { forecast } from '../../../src/core/forecast/forecast.ts';
import { tQuantile95 } from '../../../src/core/forecast/t-quantile.ts';
import { chanceOf } from '../simulated.ts';

const DAY_ms = 86_400_000;

// Printed tables of Student's t, 95 % one-sided (from memory).
test.each([
  [5, 2.015],
  [6, 1.943],
  [10, 1.812],
  [20, 1.725],
  [30, 1.697],
  [120, 1.658],
])('Student’s t with %i degrees of freedom is %f, as tables print it', (freedom, printed) => {
  expect(tQuantile95(freedom)).toBeCloseTo(printed, 2);
});

test.each([
  { count: 3, error: 0.05 },
  { count: 4, error: 0.05 },
  { count: 6, error: 0.05 },
  { count: 12, error: 0.05 },
  { count: 12, error: 0.07 },
])(
  'the 90 % interval holds 85 to 95 of 100 true days ($count readings, error $error)',
  ({ count, error }) => {
    const { even, normal } = chanceOf(count * 100 + error * 1000);
    let held = 0;
    const runs = 4000;
    for (let run = 0; run < runs; run++) {
      const falls = 0.004 + 0.006 * even();
      const start_mg_L = 35 + 10 * even();
      const points: FreePoint[] = [];
      for (let i = 0; i < count; i++) {
        const days = i * 14;
        points.push({
          at: days * DAY_ms,
          free_mg_L: start_mg_L * Math.exp(-falls * days + error * normal()),
        });
      }
      const level = start_mg_L * 0.55;
      const truly = (Math.log(start_mg_L / level) / falls) * DAY_ms;
      const found = crossingOf(points, level);
      if (found && found.from <= truly && (found.to ?? Infinity) >= truly) held++;
    }
    expect(held / runs).toBeGreaterThan(0.85);
    expect(held / runs).toBeLessThan(0.95);
  },
);

test('exact readings give the exact day', () => {
  const falls = Math.log(40 / 20) / 100;
  const points = [0, 10, 25, 40].map((days) => ({
    at: days * DAY_ms,
    free_mg_L: 40 * Math.exp(-falls * days),
  }));
  const found = crossingOf(points, 20);
  expect((found?.below_at ?? 0) / DAY_ms).toBeCloseTo(100, 6);
  expect(found?.from).toBeLessThan(100 * DAY_ms);
  expect(found?.to ?? Infinity).toBeGreaterThan(100 * DAY_ms);
});

test('readings that do not fall give no day and no end, but the earliest that it may be', () => {
  const points = [0, 20, 40].map((days) => ({ at: days * DAY_ms, free_mg_L: 30 + days / 20 }));
  const found = crossingOf(points, 25);
  expect(found?.below_at).toBeUndefined();
  expect(found?.to).toBeUndefined();
  expect(found?.from).toBeGreaterThan(0);
});

test('three readings of one day are no decline', () => {
  const points = [0, 1, 2].map((hours) => ({ at: (hours * DAY_ms) / 24, free_mg_L: 30 - hours }));
  expect(crossingOf(points, 25)).toBeUndefined();
});

// A Quebec wine site reporting a study (read): 45 % left after three years at 14 °C, 20 % at 15 to 26 °C.
test('by published rates: a bottle loses to 45 % in three cool years and to 20 % in three warm ones', () => {
  const of = (needed_mg_L: number) =>
    forecast({ points: [{ at: 0, free_mg_L: 40 }], needed_mg_L, container: 'bottle' });
  expect(of(18)).toMatchObject({ by: 'published', to: expect.closeTo(3 * 365 * DAY_ms, -3) });
  expect(of(8)).toMatchObject({ by: 'published', from: expect.closeTo(3 * 365 * DAY_ms, -3) });
});

test('a tank has no published rate, and nothing measured gives nothing', () => {
  expect(forecast({ points: [], needed_mg_L: 20, container: 'tank' })).toEqual({
    by: 'none',
    why: 'unmeasured',
  });
  expect(forecast({ points: [{ at: 0, free_mg_L: 30 }], needed_mg_L: 20, container: 'tank' })).toEqual({
    by: 'none',
    why: 'no-rate',
  });
});
