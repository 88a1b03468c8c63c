import { expect, test } from 'vitest';
import { ascorbicCountsAs_mg_L } from '../../../src/core/laboratory/ascorbic.ts';
import { precisionOf } from '../../../src/core/laboratory/precision.ts';
import { titrate, type Titration } from '../../../src/core/laboratory/titration.ts';
import { loadMathjs } from '../../../src/core/units/define.ts';
import { stepFault } from '../../../src/core/units/step-fault.ts';
import { TITRATIONS } from '../../tables/titrations.ts';

const math = await loadMathjs();

const resultOf = (titration: Titration): number => {
  const { free_mg_L, total_mg_L } = titrate(titration);
  return free_mg_L ?? total_mg_L ?? NaN;
};

test.each(TITRATIONS)('as printed: $source', ({ titration, printed_mg_L, within_mg_L }) => {
  expect(Math.abs(resultOf(titration) - printed_mg_L)).toBeLessThanOrEqual(within_mg_L);
});

const iodine: Titration = {
  method: 'iodine',
  of: 'free',
  sample_mL: 25,
  titrant_mL: 2.4,
  titrant: { strength: 0.02, unit: 'N' },
};

// 64.06 ÷ 176.12 = 0.364 mg of SO2 for each mg: computed from the molar masses.
test('iodine counts 50 mg/L of ascorbic acid as 18 mg/L of SO2, and aeration does not', () => {
  expect(ascorbicCountsAs_mg_L(50)).toBeCloseTo(18.2, 1);
  const apart = resultOf(iodine) - resultOf({ ...iodine, ascorbic_mg_L: 50 });
  expect(apart).toBeCloseTo(18.2, 1);
  expect(resultOf({ ...iodine, method: 'aeration', ascorbic_mg_L: 50 })).toBe(resultOf(iodine));
});

test('ascorbic acid never makes it negative, and a blank counts in full', () => {
  expect(resultOf({ ...iodine, ascorbic_mg_L: 500 })).toBe(0);
  expect(resultOf({ ...iodine, blank_mL: 2.4 })).toBe(0);
  expect(resultOf({ ...iodine, blank_mL: 0.4 })).toBeCloseTo((resultOf(iodine) * 2) / 2.4, 9);
});

test('iodine in moles counts twice what it counts in equivalents, NaOH the same', () => {
  const inM = { strength: 0.02, unit: 'M' } as const;
  expect(resultOf({ ...iodine, titrant: inM })).toBeCloseTo(2 * resultOf(iodine), 9);
  expect(resultOf({ ...iodine, method: 'aeration', titrant: inM })).toBeCloseTo(resultOf(iodine), 9);
});

// Regulation (EEC) No 2676/90 (read): 9 mg/L for 50 mL up to 50 mg/L, 15 mg/L for 20 mL above.
test('published precision is told where it is on file, and nowhere else', () => {
  const total = { method: 'aeration', of: 'total' } as const;
  expect(precisionOf({ ...total, sample_mL: 50 }, 40)?.reproducibility_mg_L).toBe(9);
  expect(precisionOf({ ...total, sample_mL: 20 }, 90)?.reproducibility_mg_L).toBe(15);
  expect(precisionOf({ ...total, sample_mL: 20 }, 40)).toBeUndefined();
  expect(precisionOf({ ...total, of: 'free', sample_mL: 50 }, 30)).toBeUndefined();
  expect(precisionOf({ method: 'iodine', of: 'total', sample_mL: 50 }, 30)).toBeUndefined();
});

const worked: readonly Titration[] = [
  ...TITRATIONS.map(({ titration }) => titration),
  { ...iodine, blank_mL: 0.15, ascorbic_mg_L: 35, titrant: { strength: 0.0123, unit: 'M' } },
  { ...iodine, blank_mL: 0.1, titrant: { iodate_mg: 55.6, flask_mL: 1000 } },
];

test.each(worked)('each line of the working holds, and the last is the result (%#)', (titration) => {
  const { steps } = titrate(titration);
  expect(steps.map((step) => stepFault(step, math))).toEqual(steps.map(() => undefined));
  const last = steps.at(-1)?.result;
  expect(last?.unit).toBe('mg/L');
  expect(last?.value).toBeCloseTo(resultOf(titration), 1);
});

test('what no burette has is refused', () => {
  expect(() => titrate({ ...iodine, sample_mL: 0 })).toThrow(RangeError);
  expect(() => titrate({ ...iodine, blank_mL: 3 })).toThrow(RangeError);
  expect(() => titrate({ ...iodine, titrant: { strength: 5, unit: 'N' } })).toThrow(RangeError);
  expect(() => titrate({ ...iodine, titrant: { strength: NaN, unit: 'N' } })).toThrow(RangeError);
  expect(() =>
    titrate({ ...iodine, method: 'aeration', titrant: { iodate_mg: 27.8, flask_mL: 500 } }),
  ).toThrow(TypeError);
});
