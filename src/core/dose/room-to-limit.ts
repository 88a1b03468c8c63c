import { checkLimit, KEPT_FOR_METHOD_mg_L, type LimitStanding } from '../limits/check-limit.ts';
import type { LimitFacts } from '../limits/limit-facts.ts';
import type { Limit, LimitsFound } from '../limits/limit.ts';
import { limitsFor } from '../limits/limits-for.ts';
import type { Before } from './landing.ts';

/** How far a wine is from its limits, and what an addition makes of it. */
export interface RoomToLimit {
  readonly found: LimitsFound;
  /** Total SO2 now, mg/L; where it is unknown, the free SO2: the least that it can be. */
  readonly least_total_mg_L: number;
  readonly totalKnown: boolean;
  readonly free_mg_L?: number;
  /** What is kept below a limit: for the method, and for what is planned at bottling; mg/L. */
  readonly kept_mg_L: number;
  /** Most SO2 that may still go in, mg/L; absent where no limit is on file, negative where it is passed already. */
  readonly ceiling_mg_L?: number;
}

/** A limit, where its SO2 stands once a dose is in (mg/L), and how that stands to it. */
export interface LimitReached {
  readonly limit: Limit;
  readonly after_mg_L: number;
  readonly standing: LimitStanding;
}

/** A strict limit is not to be reached by a rounding either, mg/L. */
const JUST_BELOW_mg_L = 1e-6;

/**
 * How much SO2 a wine may still take by the limits on file.
 *
 * @param facts style, category, product, sugar in g/L, free and total SO2 in mg/L, what is kept for bottling in mg/L
 *
 * Source: `limits`.
 *
 * @example
 * ```ts
 * roomToLimit({ style: 'red', total_mg_L: 60 }).ceiling_mg_L // => 90
 * roomToLimit({ free_mg_L: 20 }).ceiling_mg_L // => 130
 * roomToLimit({ region: 'cl', free_mg_L: 70, total_mg_L: 100 }).ceiling_mg_L // => 5
 * ```
 */
export function roomToLimit(facts: LimitFacts & Before & { readonly reserve_mg_L?: number }): RoomToLimit {
  const found = limitsFor(facts);
  const room: RoomToLimit = {
    found,
    least_total_mg_L: facts.total_mg_L ?? facts.free_mg_L ?? 0,
    totalKnown: facts.total_mg_L !== undefined,
    ...(facts.free_mg_L === undefined ? {} : { free_mg_L: facts.free_mg_L }),
    kept_mg_L: KEPT_FOR_METHOD_mg_L + (facts.reserve_mg_L ?? 0),
  };
  const ceilings_mg_L = limitsIn(room).map(
    (limit) =>
      limit.limit_mg_L - (beforeOf(limit, room) ?? 0) - (limit.operator === '<' ? JUST_BELOW_mg_L : 0),
  );
  return { ...room, ...(ceilings_mg_L.length === 0 ? {} : { ceiling_mg_L: Math.min(...ceilings_mg_L) }) };
}

/**
 * The limits that a wine's SO2 can be held against: of the total always, of free where that is known.
 *
 * @example
 * ```ts
 * limitsIn({ found: { notes: [] }, least_total_mg_L: 0, totalKnown: false, kept_mg_L: 15 }) // => []
 * ```
 */
export function limitsIn(room: RoomToLimit): readonly Limit[] {
  const { total, free } = room.found;
  return [total, room.free_mg_L === undefined ? undefined : free].filter((one) => one !== undefined);
}

/**
 * All limits of a wine, of total and of free SO2.
 *
 * @example
 * ```ts
 * limitsOn({ found: { notes: [] } }) // => []
 * ```
 */
export function limitsOn({ found: { total, free } }: Pick<RoomToLimit, 'found'>): readonly Limit[] {
  return [total, free].filter((one) => one !== undefined);
}

/**
 * The SO2 that counts for a limit, before the addition, mg/L; absent where it is unknown.
 *
 * @example
 * ```ts
 * beforeOf({ of: 'total' }, { least_total_mg_L: 60 }) // => 60
 * ```
 */
export function beforeOf(
  { of }: Pick<Limit, 'of'>,
  room: Pick<RoomToLimit, 'least_total_mg_L' | 'free_mg_L'>,
): number | undefined {
  return of === 'total' ? room.least_total_mg_L : room.free_mg_L;
}

/**
 * Where each limit is reached once a dose is in: the total takes all of it, and so does free SO2 if nothing binds.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 *
 * @example
 * ```ts
 * reachedAfter({ found: { notes: [] }, least_total_mg_L: 0, totalKnown: false, kept_mg_L: 15 }, 500) // => []
 * ```
 */
export function reachedAfter(room: RoomToLimit, dose_mg_L: number): readonly LimitReached[] {
  return limitsIn(room).map((limit) => {
    const after_mg_L = (beforeOf(limit, room) ?? 0) + dose_mg_L;
    return { limit, after_mg_L, standing: checkLimit(after_mg_L, limit, room.kept_mg_L) };
  });
}

/**
 * Whether a dose passes a limit that was read. One from memory is told and takes nothing away.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 *
 * @example
 * ```ts
 * passesLimit({ found: { notes: [] }, least_total_mg_L: 0, totalKnown: false, kept_mg_L: 15 }, 500) // => false
 * ```
 */
export function passesLimit(room: RoomToLimit, dose_mg_L: number): boolean {
  return reachedAfter(room, dose_mg_L).some(
    ({ limit, standing }) => standing === 'over' && limit.confidence === 'read',
  );
}

/**
 * The limit that decides: one that is passed, before all of those that were read the one with the least room; else
 * that of the total, else that of free.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 *
 * @example
 * ```ts
 * decidingLimit({ found: { notes: [] }, least_total_mg_L: 0, totalKnown: false, kept_mg_L: 15 }, 500) // => undefined
 * ```
 */
export function decidingLimit(room: RoomToLimit, dose_mg_L: number): Limit | undefined {
  const passed = reachedAfter(room, dose_mg_L)
    .filter(({ standing }) => standing === 'over')
    .toSorted(
      (a, b) =>
        Number(a.limit.confidence !== 'read') - Number(b.limit.confidence !== 'read') ||
        a.limit.limit_mg_L - a.after_mg_L - (b.limit.limit_mg_L - b.after_mg_L),
    );
  return passed[0]?.limit ?? room.found.total ?? room.found.free;
}
