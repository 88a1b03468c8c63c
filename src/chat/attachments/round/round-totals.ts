import { totalsToFetch, type TotalToFetch } from '../../../core/dose/totals-to-fetch.ts';
import type { RoundRow } from './round-sheet.ts';

/** What a round takes of each additive: the sum of what its lines show. */
export function roundTotals(rows: readonly RoundRow[]): TotalToFetch[] {
  return totalsToFetch(rows.flatMap(({ weighed }) => weighed));
}
