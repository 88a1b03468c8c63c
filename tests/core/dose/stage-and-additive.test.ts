import { describe, expect, test } from 'vitest';
import { solution } from '../../../src/core/dose/solution.ts';
import { codesOf, doseOf, effectOf, valuesOf } from './ask.ts';

const STATED = { target: { add_mg_L: 30 }, targetStated: true, stageStated: true } as const;

describe('an addition that somebody states for wine that is not over its fermentations', () => {
  test.each(['malolactic', 'fermenting'] as const)('is reckoned in %s wine, with a warning', (stage) => {
    const answer = doseOf({ ...STATED, stage });
    expect(answer.measure).toBeDefined();
    // Ceilings: Australian Wine Research Institute, Ask the AWRI: malolactic fermentation (read).
    expect(valuesOf(answer, 'stage-not-over')).toMatchObject({
      stage,
      free_ceiling_low_mg_L: 5,
      free_ceiling_high_mg_L: 10,
      total_ceiling_low_mg_L: 30,
      total_ceiling_high_mg_L: 40,
    });
  });
  test.each(['must', 'base', 'finished', 'bottled'] as const)('%s has none of it', (stage) => {
    expect(codesOf(doseOf({ ...STATED, stage }))).not.toContain('stage-not-over');
    expect(codesOf(effectOf({ mass_g: 100, volume_L: 2000, stage }))).not.toContain('stage-not-over');
  });
  test('without a figure of their own there is no dose, and so no such warning', () => {
    expect(codesOf(doseOf({ stage: 'malolactic', stageStated: true }))).not.toContain('stage-not-over');
  });
});

describe('an additive that the international code does not name for wine', () => {
  const AMMONIUM = { id: 'ammonium-bisulfite-solution', strength_percent: 40 } as const;
  const SODIUM = { id: 'sodium-metabisulfite' } as const;
  const STOCK = { id: 'sodium-metabisulfite-solution', strength_percent: 10 } as const;

  // OIV Code of Oenological Practices II.1.12 and Oeno 7/2003 (read).
  test.each([
    ['ammonium bisulfite in a finished wine', { additive: AMMONIUM }, true],
    ['ammonium bisulfite in fermenting wine', { ...STATED, additive: AMMONIUM, stage: 'fermenting' }, true],
    ['ammonium bisulfite in must', { ...STATED, additive: AMMONIUM, stage: 'must' }, false],
    ['sodium metabisulfite in wine', { additive: SODIUM }, true],
    ['a stock of it in wine', { additive: STOCK }, true],
    ['sodium metabisulfite in cider', { additive: SODIUM, product: 'cider' }, false],
    ['potassium metabisulfite', {}, false],
  ] as const)('%s', (_what, request, warned) => {
    const answer = doseOf(request);
    expect(answer.SO2_g).toBeGreaterThan(0);
    expect(codesOf(answer).includes('additive-not-permitted')).toBe(warned);
  });
  test('the warning names the additive and the rule, and stands beside an effect too', () => {
    const answer = effectOf({ mass_g: 100, volume_L: 2000, additive: SODIUM });
    expect(valuesOf(answer, 'additive-not-permitted')).toEqual({
      additive: 'sodium-metabisulfite',
      rule: 'oiv-ii-1.12',
      reason: 'sodium',
      region: 'oiv',
      confidence: 'read',
    });
  });
  test('a stock in water is made of either', () => {
    expect(solution({ volume_L: 5, additive: STOCK }).salt_g).toBe(500);
  });
});

describe('too small an addition', () => {
  test.each([
    ['a rise of 0.3 mg/L', { target: { free_mg_L: 21.3 }, targetStated: true }, ['addition-negligible']],
    ['a rise of 0.6 mg/L', { target: { free_mg_L: 21.6 }, targetStated: true }, []],
    ['less than a balance shows', { volume_L: 0.05 }, ['addition-negligible']],
    ['gas for a barrel', { volume_L: 150, additive: { id: 'sulfur-dioxide-gas' } }, ['gas-too-little']], // 4.0 g
    ['gas for a tank', { volume_L: 190, additive: { id: 'sulfur-dioxide-gas' } }, []], // 5.1 g
    [
      'gas in several barrels',
      { volume_L: 600, vessels: 4, additive: { id: 'sulfur-dioxide-gas' } },
      ['gas-too-little'],
    ],
  ] as const)('%s', (_what, request, codes) => {
    const small = codesOf(doseOf(request)).filter((code) => /negligible|too-little/.test(code));
    expect(small).toEqual(codes);
  });
  test('a rest of tablets below 0.5 mg/L is no stock', () => {
    const additive = { id: 'tablet', tablet_SO2_g: 5 } as const;
    const add = (add_mg_L: number) =>
      doseOf({ ...STATED, stage: 'finished', target: { add_mg_L }, volume_L: 225, additive });
    expect(add(22.6).stock).toBeUndefined(); // one tablet gives 22.22
    expect(add(22.8).stock).toBeDefined();
    expect(add(22.6).measure).toEqual({ value: 1, unit: 'tablets' });
  });
});

test('the amount for a red that passes the limit is told, with the limit', () => {
  expect(valuesOf(doseOf({ total_mg_L: 140 }), 'style-unknown')).toMatchObject({
    over_limit: 'yes',
    limit_mg_L: 150,
    measure_value: 142,
  });
});
