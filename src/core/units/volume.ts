import { assertBetween } from '../bounds.ts';

/** Volume units by their canonical ids: those of mathjs, and the two gallons. */
export const VOLUME_UNITS = ['L', 'hL', 'mL', 'cL', 'dL', 'm3', 'galUS', 'galUK'] as const;
/** The canonical id of a volume unit. */
export type VolumeUnitId = (typeof VOLUME_UNITS)[number];

/**
 * Litres in one of each volume unit (L), exact by definition. A test holds them against mathjs and js-quantities.
 * Source: the decimal prefixes; the US gallon NIST Handbook 44, the imperial gallon UK Weights and Measures Act.
 *
 * @example
 * ```ts
 * LITRES_IN.galUS // => 3.785411784
 * LITRES_IN.hL // => 100
 * ```
 */
export const LITRES_IN: Readonly<Record<VolumeUnitId, number>> = {
  L: 1,
  hL: 100,
  mL: 0.001,
  cL: 0.01,
  dL: 0.1,
  m3: 1000,
  galUS: 3.785411784,
  galUK: 4.54609,
};

/**
 * A volume in litres.
 *
 * @param value in `unit`, finite and not negative
 * @returns L
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * litresFrom(1450, 'galUS') // => 5488.8470868
 * ```
 */
export function litresFrom(value: number, unit: VolumeUnitId): number {
  assertBetween('convert a volume', `value in ${unit}`, value, 0);
  return value * LITRES_IN[unit];
}

/**
 * Litres in another unit.
 *
 * @param volume_L in L, finite and not negative
 * @returns in `unit`
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * litresTo(1200, 'hL') // => 12
 * ```
 */
export function litresTo(volume_L: number, unit: VolumeUnitId): number {
  assertBetween('convert a volume', 'volume_L', volume_L, 0);
  return volume_L / LITRES_IN[unit];
}
