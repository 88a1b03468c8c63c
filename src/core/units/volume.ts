import { assertBetween } from '../bounds.ts';
import { factorOf } from './define.ts';

/** Volume units by their canonical ids: those of mathjs, and the two gallons. */
export const VOLUME_UNITS = ['L', 'hL', 'mL', 'cL', 'dL', 'm3', 'galUS', 'galUK'] as const;
export type VolumeUnitId = (typeof VOLUME_UNITS)[number];

/**
 * Litres in one of each volume unit (L). Source: mathjs's own definitions; the gallons by law (`define`).
 *
 * @example
 * ```ts
 * LITRES_IN.galUS // => 3.785411784
 * LITRES_IN.hL // => 100
 * ```
 */
export const LITRES_IN = Object.fromEntries(
  VOLUME_UNITS.map((unit) => [unit, Number(factorOf(unit, 'L').toPrecision(14))]),
) as Readonly<Record<VolumeUnitId, number>>;

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
