import { describe, expect, test } from 'vitest';
import { afterMust } from '../../../src/core/dose/after-must.ts';
import { mustOf } from '../../../src/core/dose/fruit.ts';
import { MUST_RANGES, mustFigures, mustRangesFor } from '../../../src/core/dose/must-ranges.ts';
import { SOURCES } from '../../../src/core/sources.ts';
import { doseOf } from './ask.ts';
import { loose, wrongIn } from './evaluate-step.ts';

const MUST = { stage: 'must', stageStated: true, targetStated: true } as const;

describe('what was published for grapes at the crusher', () => {
  // Réussir Vigne, a question on sulphiting (consultants' answers): 4 g/hL for sound, 5 to 6 for damaged grapes (read).
  // Handbook of Enology vol. 1, ch. 8: red 5 at high acidity, 5 to 8 at low, 8 to 10 with rot (from memory).
  test.each([
    ['sound', 'reussir-vigne', [4, 4]],
    ['damaged', 'reussir-vigne', [5, 6]],
    ['sound', 'handbook-enology-8', [5, 8]],
    ['rot', 'handbook-enology-8', [8, 10]],
  ] as const)('%s, %s: %j g/hL', (state, source, [low, high]) => {
    const row = MUST_RANGES.find((range) => range.state === state && range.source === source);
    expect([row?.low_mg_L, row?.high_mg_L]).toEqual([low * 10, high * 10]);
  });

  test('a row from memory says so', () => {
    expect(SOURCES['handbook-enology-8'].read).toBe(false);
    expect(SOURCES['reussir-vigne'].read).toBe(true);
  });

  test('what was published for red is not offered for white', () => {
    expect(mustFigures('sound', 'white')).toEqual([40]);
    expect(mustFigures('sound', 'red')).toEqual([40, 50, 80]);
    expect(mustRangesFor('rot', 'white')).toEqual([]);
  });
});

describe('after an addition to must', () => {
  // A German trade text of 2012: 50 mg/L in the must are + 16 mg/L total in the wine.
  test('a third is there again as total SO2', () => {
    expect(Math.floor(afterMust(50).total_back_mg_L)).toBe(16);
  });

  test.each([
    [50, false],
    [51, true],
  ])('%d mg/L: malolactic may be hindered %s', (add_mg_L, isWarned) => {
    // AWRI, Ask the AWRI: MLF: up to 50 mg/L in all before crushing does no harm.
    const { warnings } = doseOf({ ...MUST, volume_L: 2000, target: { add_mg_L } });
    expect(warnings.some(({ code }) => code === 'must-may-hinder-malolactic')).toBe(isWarned);
  });

  test('of wine nothing of that is said', () => {
    expect(doseOf({ target: { add_mg_L: 80 }, targetStated: true })).not.toHaveProperty('after_must');
  });

  test.each([-1, Number.NaN, 10_001])('%d mg/L is no addition', (dose_mg_L) => {
    expect(() => afterMust(dose_mg_L)).toThrow(RangeError);
  });
});

describe('must of fruit by weight', () => {
  // 2000 kg at 65 L/100 kg; 5 short tons at 160 US gal: 800 gal (NIST Handbook 44, from memory). Plain arithmetic.
  test.each([
    [2000, 65, 1300],
    [5 * 907.18474, (160 * 3.785411784) / 9.0718474, 800 * 3.785411784],
  ])('%d kg at %d L/100 kg: %d L', (fruit_kg, yield_L_per_100_kg, volume_L) => {
    const fruit = { fruit_kg, yield_L_per_100_kg };
    expect(mustOf(fruit)).toBeCloseTo(volume_L, 6);
    const answer = doseOf({ ...MUST, fruit, volume_L: mustOf(fruit), target: { add_mg_L: 40 } });
    expect(answer.SO2_g).toBeCloseTo((40 * volume_L) / 1000, 6);
    const from = answer.steps.findIndex(({ name }) => name === 'must-of-fruit');
    expect(from).toBeGreaterThanOrEqual(0);
    expect(answer.steps.map(wrongIn).filter(Boolean)).toEqual([]);
    expect(loose(answer.steps.slice(from))).toEqual([]);
  });

  test.each([
    { fruit_kg: 0, yield_L_per_100_kg: 65 },
    { fruit_kg: 100, yield_L_per_100_kg: 19 },
    { fruit_kg: 100, yield_L_per_100_kg: 101 },
    { fruit_kg: Number.NaN, yield_L_per_100_kg: 65 },
  ])('%j is refused', (fruit) => {
    expect(() => mustOf(fruit)).toThrow(RangeError);
  });
});
