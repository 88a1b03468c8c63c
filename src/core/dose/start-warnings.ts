import type { Stage } from '../wine.ts';
import type { Warning } from './answer.ts';
import { MALOLACTIC_CEILINGS } from './thresholds.ts';

/**
 * Molecular SO2 in mg/L from which yeast is held back, so that a stuck fermentation hardly starts again
 * (common practice, no source).
 */
export const YEAST_HELD_BACK_mg_L = 0.8;

/** What is known of a wine in which something is still to start, mg/L. */
export interface BeforeStart {
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly molecular_mg_L?: number;
}

/**
 * That malolactic fermentation, or a restart of the first one, will hardly begin in this wine as it stands.
 *
 * @param wine free, total and molecular SO2 now, mg/L, not negative
 *
 * Source: `MALOLACTIC_CEILINGS` (AWRI, read); `YEAST_HELD_BACK_mg_L` (common practice, no source).
 *
 * @example
 * ```ts
 * startWarnings('malolactic', { free_mg_L: 25 })[0]?.code // => 'malolactic-may-not-start'
 * startWarnings('malolactic', { free_mg_L: 10, total_mg_L: 40 }) // => []
 * startWarnings('fermenting', { molecular_mg_L: 0.8 })[0]?.code // => 'restart-may-fail'
 * ```
 */
export function startWarnings(stage: Stage, wine: BeforeStart): readonly Warning[] {
  const { free_mg_L = 0, total_mg_L = 0, molecular_mg_L = 0 } = wine;
  if (stage === 'fermenting' && molecular_mg_L >= YEAST_HELD_BACK_mg_L)
    return [
      {
        code: 'restart-may-fail',
        values: { molecular_mg_L, held_back_molecular_mg_L: YEAST_HELD_BACK_mg_L },
      },
    ];
  const { free_ceiling_high_mg_L: free, total_ceiling_high_mg_L: total } = MALOLACTIC_CEILINGS;
  const [isFree, isTotal] = [free_mg_L > free, total_mg_L > total];
  if (stage !== 'malolactic' || !(isFree || isTotal)) return [];
  const above = isFree && isTotal ? 'both' : isFree ? 'free' : 'total';
  return [
    { code: 'malolactic-may-not-start', values: { above, free_mg_L, total_mg_L, ...MALOLACTIC_CEILINGS } },
  ];
}
