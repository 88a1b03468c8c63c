import type { SugarBand } from './limit-row.ts';

/** Sugar in g/L above which a wine lies that somebody calls sweet: past every dry band on file. */
const SWEET_ABOVE_g_L = 5;

/** How a wine's sugar stands to a band: in it, at an end that no band of the text takes in, or outside. */
export type SugarFit = 'in' | 'at-open-end' | 'out' | 'unknown';

/**
 * Whether a wine's sugar lies in a band. Where it is unknown, a wine that is called sweet lies above 5 g/L, and
 * every other one may lie anywhere.
 *
 * @param band ends in g/L, as the text has them; none: any sugar
 * @param sugar_g_L 0 or more; absent where nobody said it
 * @param isSweet whether the wine is called sweet
 *
 * @example
 * ```ts
 * sugarFit({ to_g_L: 4, toIncluded: true, basis: 'reducing-substances' }, 4, false) // => 'in'
 * sugarFit({ from_g_L: 5, fromIncluded: false, basis: 'sugar' }, 5, false) // => 'at-open-end'
 * sugarFit({ to_g_L: 4, toIncluded: true, basis: 'reducing-substances' }, undefined, true) // => 'out'
 * sugarFit(undefined, 12, false) // => 'in'
 * ```
 */
export function sugarFit(
  band: SugarBand | undefined,
  sugar_g_L: number | undefined,
  isSweet: boolean,
): SugarFit {
  if (band === undefined) return 'in';
  const { from_g_L = 0, fromIncluded = true, to_g_L = Number.MAX_VALUE, toIncluded = true } = band;
  if (sugar_g_L === undefined) return isSweet && to_g_L <= SWEET_ABOVE_g_L ? 'out' : 'unknown';
  if (sugar_g_L > from_g_L && sugar_g_L < to_g_L) return 'in';
  if (sugar_g_L === from_g_L) return fromIncluded ? 'in' : 'at-open-end';
  if (sugar_g_L === to_g_L) return toIncluded ? 'in' : 'at-open-end';
  return 'out';
}
