import { checkLimit, type LimitStanding } from '../limits/check-limit.ts';
import { limitFor, type LimitFacts, type LimitFound } from '../limits/limit-for.ts';
import type { Before } from './landing.ts';

/** How far a wine is from its limit, and what an addition makes of it. */
export interface RoomToLimit {
  readonly found: LimitFound;
  /** Total SO2 now, mg/L; where it is unknown, the free SO2: the least that it can be. */
  readonly least_total_mg_L: number;
  readonly totalKnown: boolean;
  /** Most SO2 that may still go in, mg/L; absent where no limit is on file, negative where it is passed already. */
  readonly ceiling_mg_L?: number;
}

/**
 * How much SO2 a wine may still take by the limit on file.
 *
 * @param facts style, category, product, sugar in g/L, free and total SO2 in mg/L
 *
 * Source: `limits`.
 *
 * @example
 * ```ts
 * roomToLimit({ style: 'red', total_mg_L: 60 }).ceiling_mg_L // => 90
 * roomToLimit({ free_mg_L: 20 }).ceiling_mg_L // => 130
 * ```
 */
export function roomToLimit(facts: LimitFacts & Before): RoomToLimit {
  const found = limitFor(facts);
  const least_total_mg_L = facts.total_mg_L ?? facts.free_mg_L ?? 0;
  return {
    found,
    least_total_mg_L,
    totalKnown: facts.total_mg_L !== undefined,
    ...(found.limit === undefined ? {} : { ceiling_mg_L: found.limit.limit_mg_L - least_total_mg_L }),
  };
}

/**
 * How the total stands to the limit once a dose is in; `within` where none is on file.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 *
 * @example
 * ```ts
 * standingAfter({ found: { noneFor: 'cider' }, least_total_mg_L: 0, totalKnown: false }, 500) // => 'within'
 * ```
 */
export function standingAfter(room: RoomToLimit, dose_mg_L: number): LimitStanding {
  const { limit } = room.found;
  return limit === undefined ? 'within' : checkLimit(room.least_total_mg_L + dose_mg_L, limit);
}
