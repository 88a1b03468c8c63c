import { assertBetween } from '../bounds.ts';
import { freeToMolecular } from './free-to-molecular.ts';

/**
 * Free SO2 that a wine needs for a molecular target.
 *
 * @param molecular_mg_L wanted molecular SO2, mg/L, 0 or more
 * @param ph 2.5 to 4.8
 * @param pK 1 to 3.5, from `dissociation`
 * @returns mg/L
 * @throws RangeError outside these ranges
 *
 * Source: OIV-MA-AS323-04C 2.1 (read), turned round.
 *
 * @example
 * ```ts
 * freeSO2Needed(0.8, 3.58, 1.81) // => 47.907
 * ```
 */
export function freeSO2Needed(molecular_mg_L: number, ph: number, pK: number): number {
  assertBetween('work out free SO2', 'molecular_mg_L', molecular_mg_L, 0);
  return molecular_mg_L * freeToMolecular(ph, pK);
}
