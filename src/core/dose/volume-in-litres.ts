import { shown, type VolumeShown } from '../units/shown.ts';
import { LITRES_IN } from '../units/volume.ts';
import { termOf, times, type Term } from '../working.ts';
import { line, type Line } from './line.ts';

/** Milligrams in a gram, as a factor of the working: grams come of milligrams by a division that anyone can do. */
export const MG_PER_G: Term = { text: '1000 mg/g', value: 1, holds: 'quantity' };

/**
 * A volume in litres as a term, and where the person wrote it in another unit the line that converts it.
 *
 * @param volume_L in L, above 0
 * @param display the same in another unit
 * @param digits significant digits; the litres have one more than the rest
 *
 * Source: `LITRES_IN`.
 *
 * @example
 * ```ts
 * volumeInLitres(5488.8470868, { value: 1450, unit: 'galUS' }, 4).lines[0]?.step.substituted // => '1450 galUS * 3.78541 L/galUS'
 * volumeInLitres(5488.8470868, { value: 1450, unit: 'galUS' }, 4).volume.text // => '5488.8 L'
 * volumeInLitres(225, undefined, 4).volume.text // => '225 L'
 * ```
 */
export function volumeInLitres(
  volume_L: number,
  display: VolumeShown | undefined,
  digits: number,
): { readonly volume: Term; readonly lines: readonly Line[] } {
  const asWritten =
    display !== undefined &&
    display.unit !== 'L' &&
    Math.abs(display.value * LITRES_IN[display.unit] - volume_L) <= volume_L * 1e-9;
  if (!asWritten) return { volume: shown(volume_L, 'L', digits), lines: [] };
  const written = shown(display.value, display.unit, digits);
  // The written volume counts in litres already: the factor only takes up what its own printing lost.
  const perUnit = LITRES_IN[display.unit];
  const factor = termOf(perUnit, `L/${display.unit}`, 1 / perUnit, Math.max(digits, 6));
  const source = display.unit === 'galUS' || display.unit === 'galUK' ? 'gallon-definitions' : undefined;
  const converted = line('volume-in-litres', times(written, factor), 'L', digits + 1, source);
  return { volume: converted.result, lines: [converted] };
}
