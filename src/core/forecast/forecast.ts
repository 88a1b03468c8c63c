import type { SourceKey } from '../sources.ts';
import { DAY_ms } from '../time/durations.ts';
import { crossingOf, type Crossing, type FreePoint } from './decline.ts';
import { PUBLISHED_RATES, type Container } from './published-rates.ts';

/** Readings since the last addition, and the free SO2 in mg/L that the wine needs. */
export interface ForecastRequest {
  readonly points: readonly FreePoint[];
  readonly needed_mg_L: number;
  readonly container: Container;
}

/**
 * When free SO2 falls below what is needed. `by` tells what it rests on; without a crossing, why there is none: nothing
 * measured, no rate on file for such a vessel, or the last reading is below already.
 */
export type Forecast =
  | (Crossing & { readonly by: 'readings'; readonly count: number })
  | (Omit<Crossing, 'lost_in_30_days'> & { readonly by: 'published'; readonly source: SourceKey })
  | { readonly by: 'none'; readonly why: 'unmeasured' | 'no-rate' | 'below-already' };

/**
 * A forecast of free SO2: by this wine's own readings from three on, else by published rates (barrel, bottle), else
 * none. Times in milliseconds since 1970, SO2 in mg/L.
 *
 * Range: free SO2 from 0; a level above 0.
 * Source: `crossingOf`; `PUBLISHED_RATES`.
 *
 * @example
 * ```ts
 * forecast({ points: [{ at: 0, free_mg_L: 40 }], needed_mg_L: 25, container: 'barrel' }) // => { by: 'published', source: 'common-practice', below_at: 90 * 86400000, from: 45 * 86400000, to: 150 * 86400000 }
 * forecast({ points: [{ at: 0, free_mg_L: 40 }], needed_mg_L: 25, container: 'tank' }) // => { by: 'none', why: 'no-rate' }
 * forecast({ points: [{ at: 0, free_mg_L: 20 }], needed_mg_L: 25, container: 'tank' }) // => { by: 'none', why: 'below-already' }
 * ```
 */
export function forecast({ points, needed_mg_L, container }: ForecastRequest): Forecast {
  const last = points.reduce<FreePoint | undefined>(
    (newest, one) => (newest === undefined || one.at >= newest.at ? one : newest),
    undefined,
  );
  if (last === undefined) return { by: 'none', why: 'unmeasured' };
  if (last.free_mg_L <= needed_mg_L) return { by: 'none', why: 'below-already' };
  const crossing = crossingOf(points, needed_mg_L);
  if (crossing !== undefined) return { by: 'readings', count: points.length, ...crossing };
  const rate = PUBLISHED_RATES.find((one) => one.in === container);
  if (rate === undefined) return { by: 'none', why: 'no-rate' };
  const after = (days: number): number => last.at + days * DAY_ms;
  const { source } = rate;
  if (rate.in === 'barrel') {
    const days = (mg_L: number): number => (30 * (last.free_mg_L - needed_mg_L)) / mg_L;
    return {
      by: 'published',
      source,
      below_at: after(days(rate.usual_mg_L)),
      from: after(days(rate.most_mg_L)),
      to: after(days(rate.least_mg_L)),
    };
  }
  const decline = Math.log(last.free_mg_L / needed_mg_L);
  const [warm, cool] = [
    -Math.log(rate.left_warm_share) / rate.days,
    -Math.log(rate.left_cool_share) / rate.days,
  ];
  return {
    by: 'published',
    source,
    below_at: after(decline / ((warm + cool) / 2)),
    from: after(decline / warm),
    to: after(decline / cool),
  };
}
