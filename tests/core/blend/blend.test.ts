import fc from 'fast-check';
import { expect, test } from 'vitest';
import { blend, type BlendPart } from '../../../src/core/blend/blend.ts';
import { shareWithin } from '../../../src/core/blend/share-within.ts';
import { molecularSO2 } from '../../../src/core/chemistry/molecular-so2.ts';
import { loadMathjs } from '../../../src/core/units/define.ts';
import { stepFault } from '../../../src/core/units/step-fault.ts';

const math = await loadMathjs();

const part = fc.record({
  volume_L: fc.double({ min: 1, max: 50_000, noNaN: true }),
  free_mg_L: fc.double({ min: 0, max: 120, noNaN: true }),
  total_mg_L: fc.double({ min: 0, max: 400, noNaN: true }),
  ph: fc.double({ min: 2.8, max: 4.2, noNaN: true }),
});
type Measured = Required<BlendPart>;

// Mass balance: what was in both is in the blend, before any of it binds or is let go.
test('a blend holds as many milligrams of free and of total SO2 as both wines did', () => {
  fc.assert(
    fc.property(part, part, (one: Measured, other: Measured) => {
      const both = blend(one, other, 1.81);
      for (const name of ['free_mg_L', 'total_mg_L'] as const) {
        const before = one[name] * one.volume_L + other[name] * other.volume_L;
        expect(Math.abs((both[name] ?? NaN) * both.volume_L - before)).toBeLessThanOrEqual(
          1e-9 * (before + 1),
        );
      }
    }),
    { seed: 1, numRuns: 500 },
  );
});

test('the pH of a blend is never told, only that it is asked between which', () => {
  const both = blend({ volume_L: 1, ph: 3.3, free_mg_L: 30 }, { volume_L: 1, ph: 3.7, free_mg_L: 30 }, 1.81);
  expect(both.ph_between).toEqual([3.3, 3.7]);
  expect('ph' in both).toBe(false);
  expect(
    blend({ volume_L: 1, ph: 3.3, free_mg_L: 30 }, { volume_L: 1 }, 1.81).molecular_between_mg_L,
  ).toBeUndefined();
});

test('every share that is found keeps to every bound, and just outside one fails', () => {
  const bounds = fc.record({
    free_most_mg_L: fc.double({ min: 10, max: 60, noNaN: true }),
    total_most_mg_L: fc.double({ min: 50, max: 250, noNaN: true }),
    molecular_least_mg_L: fc.double({ min: 0, max: 0.8, noNaN: true }),
    molecular_most_mg_L: fc.double({ min: 1, max: 2.5, noNaN: true }),
  });
  fc.assert(
    fc.property(part, part, bounds, (wine: Measured, other: Measured, kept) => {
      const found = shareWithin([wine, other], kept, 1.81);
      const holds = (share: number, slack: number): boolean => {
        const at = (name: 'free_mg_L' | 'total_mg_L'): number =>
          wine[name] + share * (other[name] - wine[name]);
        const [low, high] = [Math.min(wine.ph, other.ph), Math.max(wine.ph, other.ph)];
        return (
          at('free_mg_L') <= kept.free_most_mg_L + slack &&
          at('total_mg_L') <= kept.total_most_mg_L + slack &&
          molecularSO2(Math.max(0, at('free_mg_L')), high, 1.81) >= kept.molecular_least_mg_L - slack &&
          molecularSO2(Math.max(0, at('free_mg_L')), low, 1.81) <= kept.molecular_most_mg_L + slack
        );
      };
      const all = Array.from({ length: 21 }, (_, i) => i / 20);
      const held = found.fails === undefined ? [found.least, (found.least + found.most) / 2, found.most] : [];
      const outside =
        found.fails === undefined
          ? [found.least - 0.001, found.most + 0.001].filter((share) => share > 0 && share < 1)
          : all;
      expect(held.map((share) => holds(share, 1e-6))).toEqual(held.map(() => true));
      expect(outside.map((share) => holds(share, -1e-9))).toEqual(outside.map(() => false));
    }),
    { seed: 2, numRuns: 1000 },
  );
});

test('each line of the working holds', () => {
  const { steps } = blend(
    { volume_L: 5200, free_mg_L: 58, total_mg_L: 171 },
    { volume_L: 2300, free_mg_L: 19, total_mg_L: 84 },
    1.81,
  );
  expect(steps.map((step) => step.result.value)).toEqual([46.04, 144.3]);
  expect(steps.map((step) => stepFault(step, math))).toEqual([undefined, undefined]);
});
