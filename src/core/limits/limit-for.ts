import { assertWithinBounds } from '../bounds.ts';
import type { Category, Product, Style } from '../wine.ts';
import { LIMIT_ROWS, type Limit } from './limits.ts';

/** What the limit of a wine hangs on. */
export interface LimitFacts {
  readonly style?: Style;
  readonly sugar_g_L?: number;
  readonly category?: Category;
  readonly product?: Product;
}

/** A limit, or why none is on file. */
export type LimitFound =
  | { readonly limit: Limit; readonly noneFor?: never }
  | { readonly limit?: never; readonly noneFor: 'sparkling' | 'fortified' | Product };

/**
 * The limit of total SO2 for a wine. Colour unknown: the strictest row. Sugar unknown: dry, or above 4 g/L where
 * the wine is called sweet. Sparkling, fortified, cider, mead and fruit wine have no row, and nothing is assumed.
 *
 * @param facts sugar in g/L
 * @throws RangeError for a sugar outside `BOUNDS`
 *
 * Source: OIV-MA-C1-01 (Oeno 9/98), read.
 *
 * @example
 * ```ts
 * limitFor({ style: 'white', sugar_g_L: 2 }).limit?.limit_mg_L // => 200
 * limitFor({}).limit?.limit_mg_L // => 150
 * limitFor({ style: 'red', sugar_g_L: 4.1 }).limit?.limit_mg_L // => 300
 * limitFor({ category: 'sparkling' }) // => { noneFor: 'sparkling' }
 * ```
 */
export function limitFor(facts: LimitFacts): LimitFound {
  assertWithinBounds('find a limit', 'sugar_g_L', facts.sugar_g_L);
  if (facts.product !== undefined) return { noneFor: facts.product };
  if (facts.category === 'sparkling' || facts.category === 'fortified') return { noneFor: facts.category };
  const sugar_g_L = facts.sugar_g_L ?? (facts.category === 'sweet' ? Number.MAX_VALUE : 0);
  const style = facts.style ?? 'red';
  const limit = LIMIT_ROWS.find(
    ({ styles, sugar }) =>
      styles.includes(style) &&
      ('upTo_g_L' in sugar ? sugar_g_L <= sugar.upTo_g_L : sugar_g_L > sugar.above_g_L),
  );
  if (limit === undefined) throw new RangeError(`Cannot find a limit as no row is for ${style}`);
  return { limit };
}
