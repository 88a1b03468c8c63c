import { describe, expect, test } from 'vitest';
import { measureOf } from '../../../src/core/dose/rounding.ts';

describe('a scale shows', () => {
  test.each([
    [0, { value: 0, unit: 'g' }],
    [7.26, { value: 7.3, unit: 'g' }],
    [9.94, { value: 9.9, unit: 'g' }],
    [9.97, { value: 10, unit: 'g' }],
    [10.4, { value: 10, unit: 'g' }],
    [256.28, { value: 256, unit: 'g' }],
    [999.4, { value: 999, unit: 'g' }],
    [999.6, { value: 1, unit: 'kg' }],
    [1004, { value: 1, unit: 'kg' }],
    [1006, { value: 1.01, unit: 'kg' }],
    [3174.2, { value: 3.17, unit: 'kg' }],
    [256_280, { value: 256.28, unit: 'kg' }],
  ] as const)('%d g as %j', (amount, measure) => {
    // In so much wine that no rounding is coarse.
    expect(measureOf(amount, 'scale', { dose_mg_L: 0.4 }).measure).toEqual(measure);
  });
});

describe('a cylinder shows', () => {
  test.each([
    [4.04, { value: 4, unit: 'mL' }],
    [35.4, { value: 35, unit: 'mL' }],
    [1234, { value: 1.23, unit: 'L' }],
  ] as const)('%d mL as %j', (amount, measure) => {
    expect(measureOf(amount, 'cylinder', { dose_mg_L: 0.4 }).measure).toEqual(measure);
  });
});

describe('a finer step is taken where more than 1 % of the dose and more than 0.5 mg/L would change', () => {
  test.each([
    [10.5, 'scale', 27, 10.5], // 10 or 11 would be 4.8 %, 1.3 mg/L
    [10.5, 'scale', 10, 11], // 4.8 % but 0.48 mg/L
    [20.44, 'scale', 27, 20.4], // 20 would be 2.2 %, 0.58 mg/L
    [20.44, 'scale', 22, 20], // … and here 0.47 mg/L
    [30.4, 'scale', 60, 30.4], // 30 would be 1.3 %, 0.79 mg/L
    [60.4, 'scale', 100, 60], // 0.66 mg/L but 0.7 %
    [4.67, 'scale', 27, 4.7], // 0.6 %
    [0.467, 'scale', 27, 0.47], // 0.5 would be 7 %
    [0.0467, 'scale', 27, 0.05], // nothing finer than 0.01 g
    [0.46, 'cylinder', 27, 0.5], // nothing finer than 0.1 mL
    [15.5, 'cylinder', 27, 15.5],
    [0.04, 'scale', 0.3, 0.04], // never nothing where something finer shows
  ] as const)('%d on a %s for %d mg/L is %d', (amount, instrument, dose_mg_L, expected) => {
    expect(measureOf(amount, instrument, { dose_mg_L }).measure.value).toBe(expected);
  });

  test('what remains is said in mg/L, with its sign', () => {
    expect(measureOf(10.5, 'scale', { dose_mg_L: 10 }).rounding_mg_L).toBeCloseTo((0.5 / 10.5) * 10, 10);
    expect(measureOf(256.279, 'scale', { dose_mg_L: 26.9 }).rounding_mg_L).toBeCloseTo(
      (-0.279 / 256.279) * 26.9,
      10,
    );
  });
});

describe('a dose that keeps to a limit is not rounded past it', () => {
  test('up to the nearest step where the limit is far, down where it is near', () => {
    expect(measureOf(256.7, 'scale', { dose_mg_L: 27, ceiling_mg_L: 28 }).measure.value).toBe(257);
    expect(measureOf(256.7, 'scale', { dose_mg_L: 27, ceiling_mg_L: 27.01 }).measure.value).toBe(256);
  });
  test('a dose that is past it already is rounded to the nearest', () => {
    expect(measureOf(256.7, 'scale', { dose_mg_L: 27, ceiling_mg_L: 20 }).measure.value).toBe(257);
  });
});

describe('tablets are counted down to the half', () => {
  test.each([
    [0.49, 0],
    [0.5, 0.5],
    [1.59, 1.5],
    [2.9999999999, 3],
    [2.999, 2.5],
    [3, 3],
  ])('%d tablets are %d', (amount, value) => {
    expect(measureOf(amount, 'tablets', { dose_mg_L: 27 }).measure).toEqual({ value, unit: 'tablets' });
  });
});

test.each([Number.NaN, Number.POSITIVE_INFINITY, -1])('%d of anything is refused', (amount) => {
  expect(() => measureOf(amount, 'scale')).toThrow(RangeError);
  expect(() => measureOf(1, 'scale', { dose_mg_L: amount })).toThrow(RangeError);
});
