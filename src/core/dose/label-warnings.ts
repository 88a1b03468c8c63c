import { labelRowOf, needsSulfiteLabel } from '../limits/label-for.ts';
import type { Region } from '../limits/region.ts';
import type { Warning } from './answer.ts';

/** mg/L on either side of the threshold within which a wine is near it (own threshold). */
const NEAR_LABEL_mg_L = 5;

/**
 * That a wine stands near the figure from which its label has to speak of sulfites.
 *
 * @param region none: no label is asked
 * @param total_mg_L predicted total, mg/L, 0 or more
 *
 * Source: `limits/label-rows`; the nearness is an own threshold.
 *
 * @example
 * ```ts
 * labelWarnings('us', 10).map(({ values }) => values['needed']) // => ['yes']
 * labelWarnings('eu', 10).map(({ values }) => values['needed']) // => ['no']
 * labelWarnings('eu', 100) // => []
 * ```
 */
export function labelWarnings(region: Region | undefined, total_mg_L: number): readonly Warning[] {
  const row = region && labelRowOf(region);
  if (region === undefined || row?.threshold === undefined) return [];
  const { value: threshold_mg_L, unit } = row.threshold;
  if (Math.abs(total_mg_L - threshold_mg_L) > NEAR_LABEL_mg_L) return [];
  const needed = needsSulfiteLabel(region, { total_mg_L });
  return [
    {
      code: 'label-threshold',
      values: {
        rule: row.id,
        region,
        threshold_mg_L,
        unit_of_law: unit,
        comparator: row.comparator,
        counts: row.counts,
        confidence: row.checked === 'memory' ? 'unconfirmed' : 'read',
        total_after_mg_L: total_mg_L,
        needed: needed === undefined ? 'unknown' : needed ? 'yes' : 'no',
      },
    },
  ];
}
