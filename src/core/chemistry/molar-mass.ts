import { ATOMIC_WEIGHTS, type Element } from './atomic-weights.ts';

/** How many atoms of each element a formula has. */
export type Composition = Readonly<Partial<Record<Element, number>>>;

/**
 * Molar mass of a composition.
 *
 * @param composition atoms per formula unit, whole numbers above 0
 * @returns g/mol
 * @throws RangeError for a count that is no whole number above 0
 *
 * Source: `ATOMIC_WEIGHTS`.
 *
 * @example
 * ```ts
 * molarMass({ S: 1, O: 2 }) // => 64.058
 * molarMass({ K: 2, S: 2, O: 5 }) // => 222.3116
 * ```
 */
export function molarMass(composition: Composition): number {
  let mass = 0;
  for (const [element, count] of Object.entries(composition)) {
    if (!Number.isInteger(count) || count < 1) {
      throw new RangeError(
        `Cannot add up a molar mass as the count of ${element} must be a whole number above 0: current value is ${count}`,
      );
    }
    mass += ATOMIC_WEIGHTS[element as Element] * count;
  }
  return mass;
}

/** Molar mass of SO2, g/mol (64.058). */
export const SO2_MOLAR_MASS = molarMass({ S: 1, O: 2 });

/**
 * Share of a substance's mass that it gives as SO2: every sulfur atom gives one.
 *
 * @param composition atoms per formula unit
 * @returns 0 to 1, no unit
 *
 * @example
 * ```ts
 * SO2ShareOf({ K: 2, S: 2, O: 5 }) // => 0.57629
 * ```
 */
export function SO2ShareOf(composition: Composition): number {
  return ((composition.S ?? 0) * SO2_MOLAR_MASS) / molarMass(composition);
}
