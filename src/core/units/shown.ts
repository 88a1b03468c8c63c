import { termOf, type Term } from '../working.ts';
import { GRAMS_IN } from './mass.ts';
import { LITRES_IN, type VolumeUnitId } from './volume.ts';

/** Milligrams, litres, mg/L or ones in each unit that a working may show. */
export const SHOWN_UNITS = {
  '': 1,
  mg: GRAMS_IN.mg * 1000,
  g: 1000,
  kg: 1_000_000,
  'mg/L': 1,
  'g/L': 1000,
  ...LITRES_IN,
} as const;
/** A unit that a working may show; `""` for a pure number. */
export type ShownUnit = keyof typeof SHOWN_UNITS;

/** A volume as the person wrote it: the working then shows it so. `value` in `unit`. */
export interface VolumeShown {
  readonly value: number;
  readonly unit: VolumeUnitId;
}

/**
 * A term of one number in a unit that a working may show.
 *
 * @param value in `unit`, finite
 * @param digits significant digits where the number has more than 9 (default 6)
 *
 * @example
 * ```ts
 * shown(147.69, 'g') // => { text: '147.69 g', value: 147690, holds: 'quantity' }
 * ```
 */
export function shown(value: number, unit: ShownUnit, digits = 6): Term {
  return termOf(value, unit, SHOWN_UNITS[unit], Math.max(digits, 6));
}
