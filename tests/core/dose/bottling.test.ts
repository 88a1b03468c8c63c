import { describe, expect, test } from 'vitest';
import { oxygenLoss, SO2_PER_OXYGEN_BY_FORMULA } from '../../../src/core/dose/oxygen-loss.ts';
import type { DoseRequest } from '../../../src/core/dose/request.ts';
import { startWarnings } from '../../../src/core/dose/start-warnings.ts';
import { doseOf } from './ask.ts';
import { loose, wrongIn } from './evaluate-step.ts';

const BOTTLING = { volume_L: 4000, ph: 3.4, free_mg_L: 22, oxygen_mg_L: 2 } as const;

describe('what oxygen takes at bottling', () => {
  // 2 SO2 to 1 O2 by standard atomic weights: 2 × 64.06 ÷ 31.998 = 4.004. An amateur article has 5–8 mg/L O2 use up
  // 20–32 mg/L SO2, the same 4 for 1.
  test('is four for one by the formula', () => {
    expect(SO2_PER_OXYGEN_BY_FORMULA).toBeCloseTo(4.004, 3);
    for (const [oxygen_mg_L, SO2] of [
      [5, 20],
      [8, 32],
    ] as const)
      expect(Math.round(oxygenLoss({ oxygen_mg_L }))).toBe(SO2);
  });

  test.each([
    [{}, 0],
    [{ oxygen_mg_L: 0 }, 0],
    [{ oxygen_mg_L: 2, SO2_mg_per_mg_O2: 2.5 }, 5],
  ])('%j: %d mg/L', (oxygen, SO2) => {
    expect(oxygenLoss(oxygen)).toBe(SO2);
  });

  test.each([
    { oxygen_mg_L: -0.1 },
    { oxygen_mg_L: 20.1 },
    { oxygen_mg_L: Number.NaN },
    { oxygen_mg_L: 2, SO2_mg_per_mg_O2: 0.9 },
    { oxygen_mg_L: 2, SO2_mg_per_mg_O2: 5.1 },
  ])('%j is refused', (oxygen) => {
    expect(() => oxygenLoss(oxygen)).toThrow(RangeError);
  });
});

describe('a dose before bottling', () => {
  test('after the loss the target stands', () => {
    const plain = doseOf({ volume_L: 4000, ph: 3.4, free_mg_L: 22 });
    const answer = doseOf(BOTTLING);
    const { bottling, target_free_mg_L, add_mg_L } = answer;
    expect(bottling).toEqual({
      oxygen_mg_L: 2,
      loss_mg_L: [5, expect.closeTo(8.008, 3)],
      counted_mg_L: expect.closeTo(8.008, 3),
      free_at_bottling_mg_L: expect.closeTo(plain.target_free_mg_L ?? 0, 9),
    });
    expect((target_free_mg_L ?? 0) - (bottling?.counted_mg_L ?? 0)).toBeCloseTo(
      plain.target_free_mg_L ?? 0,
      9,
    );
    expect(add_mg_L).toBeCloseTo((plain.add_mg_L ?? 0) + 8.008, 3);
  });

  test.each([
    BOTTLING,
    { ...BOTTLING, SO2_mg_per_mg_O2: 2.5 },
    { ...BOTTLING, target: { free_mg_L: 30 }, targetStated: true },
    { ...BOTTLING, binding_allowance_percent: 30 },
    { ...BOTTLING, vessels: 4 },
    { ...BOTTLING, oxygen_mg_L: 1.37, alcohol_percent: 13, temperature_C: 22, basis: 'oiv' },
  ] as Partial<DoseRequest>[])('%j: the working says each step', (request) => {
    const { steps } = doseOf(request);
    expect(steps.map(({ name }) => name)).toEqual(
      expect.arrayContaining(['oxygen-loss', 'free-before-bottling', 'addition']),
    );
    expect(steps.map(wrongIn).filter(Boolean)).toEqual([]);
    expect(loose(steps)).toEqual([]);
  });

  test('of a stated addition nothing is added', () => {
    const { dose_mg_L, bottling } = doseOf({ ...BOTTLING, target: { add_mg_L: 20 }, targetStated: true });
    expect(dose_mg_L).toBe(20);
    expect(bottling).not.toHaveProperty('free_at_bottling_mg_L');
  });

  test('where no oxygen is stated nothing is said of it', () => {
    expect(doseOf({})).not.toHaveProperty('bottling');
  });
});

describe('before something is to start', () => {
  // AWRI, Ask the AWRI: MLF possible below 5–10 free and 30–40 total at pH 3.3–3.5. Yeast: common practice, no source.
  test.each([
    ['malolactic', { free_mg_L: 10, total_mg_L: 40 }, undefined],
    ['malolactic', { free_mg_L: 10.1 }, 'free'],
    ['malolactic', { total_mg_L: 40.1 }, 'total'],
    ['malolactic', { free_mg_L: 25, total_mg_L: 60 }, 'both'],
    ['finished', { free_mg_L: 25, total_mg_L: 60 }, undefined],
  ] as const)('%s, %j: above %s', (stage, wine, above) => {
    expect(startWarnings(stage, wine)[0]?.values['above']).toBe(above);
  });

  test.each([
    [0.79, 0],
    [0.8, 1],
  ])('a restart at %d mg/L molecular: %d warnings', (molecular_mg_L, times) => {
    expect(startWarnings('fermenting', { molecular_mg_L })).toHaveLength(times);
  });

  test('a dose that is asked at that stage carries it', () => {
    const { warnings } = doseOf({ stage: 'malolactic', stageStated: true, free_mg_L: 25 });
    expect(warnings.map(({ code }) => code)).toContain('malolactic-may-not-start');
  });
});
