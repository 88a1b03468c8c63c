import { assertBetween } from '../bounds.ts';
import type { Limit } from './limit.ts';

/** mg/L below a limit that are kept for the method: its reproducibility of total SO2 (own round figure). */
export const KEPT_FOR_METHOD_mg_L = 15;

/** How SO2 stands to its limit; `near` is within 15 mg/L below it, or within what is kept for bottling too. */
export type LimitStanding = 'over' | 'near' | 'within';

/** Two sums of the same figures may differ by a hair; no reading does. */
const HAIR = 1e-9;

/**
 * How total or free SO2 stands to a limit, by the operator of the law: `<=` lets the figure itself pass, `<` does not.
 *
 * @param SO2_mg_L predicted, mg/L, 0 or more
 * @param kept_mg_L room below the limit that counts as near it, mg/L
 * @throws RangeError for NaN, infinities and negative values
 *
 * Source of the 15 mg/L: own threshold.
 *
 * @example
 * ```ts
 * checkLimit(150, { limit_mg_L: 150, operator: '<=' }) // => 'near'
 * checkLimit(150.1, { limit_mg_L: 150, operator: '<=' }) // => 'over'
 * checkLimit(346.5, { limit_mg_L: 346.5, operator: '<' }) // => 'over'
 * checkLimit(134, { limit_mg_L: 150, operator: '<=' }) // => 'within'
 * ```
 */
export function checkLimit(
  SO2_mg_L: number,
  { limit_mg_L, operator }: Pick<Limit, 'limit_mg_L' | 'operator'>,
  kept_mg_L = KEPT_FOR_METHOD_mg_L,
): LimitStanding {
  assertBetween('check a limit', 'SO2_mg_L', SO2_mg_L, 0);
  const hair_mg_L = HAIR * limit_mg_L;
  const passes = operator === '<=' ? SO2_mg_L <= limit_mg_L + hair_mg_L : SO2_mg_L < limit_mg_L - hair_mg_L;
  if (!passes) return 'over';
  return SO2_mg_L >= limit_mg_L - kept_mg_L ? 'near' : 'within';
}
