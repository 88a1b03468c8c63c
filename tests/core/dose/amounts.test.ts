import { describe, expect, test } from 'vitest';
import { doseOf, POWDER } from './ask.ts';

const TEN = { target: { add_mg_L: 10 }, targetStated: true, volume_L: 1000 } as const; // 10 g of SO2

describe('10 g of SO2 as every additive', () => {
  test.each([
    [{ id: 'potassium-metabisulfite' }, 'mass_g', 10 / 0.576290216, { value: 17, unit: 'g' }],
    [{ id: 'potassium-metabisulfite', strength_percent: 96 }, 'mass_g', 10 / (0.96 * 0.576290216), null],
    [{ id: 'potassium-metabisulfite', strength_percent: 57 }, 'mass_g', 10 / 0.57, null],
    [{ id: 'sodium-metabisulfite' }, 'mass_g', 10 / 0.67396, null],
    [{ id: 'potassium-metabisulfite-solution', strength_percent: 10 }, 'additive_volume_mL', 173.523, null],
    [{ id: 'sodium-metabisulfite-solution', strength_percent: 10 }, 'additive_volume_mL', 148.377, null],
    [{ id: 'potassium-bisulfite-solution', strength_percent: 15 }, 'additive_volume_mL', 66.667, null],
    [
      { id: 'potassium-bisulfite-solution', strength_percent: 28.1, strength_of: 'salt' },
      'additive_volume_mL',
      66.757,
      null,
    ],
    [{ id: 'ammonium-bisulfite-solution', strength_percent: 40 }, 'additive_volume_mL', 25, null],
    [{ id: 'sulfur-dioxide-solution', strength_percent: 6 }, 'additive_volume_mL', 166.667, null],
    [{ id: 'sulfur-dioxide-gas' }, 'mass_g', 10, { value: 10, unit: 'g' }],
    [{ id: 'tablet', tablet_SO2_g: 5 }, 'tablets', 2, { value: 2, unit: 'tablets' }],
    [
      { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 },
      'tablets',
      39.437,
      { value: 39, unit: 'tablets' },
    ],
  ] as const)('%j: %s %d', (additive, key, amount, measure) => {
    const answer = doseOf({ ...TEN, additive });
    expect(answer.SO2_g).toBe(10);
    expect(Math.abs((answer[key] ?? 0) / amount - 1)).toBeLessThan(2e-5);
    expect(measure ?? answer.measure).toEqual(answer.measure);
    const others = (['mass_g', 'additive_volume_mL', 'tablets'] as const).filter((other) => other !== key);
    for (const other of others) expect(answer).not.toHaveProperty(other);
  });
});

describe('small amounts', () => {
  test('under 5 g of powder stand as a 10 % stock too', () => {
    const answer = doseOf({ volume_L: 60, target: { add_mg_L: 30 }, targetStated: true });
    expect(answer.mass_g).toBeCloseTo(3.1234, 4);
    expect(answer.stock).toMatchObject({
      additive: 'potassium-metabisulfite-solution',
      strength_percent: 10,
      measure: { value: 31, unit: 'mL' },
    });
    expect(answer.stock?.additive_volume_mL).toBeCloseTo(31.234, 3);
  });
  test('a stock of sodium metabisulfite stays sodium, and of a weaker powder as weak', () => {
    const add = { volume_L: 60, target: { add_mg_L: 30 }, targetStated: true } as const;
    expect(doseOf({ ...add, additive: { id: 'sodium-metabisulfite' } }).stock?.additive).toBe(
      'sodium-metabisulfite-solution',
    );
    const weak = doseOf({ ...add, additive: { id: 'potassium-metabisulfite', strength_percent: 50 } });
    expect(weak.stock?.additive_volume_mL).toBeCloseTo((weak.mass_g ?? 0) * 10, 10);
  });
  test.each([
    ['5 g and more of powder', { volume_L: 1000 }],
    ['a solution', { volume_L: 10, additive: { id: 'sulfur-dioxide-solution', strength_percent: 6 } }],
    ['gas', { volume_L: 10, additive: { id: 'sulfur-dioxide-gas' } }],
  ] as const)('%s have none', (_what, request) => {
    expect(doseOf({ ...TEN, ...request })).not.toHaveProperty('stock');
  });
});

describe('tablets', () => {
  test('go down to the half, with what that gives and the rest as stock', () => {
    const answer = doseOf({
      volume_L: 15,
      target: { add_mg_L: 30 },
      targetStated: true,
      additive: { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 },
    });
    // 0.45 g SO2 ÷ (0.44 g × 0.57629) = 1.7747 tablets
    expect(answer.measure).toEqual({ value: 1.5, unit: 'tablets' });
    expect(answer.measure_gives_mg_L).toBeCloseTo((1.5 * 0.44 * 576.290216) / 15, 5);
    expect(answer.rounding_mg_L).toBeCloseTo((answer.measure_gives_mg_L ?? 0) - 30, 10);
    expect(answer.stock?.additive_volume_mL).toBeCloseTo((0.45 / (0.44 * 0.576290216) - 1.5) * 0.44 * 10, 4);
  });
  test('below half a tablet leave the stock alone', () => {
    const answer = doseOf({
      volume_L: 5,
      target: { add_mg_L: 10 },
      targetStated: true,
      additive: { id: 'tablet', tablet_SO2_g: 2 },
    });
    expect(answer).not.toHaveProperty('measure');
    expect(answer.stock).toMatchObject({ additive: 'potassium-metabisulfite-solution' });
    expect(answer.stock?.additive_volume_mL).toBeCloseTo((0.05 / 0.576290216) * 10, 5);
  });
  test('a whole number of them has no rest', () => {
    expect(doseOf({ ...TEN, additive: { id: 'tablet', tablet_SO2_g: 5 } })).not.toHaveProperty('stock');
  });
});

describe('several vessels', () => {
  test('have the whole and the share of each, both as a scale shows them', () => {
    const answer = doseOf({ volume_L: 5400, vessels: 24, target: { add_mg_L: 27 }, targetStated: true });
    expect(answer.measure).toEqual({ value: 253, unit: 'g' });
    expect(answer.per_vessel).toMatchObject({ count: 24, measure: { value: 10.5, unit: 'g' } });
    expect((answer.per_vessel?.mass_g ?? 0) * 24).toBeCloseTo(answer.mass_g ?? 0, 9);
  });
  test('small shares stand as stock too', () => {
    const answer = doseOf({ volume_L: 450, vessels: 2, target: { add_mg_L: 10 }, targetStated: true });
    expect(answer.stock).toBeUndefined(); // 7.8 g in all
    expect(answer.per_vessel?.stock?.measure).toEqual({ value: 39, unit: 'mL' });
  });
  test('one vessel has no share', () => {
    expect(doseOf({ vessels: 1, additive: POWDER })).not.toHaveProperty('per_vessel');
  });
});

test('a dose that just keeps to the limit is not rounded past it', () => {
  // Room for 20 mg/L; 19.99 mg/L in 1000 L are 34.69 g, and 35 g would be 20.17 mg/L.
  const answer = doseOf({
    volume_L: 1000,
    style: 'red',
    total_mg_L: 130,
    target: { add_mg_L: 19.99 },
    targetStated: true,
  });
  expect(answer.measure).toEqual({ value: 34, unit: 'g' });
});
