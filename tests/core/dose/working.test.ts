import { describe, expect, test } from 'vitest';
import { SOURCES } from '../../../src/core/sources.ts';
import { STEP_KINDS, STEP_NAMES } from '../../../src/core/step-names.ts';
import { added } from '../../../src/core/dose/added.ts';
import { solution } from '../../../src/core/dose/solution.ts';
import { doseOf, effectOf, POWDER } from './ask.ts';
import { loose, wrongIn } from './evaluate-step.ts';

const US = { volume_L: 5488.8470868, volume_display: { value: 1450, unit: 'galUS' } } as const;

describe('a working as it is printed', () => {
  test('of 1450 US gallons at pH 3.58 with 21 mg/L free', () => {
    const { steps } = doseOf(US);
    expect(steps.map(({ symbol, name, substituted, result }) => [symbol, name, substituted, result])).toEqual(
      [
        ['M', 'molecular-now', '21 mg/L / (10^(3.58 - 1.81) + 1)', { value: 0.351, unit: 'mg/L' }],
        ['F', 'free-needed', '0.8 mg/L * (10^(3.58 - 1.81) + 1)', { value: 47.91, unit: 'mg/L' }],
        ['A', 'addition', '47.91 mg/L - 21 mg/L', { value: 26.91, unit: 'mg/L' }],
        ['V', 'volume-in-litres', '1450 galUS * 3.78541 L/galUS', { value: 5488.8, unit: 'L' }],
        ['S', 'so2-mass', '26.91 mg/L * 5488.8 L / (1000 mg/g)', { value: 147.7, unit: 'g' }],
        ['m', 'additive-mass', '147.7 g / 0.57629', { value: 256.3, unit: 'g' }],
      ],
    );
  });

  test.each([
    ['an allowance', { binding_allowance_percent: 30 }, '26.91 mg/L * (1 + 30 / 100)'],
    ['a third that binds', { binding_share: 1 / 3 }, '26.91 mg/L / (1 - 1 / 3)'],
    ['a share that binds', { binding_share: 0.35 }, '26.91 mg/L / (1 - 0.35)'],
    ['several vessels', { vessels: 2 }, '26.91 mg/L * (5488.8 L / 2) / (1000 mg/g)'],
    [
      'an assay',
      { additive: { id: 'potassium-metabisulfite', strength_percent: 96 } },
      '147.7 g / (0.96 * 0.57629)',
    ],
    ['a yield', { additive: { id: 'potassium-metabisulfite', strength_percent: 57 } }, '147.7 g / 0.57'],
    [
      'a stock of salt',
      { additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 } },
      '147.7 g / (10 g / (100 mL) * 0.57629)',
    ],
    [
      'SO2 in water',
      { additive: { id: 'sulfur-dioxide-solution', strength_percent: 6 } },
      '147.7 g / (6 g / (100 mL))',
    ],
    ['tablets', { additive: { id: 'tablet', tablet_SO2_g: 5 } }, '147.7 g / (5 g)'],
    [
      'small tablets',
      { additive: { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 } },
      '147.69 g / (0.44 g * 0.57629)',
    ],
  ] as const)('with %s', (_what, request, substituted) => {
    const { steps } = doseOf({ ...US, ...request });
    expect(steps.map((step) => step.substituted)).toContain(substituted);
    expect(steps.map(wrongIn).filter(Boolean)).toEqual([]);
    expect(loose(steps)).toEqual([]);
  });

  test('a volume that the person wrote otherwise than it is shown stands in litres', () => {
    const { steps } = doseOf({ volume_L: 5488.8470868, volume_display: { value: 1451, unit: 'galUS' } });
    expect(steps.map((step) => step.substituted)).toContain('26.91 mg/L * 5488.85 L / (1000 mg/g)');
  });

  test('a figure at a rounding mark does not run into fifteen digits', () => {
    const { steps } = doseOf({ target: { add_mg_L: 7.5 }, targetStated: true, binding_share: 1 / 3 });
    expect(steps.map(({ result }) => result.value)).toEqual([0.351, 11.25, 61.75, 107.2]);
  });

  test('the OIV basis shows how its pK was found', () => {
    const { steps } = doseOf({ ...US, basis: 'oiv', alcohol_percent: 13.5, temperature_C: 22 });
    expect(steps[0]).toMatchObject({ name: 'dissociation', symbol: 'pK', source: 'oiv-as323-04c-table-2' });
    expect(steps.map(wrongIn).filter(Boolean)).toEqual([]);
    expect(loose(steps)).toEqual([]);
  });
});

