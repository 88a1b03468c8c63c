import { assertBetween, assertWithinBounds } from '../bounds.ts';
import { shown } from '../units/shown.ts';
import { over, times } from '../working.ts';
import { line, type Line } from './line.ts';

/** Fruit by weight, and how much must comes of it. */
export interface Fruit {
  readonly fruit_kg: number;
  readonly yield_L_per_100_kg: number;
}

/** Yields that any press gives, L of must from 100 kg of fruit; what lies outside is a slip (own thresholds). */
export const YIELD_BOUNDS = { min: 20, max: 100 } as const;

/**
 * Litres of must that come of fruit by weight.
 *
 * @param fruit kg, above 0, and litres from 100 kg, from 20 to 100
 * @throws RangeError outside those
 *
 * @example
 * ```ts
 * mustOf({ fruit_kg: 2000, yield_L_per_100_kg: 65 }) // => 1300
 * ```
 */
export function mustOf({ fruit_kg, yield_L_per_100_kg }: Fruit): number {
  const action = 'tell the must of fruit';
  assertBetween(action, 'fruit_kg', fruit_kg, Number.MIN_VALUE, 1_000_000);
  assertBetween(action, 'yield_L_per_100_kg', yield_L_per_100_kg, YIELD_BOUNDS.min, YIELD_BOUNDS.max);
  const volume_L = (fruit_kg * yield_L_per_100_kg) / 100;
  assertWithinBounds(action, 'volume_L', volume_L);
  return volume_L;
}

/**
 * The line that finds the litres of must.
 *
 * @param fruit kg, above 0, and litres from 100 kg, from 20 to 100
 * @param digits significant digits
 *
 * @example
 * ```ts
 * mustLine({ fruit_kg: 2000, yield_L_per_100_kg: 65 }, 4).step.substituted // => '2000 kg * 65 L / (100 kg)'
 * ```
 */
export function mustLine({ fruit_kg, yield_L_per_100_kg }: Fruit, digits: number): Line {
  const fruit = shown(fruit_kg, 'kg', digits);
  const litres = shown(yield_L_per_100_kg, 'L', digits);
  return line('must-of-fruit', over(times(fruit, litres), shown(100, 'kg')), 'L', digits + 1);
}
