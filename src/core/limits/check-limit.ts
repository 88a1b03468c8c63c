import { assertBetween } from '../bounds.ts';
import { NEAR_LIMIT_mg_L, type Limit } from './limits.ts';

/** How a total stands to its limit; `near` is within 15 mg/L below it. */
export type LimitStanding = 'over' | 'near' | 'within';

/**
 * How a total SO2 stands to a limit.
 *
 * @param total_mg_L predicted total, mg/L, 0 or more
 * @throws RangeError for NaN, infinities and negative values
 *
 * Source of the 15 mg/L: own threshold.
 *
 * @example
 * ```ts
 * checkLimit(150, { limit_mg_L: 150 }) // => 'near'
 * checkLimit(150.1, { limit_mg_L: 150 }) // => 'over'
 * checkLimit(134, { limit_mg_L: 150 }) // => 'within'
 * ```
 */
export function checkLimit(total_mg_L: number, limit: Pick<Limit, 'limit_mg_L'>): LimitStanding {
  assertBetween('check a limit', 'total_mg_L', total_mg_L, 0);
  if (total_mg_L > limit.limit_mg_L) return 'over';
  return total_mg_L >= limit.limit_mg_L - NEAR_LIMIT_mg_L ? 'near' : 'within';
}
