import { describe, expect, test } from 'vitest';
import { litresFrom } from '../../../src/core/units/volume.ts';
import { BINDING_CASE, WORKED_ADDITIONS } from '../../tables/worked-additions.ts';
import { doseOf, POWDER } from './ask.ts';

describe('worked additions as printed', () => {
  test.each(WORKED_ADDITIONS)('$source', ({ volume, add_mg_L, additive, within, ...printed }) => {
    const answer = doseOf({
      volume_L: litresFrom(volume.value, volume.unit),
      target: { add_mg_L },
      targetStated: true,
      additive,
    });
    const amount = 'mass_g' in printed ? printed.mass_g : printed.additive_volume_mL;
    const found = 'mass_g' in printed ? answer.mass_g : answer.additive_volume_mL;
    expect(Math.abs((found ?? 0) / amount - 1)).toBeLessThan(within);
  });

  test('L01 with the exact share is 427.0 g', () => {
    const [first] = WORKED_ADDITIONS;
    const answer = doseOf({
      volume_L: litresFrom(1000, 'galUS'),
      target: { add_mg_L: first.add_mg_L },
      targetStated: true,
      additive: POWDER,
    });
    expect(Number((answer.mass_g ?? 0).toFixed(1))).toBe(first.exact_mass_g);
  });

  test(`a third binds: ${BINDING_CASE.source}`, () => {
    const { free_mg_L, target_free_mg_L, binding_share, dose_mg_L } = BINDING_CASE;
    const answer = doseOf({
      free_mg_L,
      target: { free_mg_L: target_free_mg_L },
      targetStated: true,
      binding_share,
    });
    expect(answer.dose_mg_L).toBeCloseTo(dose_mg_L, 10);
  });
});

test('1450 US gallons at pH 3.58 with 21 mg/L free take 147.69 g of SO2 in 256 g of powder (worked by hand)', () => {
  // 0.8 × (10^1.77 + 1) = 47.907; − 21 = 26.907 mg/L; × 5488.847 L = 147.691 g; ÷ 0.57629 = 256.28 g
  const answer = doseOf({});
  expect(Number(answer.SO2_g?.toFixed(2))).toBe(147.69);
  expect(answer.measure).toEqual({ value: 256, unit: 'g' });
});
