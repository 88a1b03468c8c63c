import { describe, expect, test } from 'vitest';
import { freeToMolecular } from '../../../src/core/chemistry/free-to-molecular.ts';
import { measured } from '../../../src/core/dose/measured.ts';
import { measureOf } from '../../../src/core/dose/rounding.ts';
import { codesOf, doseOf } from './ask.ts';

describe('just at a mark and just past it', () => {
  // Own threshold: above pH 3.5 the colour matters.
  test.each([
    [3.5, false],
    [3.505, true],
  ])('at pH %d the amount for a red is told: %s', (ph, told) => {
    expect(codesOf(doseOf({ ph })).includes('style-unknown')).toBe(told);
  });

  // The published constants of SO2 lie between 1.5 and 3 (OIV-MA-AS323-04C, read); 1 to 3.5 is our own bound.
  test('a pK above 3.5 or below 1 is refused', () => {
    expect(freeToMolecular(3.5, 3.5)).toBe(2);
    expect(() => freeToMolecular(3.5, 3.501)).toThrow(RangeError);
    expect(() => freeToMolecular(3.5, 0.999)).toThrow(RangeError);
  });
});

describe('rounding', () => {
  test('an amount that a ceiling holds down says so, as its working must be rounded alike', () => {
    const held = measureOf(256.6, 'scale', { dose_mg_L: 26.9, ceiling_mg_L: 26.92 });
    expect(held).toMatchObject({ measure: { value: 256, unit: 'g' }, down: true });
    expect(measureOf(256.6, 'scale', { dose_mg_L: 26.9, ceiling_mg_L: 30 })).toMatchObject({
      measure: { value: 257, unit: 'g' },
      down: false,
    });
  });

  test('the rest of a dose in tablets is told even where it is small', () => {
    // 2.6 tablets of 5 g SO2: two and a half, and 0.5 g SO2 as stock.
    const shown = measured({ additive: { id: 'tablet', tablet_SO2_g: 5 }, dose_mg_L: 26, volume_L: 500 });
    expect(shown).toMatchObject({ measure: { value: 2.5, unit: 'tablets' } });
    expect(shown?.stock?.additive_volume_mL).toBeCloseTo((0.5 / 0.5762902) * 10, 3);
  });
});
