import { describe, expect, test } from 'vitest';
import { cautionsOf } from '../../../src/core/additives/cautions.ts';
import { solution } from '../../../src/core/dose/solution.ts';
import { stockPerBarrel } from '../../../src/core/dose/stock-per-barrel.ts';
import type { SolutionRequest } from '../../../src/core/dose/request.ts';
import { wrongIn } from './evaluate-step.ts';

const STOCK = { id: 'potassium-metabisulfite-solution', strength_percent: 10 } as const;
const POWDER = { id: 'potassium-metabisulfite' } as const;
const SODIUM = { id: 'sodium-metabisulfite' } as const;

describe('a stock', () => {
  // SO2 share of K2S2O5 0.57629: JECFA 1999 and USP 35 (57.6 % of 222.33 g/mol); the rest is arithmetic.
  test.each([
    [{ volume_L: 5, additive: STOCK }, 10, 0.25613, 39.043],
    [{ volume_L: 1, additive: STOCK, rise_mg_L: 30 }, 30, 0.25613, 117.128],
    [{ volume_L: 0.5, additive: { ...STOCK, strength_percent: 5 } }, 10, 0.12806, 78.086],
    [{ volume_L: 0.1, mass_g: 10, additive: POWDER }, 10, 0.25613, 39.043],
    [{ volume_L: 1, mass_g: 100, additive: SODIUM }, 10, 0.29954, 33.385],
  ] as [SolutionRequest, number, number, number][])(
    '%j: millilitres for %d mg/L in a barrel of 225 L',
    (request, rise_mg_L, one_mL, millilitres) => {
      const { per_barrel, keeps } = solution(request);
      expect(keeps).toBe('days-to-weeks');
      expect(per_barrel).toEqual({
        barrel_L: 225,
        rise_mg_L,
        one_mL_adds_mg_L: expect.closeTo(one_mL, 4),
        additive_volume_mL: expect.closeTo(millilitres, 2),
        steps: expect.any(Array),
      });
    },
  );

  test.each([
    { volume_L: 5, additive: STOCK },
    { volume_L: 18.92705892, volume_display: { value: 5, unit: 'galUS' }, additive: STOCK },
    { volume_L: 0.75, mass_g: 33, additive: SODIUM, rise_mg_L: 12.5 },
    { volume_L: 225, additive: POWDER, use: 'holding' },
    { volume_L: 18.92705892, volume_display: { value: 5, unit: 'galUS' }, additive: SODIUM, use: 'rinse' },
  ] as SolutionRequest[])('%j: each line of the working gives what it says', (request) => {
    const { steps, per_barrel } = solution(request);
    expect(steps.length).toBeGreaterThan(1);
    expect([...steps, ...(per_barrel?.steps ?? [])].map(wrongIn).filter(Boolean)).toEqual([]);
  });

  test('the working goes on from the strength that it has printed', () => {
    const { steps, per_barrel } = solution({ volume_L: 5, additive: STOCK });
    const [strength] = steps;
    expect(per_barrel?.steps).toHaveLength(2);
    for (const step of per_barrel?.steps ?? [])
      expect(step.substituted).toContain(`${strength?.result.value} g`);
  });

  test('what was published about solubility is a bound', () => {
    // Food Additives Data Book p. 780 (25 %) against an encyclopedia page (450 g/L), both at 20 °C; no table over temperature.
    const made = (mass_g: number, temperature_C?: number) =>
      solution({
        volume_L: 1,
        mass_g,
        additive: POWDER,
        ...(temperature_C !== undefined && { temperature_C }),
      });
    expect(made(250)).toMatchObject({ salt_g: 250 });
    expect(made(250)).not.toHaveProperty('solubility');
    expect(made(251)).toEqual({
      volume_L: 1,
      solubility: { says: 'too-much', salt_g_per_L: 251, least_g_per_L: 250, most_g_per_L: 450, at_C: 20 },
      steps: [],
    });
    expect(made(125, 8)).toMatchObject({ salt_g: 125, solubility: { says: 'unknown-when-colder' } });
    expect(made(126, 8)).not.toHaveProperty('salt_g');
    expect(made(200, 20)).not.toHaveProperty('solubility');
  });

  test('of the sodium salt more dissolves', () => {
    // A supplier data sheet: 470 g/L at 25 °C.
    expect(solution({ volume_L: 1, mass_g: 470, additive: SODIUM })).toMatchObject({ salt_g: 470 });
    expect(solution({ volume_L: 1, mass_g: 471, additive: SODIUM })).not.toHaveProperty('salt_g');
  });

  test.each([0, -1, Number.NaN, 1001])('a rise of %d mg/L is none', (rise_mg_L) => {
    expect(() => stockPerBarrel(5.76, { rise_mg_L })).toThrow(RangeError);
  });
});

describe('a holding solution and a rinse', () => {
  // 2 and 1 g/L, 0.2 and 3 g/L: common practice, no source.
  test.each([
    ['holding', 450, 225],
    ['rinse', 45, 675],
  ] as const)('%s: by the usual recipe, with citric acid', (use, salt_g, citric_acid_g) => {
    const answer = solution({ volume_L: 225, additive: POWDER, use });
    expect(answer).toMatchObject({ use, salt_g, citric_acid_g });
    expect(answer).not.toHaveProperty('per_barrel');
    // Water, then the acid, the sulfite last.
    expect(answer.steps.map(({ name }) => name)).toEqual(['citric-acid-by-recipe', 'salt-by-recipe']);
  });

  test('a strength of one’s own goes before the recipe, without acid and without a dose for a barrel', () => {
    const answer = solution({ volume_L: 60, additive: { ...STOCK, strength_percent: 1 }, use: 'holding' });
    expect(answer).toMatchObject({ use: 'holding', salt_g: 600 });
    for (const key of ['citric_acid_g', 'per_barrel', 'keeps']) expect(answer).not.toHaveProperty(key);
  });

  test('where citric acid is in it, the caution is about any other acid', () => {
    const cautions = cautionsOf('potassium-metabisulfite', 'water-with-acid');
    expect(cautions).toContain('no-other-acid-no-chlorine');
    expect(cautions).not.toContain('no-acid-no-chlorine');
  });
});
