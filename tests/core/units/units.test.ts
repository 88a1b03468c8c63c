import Qty from 'js-quantities';
import { describe, expect, test } from 'vitest';
import { CONCENTRATION_UNITS, MG_L_IN, mg_LFrom, mg_LTo } from '../../../src/core/units/concentration.ts';
import { loadMathjs } from '../../../src/core/units/define.ts';
import { GRAMS_IN, MASS_UNITS, gramsFrom, gramsTo } from '../../../src/core/units/mass.ts';
import { celsiusFrom, celsiusTo } from '../../../src/core/units/temperature.ts';
import { LITRES_IN, VOLUME_UNITS, litresFrom, litresTo } from '../../../src/core/units/volume.ts';
import { PRINTED_CONVERSIONS, UNIT_DEFINITIONS } from '../../tables/units.ts';

const math = await loadMathjs();
const byMathjs = (from: string, to: string): number => math.unit(1, from).toNumber(to);

const THEIRS: Readonly<Record<string, string>> = {
  galUS: 'gal',
  galUK: 'gallon-imp',
  L: 'liter',
  hL: 'hl',
  mL: 'ml',
  cL: 'cl',
  dL: 'dl',
  'lb/galUS': 'lb/gal',
  'lb/galUK': 'lb/gallon-imp',
  'oz/galUS': 'oz/gal',
  'mg/L': 'mg/l',
  'g/L': 'g/l',
  'g/hL': 'g/hl',
};
const theirs = (unit: string, to: string): number => Qty(1, THEIRS[unit] ?? unit).to(to).scalar;

describe('units as js-quantities has them (it rounds its gallon and ounce to eight digits)', () => {
  test.each(VOLUME_UNITS)('a %s in litres', (unit) => {
    expect(Math.abs(LITRES_IN[unit] / theirs(unit, 'l') - 1)).toBeLessThan(1e-8);
  });
  test.each(MASS_UNITS)('a %s in grams', (unit) => {
    expect(Math.abs(GRAMS_IN[unit] / theirs(unit, 'g') - 1)).toBeLessThan(1e-8);
  });
  test.each(['mg/L', 'g/L', 'g/hL', 'lb/galUS', 'lb/galUK', 'oz/galUS'] as const)('a %s in mg/L', (unit) => {
    expect(Math.abs(MG_L_IN[unit] / theirs(unit, 'mg/l') - 1)).toBeLessThan(1e-8);
  });
  test.each([-5, 0, 32, 57, 98.6])('%d °F in °C', (fahrenheit) => {
    expect(celsiusFrom(fahrenheit, 'F')).toBeCloseTo(Qty(`${fahrenheit} tempF`).to('tempC').scalar, 9);
  });
});

describe('units as mathjs has them', () => {
  test.each(VOLUME_UNITS)('a %s in litres', (unit) => {
    expect(LITRES_IN[unit]).toBeCloseTo(byMathjs(unit, 'L'), 12);
  });
  test.each(MASS_UNITS)('a %s in grams', (unit) => {
    expect(Math.abs(GRAMS_IN[unit] / byMathjs(unit, 'g') - 1)).toBeLessThan(1e-14);
  });
  test.each(CONCENTRATION_UNITS)('a %s in mg/L', (unit) => {
    expect(Math.abs(MG_L_IN[unit] / byMathjs(unit, 'mg/L') - 1)).toBeLessThan(1e-14);
  });
});

describe('units by their definitions', () => {
  test.each(UNIT_DEFINITIONS)('$from: $source', ({ from, factor }) => {
    const ours = { ...LITRES_IN, ...GRAMS_IN } as Readonly<Record<string, number>>;
    expect(ours[from]).toBe(factor);
  });
  test.each(PRINTED_CONVERSIONS)('$value $from is $mg_L mg/L: $source', ({ value, from, mg_L, half }) => {
    expect(Math.abs(mg_LFrom(value, from) - mg_L)).toBeLessThanOrEqual(half);
  });
  test('ppm is mg/L, as the trade uses it in wine (common practice, no source)', () => {
    expect(MG_L_IN.ppm).toBe(1);
    expect(math.evaluate('25 ppm').toNumber('mg/L')).toBeCloseTo(25, 12);
  });
});

describe('there and back', () => {
  test.each(VOLUME_UNITS)('a volume in %s', (unit) => {
    expect(litresTo(litresFrom(12.5, unit), unit)).toBeCloseTo(12.5, 10);
  });
  test.each(MASS_UNITS)('a mass in %s', (unit) => {
    expect(gramsTo(gramsFrom(12.5, unit), unit)).toBeCloseTo(12.5, 10);
  });
  test('a concentration in g/hL and a temperature in °F', () => {
    expect(mg_LTo(mg_LFrom(3, 'g/hL'), 'g/hL')).toBe(3);
    expect(celsiusTo(celsiusFrom(57, 'F'), 'F')).toBeCloseTo(57, 12);
  });
});

describe('what is no amount is refused', () => {
  test.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY, -1])('%d', (value) => {
    expect(() => litresFrom(value, 'L')).toThrow(RangeError);
    expect(() => litresTo(value, 'L')).toThrow(RangeError);
    expect(() => gramsFrom(value, 'g')).toThrow(RangeError);
    expect(() => gramsTo(value, 'g')).toThrow(RangeError);
    expect(() => mg_LFrom(value, 'ppm')).toThrow(RangeError);
    expect(() => mg_LTo(value, 'ppm')).toThrow(RangeError);
  });
  test.each([Number.NaN, Number.POSITIVE_INFINITY, -300])('%d °C', (value) => {
    expect(() => celsiusFrom(value, 'C')).toThrow(RangeError);
    expect(() => celsiusTo(value, 'F')).toThrow(RangeError);
  });
});
