import { litresTo } from '../../core/units/volume.ts';
import type { VolumeUnit } from '../reader/understood.ts';
import { numberText, type DecimalMark } from './number-text.ts';

/** How a unit is written behind its number; the same in every language. Barrels are shown in litres. */
const SYMBOL = {
  L: 'L',
  hL: 'hL',
  mL: 'mL',
  m3: 'm³',
  galUS: 'gal',
  galUK: 'imp gal',
  barrel: 'L',
} as const satisfies Record<VolumeUnit, string>;

/** Volumes of at least 100 are told to the whole unit, from 10 to 0.1, smaller ones to 0.01. */
function plain(value: number, mark: DecimalMark): string {
  return numberText(value, value >= 100 ? 0 : value >= 10 ? 1 : 2, mark);
}

/**
 * A volume in the unit it was written in; gallons with the litres beside them.
 *
 * @example
 * ```ts
 * volumeText(5488.8470868, 'galUS', '.') // => "1\u202f450 gal (5\u202f489 L)"
 * volumeText(2000, 'hL', ',') // => "20 hL"
 * volumeText(1350, 'barrel', '.') // => "1\u202f350 L"
 * ```
 */
export function volumeText(volume_L: number, unit: VolumeUnit, mark: DecimalMark): string {
  const shown = `${plain(litresTo(volume_L, unit === 'barrel' ? 'L' : unit), mark)} ${SYMBOL[unit]}`;
  return unit === 'galUS' || unit === 'galUK' ? `${shown} (${plain(volume_L, mark)} L)` : shown;
}
