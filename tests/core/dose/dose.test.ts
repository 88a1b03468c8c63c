import { describe, expect, test } from 'vitest';
import { dose } from '../../../src/core/dose/dose.ts';
import { ASSUMED, TANK, codesOf, doseOf, POWDER, valuesOf } from './ask.ts';

describe('an answer says as much as can be said', () => {
  test('with nothing but a pH it says the free SO2 that is needed', () => {
    const answer = dose({ ...ASSUMED, ph: 3.58 });
    expect(answer.target_free_mg_L).toBeCloseTo(47.907, 3);
    expect(answer.add_mg_L).toBeUndefined();
    expect(answer.molecular_mg_L).toBeUndefined();
    expect(answer.SO2_g).toBeUndefined();
  });

  test('with pH and free SO2 it says the rate to add, and no amount', () => {
    const answer = dose({ ...ASSUMED, ph: 3.58, free_mg_L: 21 });
    expect(answer.dose_mg_L).toBeCloseTo(26.907, 3);
    expect(answer).not.toHaveProperty('SO2_g');
    expect(answer).not.toHaveProperty('measure');
  });

  test.each([
    ['a volume', { volume_L: undefined }],
    ['an additive', { additive: undefined }],
    ['a strength', { additive: { id: 'sulfur-dioxide-solution' } }],
    ['a size of tablets', { additive: { id: 'tablet' } }],
  ] as const)('without %s it gives no amount', (_what, missing) => {
    const { volume_L: _volume, additive: _additive, ...rest } = TANK;
    const known = Object.fromEntries(
      Object.entries({ volume_L: TANK.volume_L, additive: POWDER, ...missing }).filter(
        ([, value]) => value !== undefined,
      ),
    );
    const answer = dose({ ...rest, ...known });
    expect(answer.dose_mg_L).toBeCloseTo(26.907, 3);
    for (const key of ['SO2_g', 'mass_g', 'additive_volume_mL', 'tablets', 'measure', 'stock'])
      expect(answer).not.toHaveProperty(key);
  });

  test('a target of free SO2 needs no pH, a stated rise needs neither', () => {
    const { ph: _ph, free_mg_L: _free, ...bare } = TANK;
    expect(dose({ ...bare, free_mg_L: 21, target: { free_mg_L: 36 }, targetStated: true }).add_mg_L).toBe(15);
    const rise = dose({ ...bare, target: { add_mg_L: 28 }, targetStated: true });
    expect(rise).toMatchObject({ add_mg_L: 28, dose_mg_L: 28 });
    expect(rise).not.toHaveProperty('free_after_mg_L');
    expect(rise).not.toHaveProperty('pK');
    expect(rise.mass_g).toBeCloseTo((28 * 5.4888470868) / 0.5762902, 4);
  });

  test('without a target it says the molecular SO2 now and gives no dose', () => {
    const { target: _target, ...rest } = TANK;
    const answer = dose({ ...rest, category: 'sparkling' });
    expect(answer.molecular_mg_L).toBeCloseTo(0.3507, 4);
    expect(answer).not.toHaveProperty('dose_mg_L');
    expect(answer.steps.map(({ name }) => name)).toEqual(['molecular-now']);
  });
});

describe('where the wine lands', () => {
  test('half to two thirds of the dose stay free, and below 10 mg/L perhaps none', () => {
    expect(doseOf({ free_mg_L: 21 }).free_expected_mg_L).toEqual([
      expect.closeTo(21 + 26.9075 / 2, 3),
      expect.closeTo(21 + (26.9075 * 2) / 3, 3),
    ]);
    const low = doseOf({ free_mg_L: 9.9 });
    expect(low.free_expected_mg_L?.[0]).toBe(9.9);
    expect(codesOf(low)).toContain('free-low-may-bind-all');
    expect(codesOf(doseOf({ free_mg_L: 10 }))).not.toContain('free-low-may-bind-all');
  });

  test('an allowance raises the dose and not the aim; the total takes the whole dose', () => {
    const answer = doseOf({ binding_allowance_percent: 30, total_mg_L: 60 });
    expect(answer.dose_mg_L).toBeCloseTo(26.9075 * 1.3, 3);
    expect(answer.free_after_mg_L).toBeCloseTo(47.9075, 3);
    expect(answer.molecular_after_mg_L).toBeCloseTo(0.8, 10);
    expect(answer.total_after_mg_L).toBeCloseTo(60 + 26.9075 * 1.3, 3);
    const covers = valuesOf(answer, 'allowance-covers-less')?.['covers_percent'];
    expect(covers).toBeCloseTo(23.08, 2); // 30 % more covers a binding of 23 %
    expect(codesOf(doseOf({ binding_allowance_percent: 0 }))).not.toContain('allowance-covers-less');
  });

  test('enough free SO2 needs nothing more', () => {
    const answer = doseOf({ free_mg_L: 50 });
    expect(answer).toMatchObject({ add_mg_L: 0, dose_mg_L: 0, free_after_mg_L: 50 });
    expect(answer).not.toHaveProperty('measure');
    expect(answer).not.toHaveProperty('SO2_g');
    expect(codesOf(answer)).toContain('no-addition-needed');
  });
});

