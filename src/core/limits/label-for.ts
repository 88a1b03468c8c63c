import { assertBetween } from '../bounds.ts';
import { LABEL_ROWS, type LabelRow } from './label-rows.ts';
import type { Region } from './region.ts';

/** What is known of a wine's SO2 for its label: in all, and what of it was added; mg/L. */
export interface LabelFacts {
  readonly total_mg_L?: number;
  readonly added_mg_L?: number;
}

/** Two sums of the same figures may differ by a hair. */
const HAIR = 1e-9;

/**
 * Whether a market's label has to speak of sulfites; `undefined` where no row is on file or the SO2 that counts is
 * unknown. mg/kg is taken as mg/L here, as ten of either differ by less than any reading shows.
 *
 * @param facts SO2 of the finished wine, mg/L, 0 or more
 * @throws RangeError for NaN and negative figures
 *
 * @example
 * ```ts
 * needsSulfiteLabel('us', { total_mg_L: 10 }) // => true
 * needsSulfiteLabel('eu', { total_mg_L: 10 }) // => false
 * needsSulfiteLabel('ca', { total_mg_L: 15, added_mg_L: 0 }) // => false
 * needsSulfiteLabel('br', { total_mg_L: 15 }) // => undefined
 * ```
 */
export function needsSulfiteLabel(region: Region, facts: LabelFacts): boolean | undefined {
  const row = labelRowOf(region);
  if (row === undefined) return undefined;
  const counted_mg_L = row.counts === 'added' ? facts.added_mg_L : facts.total_mg_L;
  if (counted_mg_L === undefined) return undefined;
  assertBetween('look up a label', 'counted_mg_L', counted_mg_L, 0);
  if (row.threshold === undefined) return counted_mg_L > 0;
  const { value } = row.threshold;
  return row.comparator === '>' ? counted_mg_L > value * (1 + HAIR) : counted_mg_L >= value * (1 - HAIR);
}

/**
 * The row of a market's label, if one is on file.
 *
 * @example
 * ```ts
 * labelRowOf('eu')?.id // => 'label-eu'
 * ```
 */
export function labelRowOf(region: Region): LabelRow | undefined {
  return LABEL_ROWS.find(({ regions }) => regions.includes(region));
}
