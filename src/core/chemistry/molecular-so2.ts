import { assertBetween } from '../bounds.ts';
import { freeToMolecular } from './free-to-molecular.ts';

/**
 * Molecular SO2 in a wine.
 *
 * @param free_mg_L free SO2, mg/L, 0 or more
 * @param ph 2.5 to 4.8
 * @param pK 1 to 3.5, from `dissociation`
 * @returns mg/L
 * @throws RangeError outside these ranges
 *
 * Source: OIV-MA-AS323-04C 2.1 (read).
 *
 * @example
 * ```ts
 * molecularSO2(21, 3.58, 1.81) // => 0.3507
 * ```
 */
export function molecularSO2(free_mg_L: number, ph: number, pK: number): number {
  assertBetween('work out molecular SO2', 'free_mg_L', free_mg_L, 0);
  return free_mg_L / freeToMolecular(ph, pK);
}
