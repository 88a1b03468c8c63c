import { describe, expect, test } from 'vitest';
import { added } from '../../../src/core/dose/added.ts';
import { solution } from '../../../src/core/dose/solution.ts';
import { codesOf, effectOf, POWDER, valuesOf } from './ask.ts';

describe('effect() of an amount in a volume', () => {
  test('100 g of powder in 20 hl add 28.8 mg/L', () => {
    const answer = effectOf({ mass_g: 100, volume_L: 2000 });
    expect(answer.SO2_g).toBeCloseTo(57.629, 3);
    expect(answer.adds_mg_L).toBeCloseTo(28.8145, 4);
    for (const key of ['free_after_mg_L', 'molecular_after_mg_L', 'total_after_mg_L', 'pK'])
      expect(answer).not.toHaveProperty(key);
  });

  test('with readings it says where the wine lands', () => {
    const answer = effectOf({ mass_g: 100, volume_L: 2000, ph: 3.4, free_mg_L: 15, total_mg_L: 60 });
    expect(answer.free_after_mg_L).toBeCloseTo(43.8145, 4);
    expect(answer.free_expected_mg_L?.[0]).toBeCloseTo(15 + 28.8145 / 2, 4);
    expect(answer.molecular_after_mg_L).toBeCloseTo(43.8145 / (10 ** 1.59 + 1), 4);
    expect(answer.total_after_mg_L).toBeCloseTo(88.8145, 4);
    expect(answer).toMatchObject({ pK: 1.81, basis: 'pk-1.81' });
  });

  test('without a volume it says the SO2 alone', () => {
    expect(effectOf({ mass_g: 100 })).toMatchObject({ SO2_g: expect.closeTo(57.629, 3) });
    expect(effectOf({ mass_g: 100 })).not.toHaveProperty('adds_mg_L');
  });

  test('without a settled additive it says nothing', () => {
    const { additive: _additive, ...request } = { additive: POWDER, mass_g: 100, volume_L: 2000 };
    const answer = added(request);
    expect(answer).toEqual({ mass_g: 100, warnings: [], steps: [] });
  });
});

describe('effect() of a rate', () => {
  test('1 g of powder in 10 L adds 58 mg/L, and does not stop a fermentation', () => {
    const answer = effectOf({ rate_mg_L: 100, stage: 'fermenting', toStopFermentation: true });
    expect(Math.round(answer.adds_mg_L ?? 0)).toBe(58);
    expect(codesOf(answer).slice(0, 2)).toEqual(['does-not-stop-fermentation', 'stage-not-over']);
  });
  test('with a volume it gives the mass of the additive', () => {
    expect(effectOf({ rate_mg_L: 100, volume_L: 500 })).toMatchObject({
      mass_g: 50,
      SO2_g: expect.closeTo(28.8145, 4),
    });
  });
  test('of a solution nothing follows, as its density is unknown', () => {
    const answer = effectOf({
      rate_mg_L: 100,
      additive: { id: 'sulfur-dioxide-solution', strength_percent: 6 },
    });
    expect(answer).not.toHaveProperty('adds_mg_L');
  });
});

describe('effect() warns', () => {
  test.each([
    [{ mass_g: 400, volume_L: 2000 }, 'addition-large'],
    [{ mass_g: 200, volume_L: 2000, ph: 3.2, free_mg_L: 15 }, 'molecular-above-2'],
    [{ mass_g: 100, volume_L: 2000, total_mg_L: 130, style: 'red' }, 'total-over-limit'],
    [{ mass_g: 100, volume_L: 2000, total_mg_L: 110, style: 'red' }, 'total-near-limit'],
    [{ mass_g: 100, volume_L: 2000, free_mg_L: 4 }, 'free-low-may-bind-all'],
    [{ mass_g: 100, volume_L: 2000, stage: 'malolactic' }, 'stage-not-over'],
    [{ mass_g: 100, volume_L: 2000, additive: { id: 'sulfur-dioxide-gas' } }, 'gas-needs-training'],
    [{ mass_g: 100, volume_L: 2000, ph: 4.4, free_mg_L: 20 }, 'ph-unusual'],
    [{ mass_g: 100, volume_L: 2000, ph: 3.4, free_mg_L: 20, basis: 'oiv' }, 'basis-fallback'],
  ] as const)('%j: %s', (request, code) => {
    expect(codesOf(effectOf(request))).toContain(code);
  });
  test('of a total that is unknown it says the least that it can be', () => {
    const values = valuesOf(effectOf({ mass_g: 600, volume_L: 2000, free_mg_L: 20 }), 'total-over-limit');
    expect(values).toMatchObject({ total: 'at-least', limit_mg_L: 150 });
    expect(values?.['total_after_mg_L']).toBeCloseTo(20 + 172.887, 3);
  });
});

