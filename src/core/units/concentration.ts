import { assertBetween } from '../bounds.ts';
import { GRAMS_IN } from './mass.ts';
import { LITRES_IN } from './volume.ts';

/** Concentration units by their canonical ids; `ppm` is mg/L, as the trade uses it in wine. */
export const CONCENTRATION_UNITS = [
  'mg/L',
  'ppm',
  'g/L',
  'g/hL',
  'lb/galUS',
  'lb/galUK',
  'oz/galUS',
] as const;
/** The canonical id of a concentration unit. */
export type ConcentrationUnitId = (typeof CONCENTRATION_UNITS)[number];

/**
 * mg/L in one of each concentration unit, from masses and volumes. A test holds them against mathjs and js-quantities.
 * Source: `GRAMS_IN`, `LITRES_IN`.
 *
 * @example
 * ```ts
 * MG_L_IN['g/hL'] // => 10
 * MG_L_IN.ppm // => 1
 * ```
 */
export const MG_L_IN: Readonly<Record<ConcentrationUnitId, number>> = {
  'mg/L': 1,
  ppm: 1,
  'g/L': 1000,
  'g/hL': 1000 / LITRES_IN.hL,
  'lb/galUS': (GRAMS_IN.lb * 1000) / LITRES_IN.galUS,
  'lb/galUK': (GRAMS_IN.lb * 1000) / LITRES_IN.galUK,
  'oz/galUS': (GRAMS_IN.oz * 1000) / LITRES_IN.galUS,
};

/**
 * A concentration in mg/L.
 *
 * @param value in `unit`, finite and not negative
 * @returns mg/L
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * mg_LFrom(3, 'g/hL') // => 30
 * mg_LFrom(0.001, 'lb/galUS') // => 119.826
 * ```
 */
export function mg_LFrom(value: number, unit: ConcentrationUnitId): number {
  assertBetween('convert a concentration', `value in ${unit}`, value, 0);
  return value * MG_L_IN[unit];
}

/**
 * mg/L in another unit.
 *
 * @param concentration_mg_L in mg/L, finite and not negative
 * @returns in `unit`
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * mg_LTo(30, 'g/hL') // => 3
 * ```
 */
export function mg_LTo(concentration_mg_L: number, unit: ConcentrationUnitId): number {
  assertBetween('convert a concentration', 'concentration_mg_L', concentration_mg_L, 0);
  return concentration_mg_L / MG_L_IN[unit];
}
