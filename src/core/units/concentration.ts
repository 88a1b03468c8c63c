import { assertBetween } from '../bounds.ts';
import { factorOf } from './define.ts';

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
export type ConcentrationUnitId = (typeof CONCENTRATION_UNITS)[number];

/**
 * mg/L in one of each concentration unit. Source: mathjs's own definitions; the gallons by law (`define`).
 *
 * @example
 * ```ts
 * MG_L_IN['g/hL'] // => 10
 * MG_L_IN.ppm // => 1
 * ```
 */
export const MG_L_IN = Object.fromEntries(
  CONCENTRATION_UNITS.map((unit) => [unit, Number(factorOf(unit, 'mg/L').toPrecision(14))]),
) as Readonly<Record<ConcentrationUnitId, number>>;

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
