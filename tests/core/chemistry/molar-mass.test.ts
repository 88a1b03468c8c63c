import { MF } from 'mf-parser';
import { describe, expect, test } from 'vitest';
import {
  ATOMIC_WEIGHTS,
  STANDARD_ATOMIC_WEIGHTS,
  type Element,
} from '../../../src/core/chemistry/atomic-weights.ts';
import { SO2_MOLAR_MASS, molarMass } from '../../../src/core/chemistry/molar-mass.ts';
import { BURNT_SULPHUR, IODINE_FACTOR, TITRATIONS } from '../../tables/worked-additions.ts';

test.each(Object.keys(ATOMIC_WEIGHTS) as Element[])(
  'the weight of %s lies in the standard interval (IUPAC/CIAAW 2021, read)',
  (element) => {
    const [low, high] = STANDARD_ATOMIC_WEIGHTS[element];
    const half = 5e-4; // a conventional weight has three decimals
    expect(ATOMIC_WEIGHTS[element]).toBeGreaterThanOrEqual(low - half);
    expect(ATOMIC_WEIGHTS[element]).toBeLessThanOrEqual(high + half);
  },
);

test('a count that is no whole number above 0 is refused', () => {
  expect(() => molarMass({ S: 1, O: 0 })).toThrow(RangeError);
  expect(() => molarMass({ S: 1.5 })).toThrow(RangeError);
  expect(() => molarMass({ S: Number.NaN })).toThrow(RangeError);
});

describe('the molar mass of SO2 gives the factors of the laboratory', () => {
  const mg_per_meq = SO2_MOLAR_MASS / 2;

  test('1 mL of 0.1 N iodine takes 3.203 mg (L05: JECFA 1999, read)', () => {
    expect(Number((mg_per_meq * 0.1).toFixed(3))).toBe(IODINE_FACTOR.SO2_mg);
  });

  test.each(TITRATIONS)('$source: $SO2_mg_L mg/L', ({ titrant_mL, normality, sample_mL, SO2_mg_L }) => {
    const found = (titrant_mL * normality * mg_per_meq * 1000) / sample_mL;
    expect(Math.abs(found / SO2_mg_L - 1)).toBeLessThan(0.002); // they take 32 for 32.03
  });

  test('27.8 mg of iodate in 500 mL: 1 mL takes 5 mg/L of 10 mL of wine (L10: amateur club, read, not citable)', () => {
    const iodate_mmol_mL = 27.8 / new MF('KIO3').getInfo().mass / 500;
    const SO2_mg = iodate_mmol_mL * 3 * SO2_MOLAR_MASS;
    expect(Number(((SO2_mg * 1000) / 10).toFixed(1))).toBe(5);
  });

  test('10 g of oxygen burn sulphur to 20 g of SO2 (L03, read)', () => {
    const { O2_g, SO2_g, barrel_L, SO2_mg_L, in_wine_share, in_wine_mg_L } = BURNT_SULPHUR;
    const found = (O2_g * SO2_MOLAR_MASS) / molarMass({ O: 2 });
    expect(Math.abs(found / SO2_g - 1)).toBeLessThan(0.002);
    const in_barrel = (found * 1000) / barrel_L;
    expect(Math.abs(in_barrel / SO2_mg_L - 1)).toBeLessThan(0.002);
    expect(Math.abs((in_barrel * in_wine_share) / in_wine_mg_L - 1)).toBeLessThan(0.002);
  });
});
