import type { Vessel } from '../../core/cellar/vessel.ts';

/** The total of a vessel as far as the log tells it: what was measured, and what went in since; all in mg/L. */
export interface TotalKnown {
  readonly total_mg_L: number;
  readonly measured_mg_L: number;
  readonly since_mg_L: number;
  /** When it was measured, in milliseconds since 1970. */
  readonly at: number;
}

/**
 * The last measured total of a vessel with all that went in since. None was measured, or how much went in since is not
 * known, or more than the sum is free by now: undefined, as a sum that is too small would promise room that is not there.
 */
export function totalOfVessel(vessel: Vessel): TotalKnown | undefined {
  const { total_mg_L: measured, added_since_total_mg_L: since_mg_L, additions } = vessel;
  if (measured === undefined) return undefined;
  const isUnsure = additions.some(({ at, added_mg_L }) => at >= measured.at && added_mg_L === undefined);
  const { free_mg_L: free } = vessel;
  const isBelowFree =
    free !== undefined && free.at >= measured.at && free.value > measured.value + since_mg_L;
  if (isUnsure || isBelowFree) return undefined;
  return {
    total_mg_L: measured.value + since_mg_L,
    measured_mg_L: measured.value,
    since_mg_L,
    at: measured.at,
  };
}
