import type { SourceKey } from '../sources.ts';

/** Where a wine lies, as far as a rate hangs on it. */
export type Container = 'barrel' | 'bottle' | 'tank';

/** A rate of loss: so many mg/L in a month, or what is left of it after so many days. */
export type PublishedRate =
  | {
      readonly in: 'barrel';
      /** As usual, the least and the most, mg/L of free SO2 in 30 days. */
      readonly usual_mg_L: number;
      readonly least_mg_L: number;
      readonly most_mg_L: number;
      readonly source: SourceKey;
    }
  | {
      readonly in: 'bottle';
      /** Shares of free SO2 that are left after `days`: in the cool (14 °C) and in the warm (15 to 26 °C). */
      readonly days: number;
      readonly left_cool_share: number;
      readonly left_warm_share: number;
      readonly source: SourceKey;
    };

/**
 * What is on file on how free SO2 is lost: mg/L a month in barrel, shares left after three years in bottle. For a
 * tank there is nothing, and nothing is assumed.
 *
 * Source: barrel 5 (3 to 10) mg/L a month: common practice, no source; bottle: a Quebec wine site reporting a study (read).
 *
 * @example
 * ```ts
 * PUBLISHED_RATES.map((rate) => rate.in) // => ['barrel', 'bottle']
 * ```
 */
export const PUBLISHED_RATES: readonly PublishedRate[] = [
  { in: 'barrel', usual_mg_L: 5, least_mg_L: 3, most_mg_L: 10, source: 'common-practice' },
  { in: 'bottle', days: 3 * 365, left_cool_share: 0.45, left_warm_share: 0.2, source: 'bottle-study-quebec' },
];
