import { assertBetween, BOUNDS } from '../bounds.ts';

/** Bounds of a first dissociation constant of SO2 that any source prints, 1 to 3.5 (no unit). */
export const PK_BOUNDS = { min: 1, max: 3.5 } as const;

/**
 * How many times the molecular SO2 the free SO2 is: 10^(pH − pK) + 1. Sulfite (SO3 2−) is neglected, as the
 * OIV method does: below 0.13 % of the free SO2 up to pH 4.
 *
 * @param ph 2.5 to 4.8
 * @param pK 1 to 3.5
 * @returns no unit, above 1
 * @throws RangeError outside these ranges
 *
 * Source: OIV-MA-AS323-04C 2.1 (read).
 *
 * @example
 * ```ts
 * freeToMolecular(3.58, 1.81) // => 59.884
 * ```
 */
export function freeToMolecular(ph: number, pK: number): number {
  assertBetween('work out molecular SO2', 'ph', ph, BOUNDS.ph.min, BOUNDS.ph.max);
  assertBetween('work out molecular SO2', 'pK', pK, PK_BOUNDS.min, PK_BOUNDS.max);
  return 10 ** (ph - pK) + 1;
}