describe('stages', () => {
  test.each(['must', 'fermenting', 'malolactic', 'base'] as const)(
    '%s has no dose that nobody stated',
    (stage) => {
      const answer = doseOf({ stage, stageStated: true });
      expect(answer).not.toHaveProperty('dose_mg_L');
      expect(answer).not.toHaveProperty('choices');
      expect(answer.molecular_mg_L).toBeCloseTo(0.3507, 4);
      expect(codesOf(answer)).toContain('no-dose-at-this-stage');
    },
  );

  test('malolactic names the published ceilings (AWRI, read)', () => {
    expect(valuesOf(doseOf({ stage: 'malolactic', stageStated: true }), 'no-dose-at-this-stage')).toEqual({
      stage: 'malolactic',
      free_ceiling_low_mg_L: 5,
      free_ceiling_high_mg_L: 10,
      total_ceiling_low_mg_L: 30,
      total_ceiling_high_mg_L: 40,
      published_ph_low: 3.3,
      published_ph_high: 3.5,
    });
  });

  test('a stated addition to must is worked out', () => {
    const answer = doseOf({ stage: 'must', stageStated: true, target: { add_mg_L: 50 }, targetStated: true });
    expect(answer.dose_mg_L).toBe(50);
    expect(answer.measure).toBeDefined();
  });

  test('an assumed stage is said, a stated one is not', () => {
    expect(codesOf(doseOf({}))).toContain('stage-assumed');
    expect(codesOf(doseOf({ stageStated: true }))).not.toContain('stage-assumed');
  });
});

describe('a colour that nobody named', () => {
  test('above pH 3.5 brings the amount for a red', () => {
    const red = valuesOf(doseOf({}), 'style-unknown');
    expect(red).toMatchObject({
      style: 'red',
      target_molecular_mg_L: 0.6,
      measure_value: 142,
      measure_unit: 'g',
    });
    expect(red?.['target_free_mg_L']).toBeCloseTo(35.93, 2);
  });
  test.each([
    ['at pH 3.5', { ph: 3.5 }],
    ['with a colour', { style: 'white' }],
    ['with a category', { category: 'sweet', target: { molecular_mg_L: 1.5 } }],
    ['with a product', { product: 'cider' }],
    ['with a stated target', { targetStated: true }],
  ] as const)('%s brings none', (_what, known) => {
    expect(codesOf(doseOf(known))).not.toContain('style-unknown');
  });
});

describe('bases', () => {
  test('the OIV table is used where alcohol and temperature are known and inside it', () => {
    const answer = doseOf({ basis: 'oiv', alcohol_percent: 10, temperature_C: 25 });
    expect(answer).toMatchObject({ basis: 'oiv', pK: 2.116 });
    expect(answer.target_free_mg_L).toBeCloseTo(0.8 * (10 ** (3.58 - 2.116) + 1), 10);
    expect(codesOf(answer)).not.toContain('basis-fallback');
  });
  test('else the default is, and by how much the need would change is said', () => {
    const answer = doseOf({ basis: 'oiv', alcohol_percent: 10, temperature_C: 14 });
    expect(answer).toMatchObject({ basis: 'pk-1.81', pK: 1.81 });
    const values = valuesOf(answer, 'basis-fallback');
    const at20C = 0.8 * (10 ** (3.58 - 1.916) + 1);
    expect(values).toMatchObject({ why: 'temperature-out-of-range', compared_at_temperature_C: 20 });
    expect(values?.['need_change_mg_L']).toBeCloseTo(at20C - 47.9075, 3);
  });
});

describe('warnings', () => {
  test.each([
    [{ ph: 2.79 }, 'ph-unusual', true],
    [{ ph: 2.8 }, 'ph-unusual', false],
    [{ ph: 4.2 }, 'ph-unusual', false],
    [{ ph: 4.21 }, 'ph-unusual', true],
    [{ target: { add_mg_L: 100 }, targetStated: true }, 'addition-large', false],
    [{ target: { add_mg_L: 100.1 }, targetStated: true }, 'addition-large', true],
    [{ target: { molecular_mg_L: 2.1 }, targetStated: true }, 'molecular-above-2', true],
    [{ target: { molecular_mg_L: 2 }, targetStated: true, ph: 3.2 }, 'molecular-above-2', false],
    [{ free_mg_L: 150 }, 'molecular-above-2', true], // it is smelt already
    [{ additive: { id: 'sulfur-dioxide-gas' } }, 'gas-needs-training', true],
    [{ total_mg_L: 60 }, 'total-unknown', false],
    [{}, 'total-unknown', true],
    [{ category: 'sparkling' }, 'no-limit-on-file', true],
    [{ style: 'red' }, 'no-limit-on-file', false],
    [{ style: 'red', total_mg_L: 108 }, 'total-near-limit', false], // 134.9
    [{ style: 'red', total_mg_L: 108.2 }, 'total-near-limit', true], // 135.1
    [{ style: 'red', total_mg_L: 123 }, 'total-near-limit', true], // 149.9
    [{ style: 'red', total_mg_L: 123.2 }, 'total-over-limit', true], // 150.1
    [{ style: 'red', target: { free_mg_L: 160 }, targetStated: true }, 'total-over-limit', true], // at least
    [{ volume_L: 1, additive: POWDER }, 'rounding-coarse', true],
    [{}, 'rounding-coarse', false],
  ] as const)('%j: %s is %s', (request, code, expected) => {
    expect(codesOf(doseOf(request)).includes(code)).toBe(expected);
  });

  test('stand in order, the weightiest first', () => {
    const answer = doseOf({
      additive: { id: 'sulfur-dioxide-gas' },
      ph: 4.3,
      free_mg_L: 5,
      total_mg_L: 60,
      target: { molecular_mg_L: 0.8 },
      targetStated: true,
    });
    expect(codesOf(answer)).toEqual([
      'gas-needs-training',
      'total-over-limit',
      'addition-large',
      'free-low-may-bind-all',
      'ph-unusual',
      'stage-assumed',
    ]);
  });
});

test('an allowance and a share at once are a wrong call', () => {
  expect(() => doseOf({ binding_allowance_percent: 30, binding_share: 0.5 })).toThrow(TypeError);
});
