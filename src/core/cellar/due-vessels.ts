import { DAY_ms } from '../time/durations.ts';
import type { CheckSettings } from './check-settings.ts';
import { nextCheck, type NextCheck } from './next-check.ts';
import type { Vessel } from './vessel.ts';

/** A vessel that is to be measured, and for how many whole days of 24 hours this has been so. */
export interface DueVessel {
  readonly vessel: Vessel;
  readonly check: NextCheck;
  readonly overdue_days: number;
}

/**
 * The vessels to be measured, the most urgent first: where an addition landed, then wines whose free SO2 was below
 * 10 mg/L, then the others; within each the longest overdue first, and at the same moment as they were handed in.
 *
 * Range: any moment, in milliseconds since 1970.
 *
 * @param options the moment; `until`, not before it, where also those count that fall due before then: a list in the
 *   morning names what falls due later on the same day
 *
 * @example
 * ```ts
 * import { CHECK_DEFAULTS } from './check-settings.ts';
 * import { freshVessel } from './fresh-vessel.ts';
 * const tanks = [freshVessel('tank 4', { entry: 1, at: 0 }), freshVessel('tank 9', { entry: 2, at: 86400000 })];
 * dueVessels(tanks, { at: 33 * 86400000, settings: CHECK_DEFAULTS }).map((one) => one.overdue_days) // => [3, 2]
 * dueVessels(tanks, { at: 30 * 86400000, settings: CHECK_DEFAULTS }).length // => 1
 * ```
 */
export function dueVessels(
  vessels: readonly Vessel[],
  {
    at,
    until = at,
    settings,
  }: { readonly at: number; readonly until?: number; readonly settings: CheckSettings },
): readonly DueVessel[] {
  return vessels
    .flatMap((vessel): DueVessel[] => {
      const check = nextCheck(vessel, settings);
      if (check === undefined || (check.at > at && check.at >= until)) return [];
      return [{ vessel, check, overdue_days: Math.max(0, Math.floor((at - check.at) / DAY_ms)) }];
    })
    .toSorted((a, b) => urgencyOf(a.check) - urgencyOf(b.check) || a.check.at - b.check.at);
}

const urgencyOf = ({ why, is_low }: NextCheck): number => (why === 'landing' ? 0 : is_low ? 1 : 2);
