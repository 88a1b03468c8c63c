import { assertBetween } from '../bounds.ts';

/** Mean ionic strength of wine in mol/L, as OIV-MA-AS323-04C 2.1–2.2 takes it (read). */
export const WINE_IONIC_STRENGTH = 0.038;

/**
 * What the ions of a wine take off the thermodynamic constant: pKM = pKT − A√I ÷ (1 + B√I).
 *
 * @param A Debye–Hückel constant, (L/mol)^½, 0 to 2; varies with temperature and alcohol
 * @param B constant times ion size, (L/mol)^½, 0 to 5
 * @param ionicStrength I in mol/L, 0 to 1; the method's mean by default
 * @returns pKT − pKM, no unit
 * @throws RangeError outside these ranges
 *
 * Source: OIV-MA-AS323-04C 2.1–2.2 (read; it prints no numbers for A and B).
 *
 * @example
 * ```ts
 * ionicTerm(0.5042, 1.64) // => 0.0745
 * ```
 */
export function ionicTerm(A: number, B: number, ionicStrength: number = WINE_IONIC_STRENGTH): number {
  assertBetween('work out the ionic term', 'A', A, 0, 2);
  assertBetween('work out the ionic term', 'B', B, 0, 5);
  assertBetween('work out the ionic term', 'ionicStrength', ionicStrength, 0, 1);
  const root = Math.sqrt(ionicStrength);
  return (A * root) / (1 + B * root);
}