describe('added()', () => {
  test.each([
    [
      { mass_g: 82, additive: POWDER },
      { mass_g: 82, SO2_g: 47.2558 },
    ],
    [
      { mass_g: 82, additive: POWDER, volume_L: 2000 },
      { mass_g: 82, SO2_g: 47.2558, added_mg_L: 23.6279 },
    ],
    [{ added_mg_L: 26 }, { added_mg_L: 26 }],
    [
      { added_mg_L: 26, volume_L: 1000 },
      { added_mg_L: 26, SO2_g: 26 },
    ],
    [
      { added_mg_L: 26, volume_L: 1000, additive: POWDER },
      { added_mg_L: 26, SO2_g: 26, mass_g: 45.1162 },
    ],
    [
      { added_mg_L: 26, volume_L: 1000, additive: { id: 'tablet', tablet_SO2_g: 5 } },
      { added_mg_L: 26, SO2_g: 26, tablets: 5.2 },
    ],
    [
      {
        additive_volume_mL: 350,
        volume_L: 225,
        additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 },
      },
      { additive_volume_mL: 350, SO2_g: 20.1702, added_mg_L: 89.6451 },
    ],
    [{ tablets: 3 }, { tablets: 3 }],
    [
      { tablets: 3, volume_L: 15, additive: { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 } },
      { tablets: 3, SO2_g: 0.7607, added_mg_L: 50.7135 },
    ],
    [
      { mass_g: 10, volume_L: 225, additive: { id: 'tablet', tablet_SO2_g: 5 } },
      { mass_g: 10, SO2_g: 10, added_mg_L: 44.4444 },
    ],
  ] as const)('%j gives %j', (request, expected) => {
    const { steps: _steps, warnings: _warnings, ...answer } = added(request);
    expect(Object.keys(answer).toSorted()).toEqual(Object.keys(expected).toSorted());
    for (const [key, value] of Object.entries(expected))
      expect((answer as unknown as Record<string, number>)[key]).toBeCloseTo(value, 3);
  });
  test('the working of mg/L alone leads to the additive', () => {
    const { steps } = added({ added_mg_L: 26, volume_L: 1000, additive: POWDER });
    expect(steps.map(({ name }) => name)).toEqual(['so2-mass', 'additive-mass']);
  });
});

describe('solution()', () => {
  test.each([
    ['potassium-metabisulfite-solution', 10, 5, 500, 5.7629],
    ['sodium-metabisulfite-solution', 10, 5, 500, 6.7396],
    ['potassium-metabisulfite-solution', 5, 0.5, 25, 2.88145],
  ] as const)(
    '%s of %d %% in %d L: %d g, %d g SO2 in 100 mL',
    (id, strength_percent, volume_L, salt_g, strength) => {
      const answer = solution({ volume_L, additive: { id, strength_percent } });
      expect(answer.salt_g).toBeCloseTo(salt_g, 9);
      expect(answer.strength_SO2_g_per_100_mL).toBeCloseTo(strength, 4);
      expect(answer.measure).toEqual({ value: salt_g, unit: 'g' });
      expect(answer.steps.at(-1)?.result).toEqual({ value: salt_g, unit: 'g' });
    },
  );
  test('10 g of powder in 100 mL, said as powder or as solution', () => {
    for (const id of ['potassium-metabisulfite', 'potassium-metabisulfite-solution'] as const) {
      const answer = solution({ volume_L: 0.1, mass_g: 10, additive: { id } });
      expect(answer).toMatchObject({ salt_g: 10, strength_SO2_g_per_100_mL: expect.closeTo(5.7629, 4) });
    }
  });
  test('50 mL of a 10 % stock filled up to a litre', () => {
    const answer = solution({
      volume_L: 1,
      additive_volume_mL: 50,
      additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 },
    });
    expect(answer).toMatchObject({
      additive_volume_mL: 50,
      strength_SO2_g_per_100_mL: expect.closeTo(0.28815, 5),
    });
    expect(answer).not.toHaveProperty('salt_g');
  });
  test('what is not weighed has its strength alone, and what is unknown none', () => {
    const bisulfite = { id: 'potassium-bisulfite-solution', strength_percent: 15 } as const;
    expect(solution({ volume_L: 1, additive: bisulfite })).toEqual({
      volume_L: 1,
      strength_SO2_g_per_100_mL: 15,
      steps: [],
    });
    expect(solution({ volume_L: 1, additive: POWDER })).toEqual({ volume_L: 1, steps: [] });
    expect(solution({ volume_L: 1, mass_g: 9, additive: bisulfite })).toMatchObject({ salt_g: 9, steps: [] });
  });
});
