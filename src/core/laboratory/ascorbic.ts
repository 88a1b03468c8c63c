import { assertBetween } from '../bounds.ts';
import { SO2_MOLAR_MASS } from '../chemistry/molar-mass.ts';

/** Molar mass of ascorbic acid, C6H8O6, g/mol (conventional atomic weights; from memory). */
export const ASCORBIC_MOLAR_MASS = 176.124;

/**
 * What ascorbic acid counts as in a titration with iodine, which takes it for SO2, mole by mole.
 *
 * @param ascorbic_mg_L ascorbic acid, mg/L, 0 or more
 * @returns mg/L of SO2
 * @throws RangeError for NaN, infinities and negative values
 *
 * Source: computed from the molar masses (64.06 ÷ 176.12).
 *
 * @example
 * ```ts
 * ascorbicCountsAs_mg_L(50) // => 18.1855
 * ```
 */
export function ascorbicCountsAs_mg_L(ascorbic_mg_L: number): number {
  assertBetween('count ascorbic acid', 'ascorbic_mg_L', ascorbic_mg_L, 0, 10_000);
  return (ascorbic_mg_L * SO2_MOLAR_MASS) / ASCORBIC_MOLAR_MASS;
}
