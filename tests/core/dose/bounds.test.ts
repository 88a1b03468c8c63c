import { describe, expect, test } from 'vitest';
import { BOUNDS, isWithinBounds, type BoundedField } from '../../../src/core/bounds.ts';
import { freeExpected } from '../../../src/core/binding/free-expected.ts';
import { bindingCovered, doseFor } from '../../../src/core/binding/allowance.ts';
import { freeSO2Needed } from '../../../src/core/chemistry/free-so2-needed.ts';
import { ionicTerm } from '../../../src/core/chemistry/ionic-term.ts';
import { molecularSO2 } from '../../../src/core/chemistry/molecular-so2.ts';
import { added } from '../../../src/core/dose/added.ts';
import { dose } from '../../../src/core/dose/dose.ts';
import { solution } from '../../../src/core/dose/solution.ts';
import { ASSUMED, effectOf, POWDER } from './ask.ts';

const NO_NUMBERS = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
const outside = (field: BoundedField): number[] => {
  const { min, max, ...more } = BOUNDS[field];
  return [...NO_NUMBERS, min - 0.001, max * 1.001, ...('aboveMin' in more ? [min] : [])];
};
const NAMES = Object.keys(BOUNDS) as BoundedField[];

// What no cellar has: own thresholds, except for the pH in which a dose means anything.
test.each([
  ['volume_L', 0, 10_000_000],
  ['mass_g', 0, 100_000_000],
  ['free_mg_L', 0, 1000],
  ['ph', 2.5, 4.8],
  ['binding_share', 0, 0.8],
  ['vessels', 1, 10_000],
] as const)('%s lies from %d to %d', (field, min, max) => {
  expect(BOUNDS[field]).toMatchObject({ min, max });
});

test.each(NAMES)('%s keeps to its bounds', (field) => {
  for (const value of outside(field)) expect(isWithinBounds(field, value)).toBe(false);
  expect(isWithinBounds(field, BOUNDS[field].max)).toBe(true);
});

describe('dose() refuses, naming the value', () => {
  const FACTS = [
    'volume_L',
    'ph',
    'free_mg_L',
    'total_mg_L',
    'temperature_C',
    'alcohol_percent',
    'sugar_g_L',
    'binding_allowance_percent',
    'binding_share',
    'vessels',
  ] as const;
  test.each(FACTS)('%s', (field) => {
    for (const value of outside(field)) {
      expect(() => dose({ ...ASSUMED, [field]: value })).toThrow(RangeError);
      expect(() => dose({ ...ASSUMED, [field]: value })).toThrow(String(value));
    }
  });
  test.each([
    ['free_mg_L', 'target_free_mg_L'],
    ['molecular_mg_L', 'target_molecular_mg_L'],
    ['add_mg_L', 'target_add_mg_L'],
  ] as const)('a target of %s', (key, field) => {
    for (const value of outside(field)) {
      const target = { [key]: value } as { free_mg_L: number };
      expect(() => dose({ ...ASSUMED, target })).toThrow(RangeError);
    }
  });
  test('half a vessel', () => {
    expect(() => dose({ ...ASSUMED, vessels: 2.5 })).toThrow(RangeError);
  });
});

describe('effect(), added() and solution() refuse', () => {
  test.each(['mass_g', 'additive_volume_mL', 'tablets', 'rate_mg_L', 'added_mg_L'] as const)(
    '%s',
    (field) => {
      for (const value of outside(field)) {
        expect(() => effectOf({ [field]: value, volume_L: 100 })).toThrow(RangeError);
        expect(() => added({ [field]: value, additive: POWDER })).toThrow(RangeError);
      }
    },
  );
  test('a volume or a mass that cannot be', () => {
    for (const volume_L of outside('volume_L')) {
      expect(() => solution({ volume_L, additive: POWDER, mass_g: 10 })).toThrow(RangeError);
    }
    for (const mass_g of outside('mass_g')) {
      expect(() => solution({ volume_L: 1, additive: POWDER, mass_g })).toThrow(RangeError);
    }
  });
});

test.each([...NO_NUMBERS, -1])('functions of plain numbers refuse %d', (value) => {
  expect(() => molecularSO2(value, 3.5, 1.81)).toThrow(RangeError);
  expect(() => molecularSO2(20, value, 1.81)).toThrow(RangeError);
  expect(() => molecularSO2(20, 3.5, value)).toThrow(RangeError);
  expect(() => freeSO2Needed(value, 3.5, 1.81)).toThrow(RangeError);
  expect(() => freeExpected(value, 10)).toThrow(RangeError);
  expect(() => freeExpected(10, value)).toThrow(RangeError);
  expect(() => doseFor(value, {})).toThrow(RangeError);
  expect(() => bindingCovered(value)).toThrow(RangeError);
  expect(() => ionicTerm(value, 1)).toThrow(RangeError);
  expect(() => ionicTerm(1, value)).toThrow(RangeError);
  expect(() => ionicTerm(1, 1, value)).toThrow(RangeError);
});
