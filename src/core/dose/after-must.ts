import { assertBetween } from '../bounds.ts';

/**
 * Share of an addition to must that is there again as total SO2 in the wine: 50 mg/L gave 16 mg/L
 * (a German trade text of 2012, read).
 */
export const BACK_AS_TOTAL_SHARE = 1 / 3;

/** Hours between the addition and the yeast (common practice, no source). */
export const BEFORE_YEAST_h = { least: 12, most: 24 } as const;

/**
 * SO2 added before crushing, mg/L in all, that does malolactic fermentation no harm (AWRI, Ask the AWRI: MLF; read).
 */
export const MALOLACTIC_UNHARMED_mg_L = 50;

/** What follows from an addition to must. */
export interface AfterMust {
  /** mg/L that are there as total SO2 later. */
  readonly total_back_mg_L: number;
  readonly before_yeast_h: readonly [number, number];
  readonly malolactic_unharmed_mg_L: number;
}

/**
 * What follows from an addition to must: the total that comes back, the wait before the yeast, and up to which
 * addition malolactic fermentation is not harmed.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, from 0 to 100000
 * @throws RangeError outside those
 *
 * @example
 * ```ts
 * afterMust(50).total_back_mg_L // => 16.67
 * ```
 */
export function afterMust(dose_mg_L: number): AfterMust {
  assertBetween('tell what comes of an addition to must', 'dose_mg_L', dose_mg_L, 0, 10_000);
  return {
    total_back_mg_L: dose_mg_L * BACK_AS_TOTAL_SHARE,
    before_yeast_h: [BEFORE_YEAST_h.least, BEFORE_YEAST_h.most],
    malolactic_unharmed_mg_L: MALOLACTIC_UNHARMED_mg_L,
  };
}
