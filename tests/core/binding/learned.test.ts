import { expect, test } from 'vitest';
import {
  joinBinding,
  learnBinding,
  mixBinding,
  type BindingCase,
} from '../../../src/core/binding/learned.ts';
import { chanceOf, type Chance } from '../simulated.ts';

const DAY_ms = 86_400_000;

/** Additions to a wine that binds a share of each, with readings that are off by 5 % (one standard deviation). */
function additionsOf(share: number, count: number, { even, normal }: Chance): BindingCase[] {
  const cases: BindingCase[] = [];
  for (let i = 0; i < count; i++) {
    const before = 12 + 15 * even();
    const added_mg_L = 15 + 25 * even();
    const after = before + (1 - share) * added_mg_L;
    const read = (mg_L: number): number => mg_L * (1 + 0.05 * normal());
    const added_at = i * 40 * DAY_ms;
    cases.push({
      at: added_at + DAY_ms,
      added_at,
      added_mg_L,
      before_at: added_at,
      before_mg_L: read(before),
      after_mg_L: read(after),
    });
  }
  return cases;
}

test.each([
  [0.25, 2],
  [0.4, 3],
  [0.55, 5],
  [0.35, 10],
])(
  'it finds the share %f of a simulated wine by %i additions within its ± in 19 of 20 cellars',
  (share, count) => {
    const chance = chanceOf(share * 1000 + count);
    let held = 0;
    const runs = 2000;
    for (let run = 0; run < runs; run++) {
      const learned = learnBinding(additionsOf(share, count, chance));
      if (learned !== undefined && Math.abs(learned.share - share) <= learned.spread) held++;
    }
    // ± is two standard deviations: 95 of 100, and a little more where the scatter is taken for the larger.
    expect(held / runs).toBeGreaterThan(0.92);
    expect(held / runs).toBeLessThan(0.995);
  },
);

test('recent additions weigh more', () => {
  const of = (share: number, i: number): BindingCase => ({
    at: i * 40 * DAY_ms,
    added_at: i * 40 * DAY_ms,
    added_mg_L: 30,
    before_at: i * 40 * DAY_ms,
    before_mg_L: 20,
    after_mg_L: 20 + 30 * (1 - share),
  });
  const rising = learnBinding([of(0.2, 0), of(0.2, 1), of(0.5, 2), of(0.5, 3)]);
  expect(rising?.share).toBeGreaterThan(0.38);
  expect(rising?.spread).toBeGreaterThan(0.1);
});

test('what tells nothing is left out: too small, read too early or late, almost nothing free before, or with figures that cannot be', () => {
  const good = { at: DAY_ms, added_at: 0, added_mg_L: 30, before_at: 0, before_mg_L: 18, after_mg_L: 36 };
  const bad = [
    { ...good, added_mg_L: 3, after_mg_L: 20 },
    { ...good, at: 20 * DAY_ms },
    { ...good, before_at: -20 * DAY_ms },
    { ...good, before_mg_L: 4, after_mg_L: 14 },
    { ...good, after_mg_L: 60 },
    { ...good, after_mg_L: 10 },
  ];
  expect(learnBinding([...bad, good])).toBeUndefined();
  expect(learnBinding([good, ...bad, good])?.cases).toBe(2);
});

test('a blend binds by volume, between both', () => {
  const [a, b] = [
    { share: 0.2, spread: 0.05, cases: 4 },
    { share: 0.6, spread: 0.1, cases: 2 },
  ];
  expect(mixBinding([a, 100], [b, 300])?.share).toBeCloseTo(0.5, 12);
  expect(mixBinding([a, 5], [a, 9])?.share).toBeCloseTo(0.2, 12);
  const joined = joinBinding(a, b);
  expect(joined?.share).toBeCloseTo((0.2 * 4 + 0.6) / 5, 12);
  expect(joined?.spread).toBeLessThan(0.05);
});