describe('every way of asking has a working that holds', () => {
  test.each([
    ['an effect', effectOf({ mass_g: 100, volume_L: 2000, ph: 3.4, free_mg_L: 15 })],
    [
      'an effect by mL',
      effectOf({
        additive_volume_mL: 350,
        volume_L: 225,
        additive: { id: 'sulfur-dioxide-solution', strength_percent: 6 },
      }),
    ],
    [
      'an effect of tablets',
      effectOf({
        tablets: 3,
        volume_L: 15,
        additive: { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 },
      }),
    ],
    ['a rate', effectOf({ rate_mg_L: 100, volume_L: 500, ph: 3.4, free_mg_L: 15 })],
    ['a rate without a volume', effectOf({ rate_mg_L: 100 })],
    ['an addition made', added({ mass_g: 82, volume_L: 2000, additive: POWDER })],
    ['an addition by mg/L', added({ added_mg_L: 26, volume_L: 1000, additive: POWDER })],
    [
      'effervescent tablets',
      added({ mass_g: 10, volume_L: 225, additive: { id: 'tablet', tablet_SO2_g: 5 } }),
    ],
    ['gas', added({ mass_g: 10, volume_L: 225, additive: { id: 'sulfur-dioxide-gas' } })],
    [
      'a stock',
      solution({ volume_L: 5, additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 } }),
    ],
    ['a stock by mass', solution({ volume_L: 0.1, mass_g: 10, additive: POWDER })],
    [
      'a stock by mass in mL',
      solution({ volume_L: 0.25, volume_display: { value: 250, unit: 'mL' }, mass_g: 10, additive: POWDER }),
    ],
    ['hectolitres', doseOf({ volume_L: 1234.5, volume_display: { value: 12.345, unit: 'hL' } })],
    [
      'imperial gallons',
      effectOf({ mass_g: 100, volume_L: 454.609, volume_display: { value: 100, unit: 'galUK' } }),
    ],
  ])('%s', (_what, { steps }) => {
    expect(steps.length).toBeGreaterThan(0);
    expect(steps.map(wrongIn).filter(Boolean)).toEqual([]);
    expect(loose(steps)).toEqual([]);
  });
});

describe('a pocket calculator gets there', () => {
  test.each([
    ['gallons', doseOf(US)],
    ['hectolitres', doseOf({ volume_L: 1200, volume_display: { value: 12, unit: 'hL' } })],
    ['barrels', doseOf({ volume_L: 1350, vessels: 6 })],
    ['an effect', effectOf({ mass_g: 100, volume_L: 2000, volume_display: { value: 20, unit: 'hL' } })],
    ['a rate', effectOf({ rate_mg_L: 100, volume_L: 500, volume_display: { value: 5, unit: 'hL' } })],
    ['an addition', added({ added_mg_L: 26, volume_L: 1000, additive: POWDER })],
    ['a solution', doseOf({ additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 } })],
    [
      'a stock',
      solution({ volume_L: 5, additive: { id: 'potassium-metabisulfite-solution', strength_percent: 10 } }),
    ],
    ['a stock by mass', solution({ volume_L: 5, mass_g: 500, additive: POWDER })],
  ])('with the bare figures of %s', (_what, { steps }) => {
    for (const { substituted, result } of steps) {
      const bare = substituted.replaceAll(/(\d) [a-zA-Z]\w*(\/[a-zA-Z]\w*)?/g, '$1');
      const step = { symbol: '', name: 'addition', formula: '', substituted: bare } as const;
      expect(wrongIn({ ...step, result: { value: result.value, unit: '' } })).toBeUndefined();
    }
  });

  test('and no line says what it says already', () => {
    const hundred = { volume_L: 0.1, volume_display: { value: 100, unit: 'mL' } } as const;
    const steps = [
      ...added({ mass_g: 10, volume_L: 225, additive: { id: 'tablet', tablet_SO2_g: 5 } }).steps,
      ...added({ mass_g: 10, additive: { id: 'sulfur-dioxide-gas' } }).steps,
      ...solution({ ...hundred, mass_g: 10, additive: POWDER }).steps,
    ];
    expect(steps.map(({ substituted }) => substituted)).toEqual([
      '10 g * 1000 mg/g / (225 L)',
      '10 g * 0.57629',
    ]);
  });
});

test('every line has a symbol, a formula in words, and a source that is on file', () => {
  expect(STEP_NAMES.length).toBeGreaterThan(20);
  for (const name of STEP_NAMES) {
    expect(name).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
    const kind = STEP_KINDS[name];
    expect(kind.formula.length).toBeGreaterThan(10);
    expect(SOURCES['source' in kind ? kind.source : 'arithmetic'].title.length).toBeGreaterThan(0);
  }
});
