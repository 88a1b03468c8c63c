import { expect, test } from 'vitest';
import { numberText, shareText } from '../../../src/chat/replies/number-text.ts';
import {
  concentrationText,
  massText,
  measureText,
  molecularText,
} from '../../../src/chat/replies/quantity-text.ts';
import { volumeText } from '../../../src/chat/replies/volume-text.ts';

/** Thin spaces made visible. */
const shown = (text: string): string => text.replaceAll('\u202f', '_');

test.each([
  [5488.85, 0, '.', '5_489'],
  [1234567.891, 2, ',', '1_234_567,89'],
  [0.1 + 0.2, 10, '.', '0.3'],
  [999.96, 1, '.', '1_000'],
  [0, 2, '.', '0'],
  [-0.001, 2, '.', '0'],
  [-4.6, 1, '.', '-4.6'],
  [3.58, 2, ',', '3,58'],
  [1e-7, 2, '.', '0'],
  [123, 0, '.', '123'],
] as const)('numberText() writes %f to %i places with %s as %s', (value, decimals, mark, text) => {
  expect(shown(numberText(value, decimals, mark))).toBe(text);
});

test.each([Number.NaN, Infinity, -Infinity])(
  'numberText() refuses %f, so that it reaches nobody',
  (value) => {
    expect(() => numberText(value, 2, '.')).toThrow(RangeError);
  },
);

test.each([
  [1 / 2, '1/2'],
  [0.3333333333333333, '1/3'],
  [0.35, '0.35'],
  [0.8, '0.8'],
])('shareText() writes %f as %s', (share, text) => {
  expect(shareText(share, '.')).toBe(text);
});

test.each([
  [47.94, '48'],
  [9.96, '10'],
  [9.94, '9.9'],
  [3.26, '3.3'],
  [0, '0'],
])('concentrationText() writes %f mg/L as %s', (mg_L, text) => {
  expect(concentrationText(mg_L, '.')).toBe(text);
});

test('molecularText() keeps two places', () => {
  expect([0.3512, 0.8, 2.004].map((mg_L) => molecularText(mg_L, '.'))).toEqual(['0.35', '0.8', '2']);
});

test.each([
  [{ value: 256, unit: 'g' }, '256 g'],
  [{ value: 3.17, unit: 'kg' }, '3.17 kg'],
  [{ value: 0.47, unit: 'g' }, '0.47 g'],
  [{ value: 1.45, unit: 'L' }, '1.45 L'],
  [{ value: 3, unit: 'tablets' }, '3'],
  [{ value: 2.5, unit: 'tablets' }, '2½'],
  [{ value: 0.5, unit: 'tablets' }, '½'],
] as const)('measureText() writes what an instrument shows: %o is %s', (measure, text) => {
  expect(measureText(measure, '.')).toBe(text);
});

test.each([
  [0.047, '0.05 g'],
  [4.66, '4.7 g'],
  [9.97, '10 g'],
  [453.59, '454 g'],
  [999.4, '999 g'],
  [999.7, '1 kg'],
  [1234, '1.23 kg'],
])('massText() writes %f g as %s', (mass_g, text) => {
  expect(massText(mass_g, '.')).toBe(text);
});

// Gallons by legal definition: 3.785411784 L (US), 4.54609 L (imperial); from memory.
test.each([
  [1450 * 3.785411784, 'galUS', '1_450 gal (5_489 L)'],
  [280 * 4.54609, 'galUK', '280 imp gal (1_273 L)'],
  [6 * 3.785411784, 'galUS', '6 gal (22.7 L)'],
  [2000, 'hL', '20 hL'],
  [2000, 'L', '2_000 L'],
  [3000, 'm3', '3 m³'],
  [0.1, 'mL', '100 mL'],
  [1350, 'barrel', '1_350 L'],
] as const)('volumeText() writes %f L for one who writes %s as %s', (volume_L, unit, text) => {
  expect(shown(volumeText(volume_L, unit, '.'))).toBe(text);
});
