import { describe, expect, test } from 'vitest';
import { dose } from '../../../src/core/dose/dose.ts';
import { ASSUMED, codesOf, doseOf, valuesOf } from './ask.ts';

const RED = { style: 'red', target: { molecular_mg_L: 0.6 } } as const;

describe('a high need that nobody stated is a choice', () => {
  test('at pH 4.1 with 45 mg/L free: leave it, go to 60, or the full target', () => {
    const answer = doseOf({ ...RED, ph: 4.1, free_mg_L: 45 });
    expect(valuesOf(answer, 'free-needed-high')?.['target_free_mg_L']).toBeCloseTo(117.59, 2);
    expect(answer.choices?.map(({ target, add_mg_L }) => [target, Math.round(add_mg_L)])).toEqual([
      [undefined, 0],
      [{ free_mg_L: 60 }, 15],
      [{ molecular_mg_L: 0.6 }, 73],
    ]);
    expect(answer.choices?.map(({ molecular_mg_L }) => Number(molecular_mg_L.toFixed(2)))).toEqual([
      0.23, 0.31, 0.6,
    ]);
    expect(answer.choices?.map(({ measure }) => measure?.value)).toEqual([undefined, 143, 691]);
    expect(answer.measure).toEqual({ value: 691, unit: 'g' }); // the full figures are kept
  });

  // free = 0.6 × (10^x + 1), so x = log10(free ÷ 0.6 − 1)
  const needing = (free_mg_L: number) => doseOf({ ...RED, ph: 1.81 + Math.log10(free_mg_L / 0.6 - 1) });

  test.each([
    [60, undefined],
    [60.4, undefined], // told as 60
    [60.6, 2], // 60 and 61 are one way out
    [64.9, 2],
    [65.1, 3],
  ])('a need of %d mg/L is told in whole mg/L, and ways out are 5 apart', (free_mg_L, ways) => {
    expect(needing(free_mg_L).choices?.length).toBe(ways);
    expect(codesOf(needing(free_mg_L)).includes('free-needed-high')).toBe(ways !== undefined);
  });

  test('60 falls away where the wine is all but there', () => {
    expect(doseOf({ ...RED, ph: 4.1, free_mg_L: 56 }).choices).toHaveLength(2);
    expect(doseOf({ ...RED, ph: 4.1, free_mg_L: 55 }).choices).toHaveLength(3);
  });

  test('with 60 mg/L free already the middle way falls away', () => {
    expect(doseOf({ ...RED, ph: 4.1, free_mg_L: 60 }).choices?.map(({ target }) => target)).toEqual([
      undefined,
      { molecular_mg_L: 0.6 },
    ]);
  });

  test.each([
    ['a stated target', { ph: 4.1, targetStated: true }],
    ['a wine that has enough', { ph: 4.1, free_mg_L: 120 }],
  ])('%s is none', (_what, request) => {
    const answer = doseOf({ ...RED, ...request });
    expect(answer.choices).toBeUndefined();
    expect(codesOf(answer)).not.toContain('free-needed-high');
  });

  test('without free SO2 the need is said, without a choice', () => {
    const answer = dose({ ...ASSUMED, ...RED, ph: 4.1 });
    expect(answer.choices).toBeUndefined();
    expect(codesOf(answer)).toContain('free-needed-high');
  });

  test('an option that passes the limit on file carries no amount', () => {
    const answer = doseOf({ ...RED, ph: 4.1, free_mg_L: 45, total_mg_L: 120 });
    const [leave, to60, full] = answer.choices ?? [];
    expect(leave).not.toHaveProperty('over_limit');
    expect(to60?.measure).toBeDefined(); // 135 mg/L total
    expect(full).toMatchObject({ over_limit: true }); // 193 mg/L
    for (const key of ['mass_g', 'SO2_g', 'measure', 'stock']) expect(full).not.toHaveProperty(key);
    expect(codesOf(answer)).toContain('total-over-limit');
  });

  test.each([
    ['nothing is allowed for', {}, 20],
    ['a third is', { binding_share: 1 / 3 }, 13.3],
    ['a bottling is planned', { reserve_mg_L: 10 }, 10],
  ])('before it stands the most that keeps 15 mg/L below the limit, where %s', (_what, facts, add_mg_L) => {
    const { choices = [] } = doseOf({ ...RED, ph: 4.1, free_mg_L: 20, total_mg_L: 115, ...facts });
    expect(choices.map(({ over_limit }) => over_limit ?? false)).toEqual([false, false, true, true]);
    expect(choices[1]?.target).toEqual({ add_mg_L });
    expect(choices[1]?.dose_mg_L).toBeLessThanOrEqual(20);
  });

  test.each([
    ['hardly any room', { total_mg_L: 131 }],
    ['an unknown total', { total_mg_L: undefined, target: { molecular_mg_L: 0.8 }, ph: 4.15 }],
  ])('%s gives no such way', (_what, { total_mg_L, ...facts }) => {
    const known = total_mg_L === undefined ? {} : { total_mg_L };
    const { choices = [] } = doseOf({ ...RED, ph: 4.1, free_mg_L: 45, ...facts, ...known });
    expect(choices.filter(({ target }) => target !== undefined && 'add_mg_L' in target)).toEqual([]);
  });

  test('an option whose free SO2 alone passes the limit carries none either, with the total unknown', () => {
    const answer = doseOf({ ...RED, target: { molecular_mg_L: 0.8 }, ph: 4.15, free_mg_L: 45 });
    expect(answer.choices?.at(-1)).toMatchObject({ over_limit: true });
  });
});
