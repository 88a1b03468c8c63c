import { assertBetween } from '../bounds.ts';

/** Mass units by their canonical ids, those of mathjs; `tonne` is 1000 kg (mathjs's `ton` is the short ton). */
export const MASS_UNITS = ['g', 'kg', 'mg', 'lb', 'oz', 'tonne'] as const;
/** The canonical id of a mass unit. */
export type MassUnitId = (typeof MASS_UNITS)[number];

/**
 * Grams in one of each mass unit (g), exact by definition. A test holds them against mathjs and js-quantities.
 * Source: the decimal prefixes; the international pound of 453.59237 g and its sixteenth.
 *
 * @example
 * ```ts
 * GRAMS_IN.lb // => 453.59237
 * GRAMS_IN.oz // => 28.349523125
 * ```
 */
export const GRAMS_IN: Readonly<Record<MassUnitId, number>> = {
  g: 1,
  kg: 1000,
  mg: 0.001,
  lb: 453.59237,
  oz: 453.59237 / 16,
  tonne: 1_000_000,
};

/**
 * A mass in grams.
 *
 * @param value in `unit`, finite and not negative
 * @returns g
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * gramsFrom(0.5, 'kg') // => 500
 * ```
 */
export function gramsFrom(value: number, unit: MassUnitId): number {
  assertBetween('convert a mass', `value in ${unit}`, value, 0);
  return value * GRAMS_IN[unit];
}

/**
 * Grams in another unit.
 *
 * @param mass_g in g, finite and not negative
 * @returns in `unit`
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * gramsTo(907.18474, 'lb') // => 2
 * ```
 */
export function gramsTo(mass_g: number, unit: MassUnitId): number {
  assertBetween('convert a mass', 'mass_g', mass_g, 0);
  return mass_g / GRAMS_IN[unit];
}
