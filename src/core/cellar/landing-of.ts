import type { AdditionKept, Landing, Vessel } from './vessel.ts';

/** A sample that tells where additions landed: its entry, its time, its free SO2 in mg/L. */
export interface LandingSample {
  readonly entry: number;
  readonly at: number;
  readonly free_mg_L: number;
}

/**
 * Where the additions since the last reading landed: the share of what went in (mg/L of SO2) that no free SO2 came of.
 * Undefined where nothing went in, or where the free SO2 before or one of the amounts is not known.
 *
 * Source: definition; share bound = 1 − (free after − free before) ÷ addition.
 *
 * @param vessel the vessel before the sample
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const before = { ...freshVessel('tank 4', { entry: 1, at: 0 }), free_mg_L: { value: 20, at: 0, entry: 1 } };
 * const dosed = { ...before, unlanded: [2], additions: [{ entry: 2, at: 1, by: 1, added_mg_L: 30 }] };
 * landingOf(dosed, { entry: 3, at: 2, free_mg_L: 38 })?.bound_share // => 0.4
 * landingOf(before, { entry: 3, at: 2, free_mg_L: 38 }) // => undefined
 * ```
 */
export function landingOf(vessel: Vessel, sample: LandingSample): Landing | undefined {
  const before = vessel.free_mg_L;
  const went = vessel.additions.filter(({ entry }) => vessel.unlanded.includes(entry));
  const [first] = went;
  // An addition that has left the kept list cannot be summed.
  if (before === undefined || first === undefined || went.length < vessel.unlanded.length) return undefined;
  const added_mg_L = sumOf(went);
  if (added_mg_L === undefined || added_mg_L <= 0) return undefined;
  const planned = went.at(-1)?.planned_free_mg_L;
  return {
    entry: sample.entry,
    at: sample.at,
    additions: went.map(({ entry }) => entry),
    added_at: first.at,
    added_mg_L,
    before_at: before.at,
    before_mg_L: before.value,
    after_mg_L: sample.free_mg_L,
    bound_share: 1 - (sample.free_mg_L - before.value) / added_mg_L,
    ...(planned !== undefined && { planned_free_mg_L: planned }),
  };
}

function sumOf(additions: readonly AdditionKept[]): number | undefined {
  const amounts = additions.map(({ added_mg_L }) => added_mg_L);
  return amounts.some((one) => one === undefined)
    ? undefined
    : amounts.reduce<number>((sum, one) => sum + (one ?? 0), 0);
}
