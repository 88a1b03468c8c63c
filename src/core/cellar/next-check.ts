import type { Stage } from '../wine.ts';
import { DAY_ms, HOUR_ms } from '../time/durations.ts';
import { LOW_FREE_mg_L, type CheckSettings } from './check-settings.ts';
import { forecastOf } from './forecast-of.ts';
import { isBarrel } from './is-barrel.ts';
import { UNFINISHED_STAGES, type Vessel } from './vessel.ts';

/** When free SO2 should be measured next, in milliseconds since 1970, and why. */
export interface NextCheck {
  readonly at: number;
  /** To see where an addition landed; so long after the last reading, as usual or more often; or where it may fall short. */
  readonly why: 'landing' | 'usual' | 'often' | 'forecast';
  /** Whether the last reading showed less than 10 mg/L of free SO2 in a wine that should have it. */
  readonly is_low: boolean;
  /** False while the fermentations are not over: it may be measured, and no dose is urged. */
  readonly urges_dose: boolean;
}

/** What ferments is measured for other things, and what SO2 went in before binds: nothing is due of it. */
const STAGES_WITHOUT_CHECKS: readonly Stage[] = ['must', 'fermenting'];

/**
 * When a vessel should be measured next; undefined where nothing is due of it ever: it is empty, bottled or not
 * watched. An addition that has not landed comes before everything else, and of several the last one counts, as one
 * reading answers for all. Where three readings say when free SO2 may fall short, it is measured then, if that is sooner
 * than usual. `later` only postpones.
 *
 * Range: hours and days of the settings above 0; free SO2 in mg/L. Source: common practice, no source; every two
 * weeks for barrels and below 10 mg/L are own choices.
 *
 * @example
 * ```ts
 * import { CHECK_DEFAULTS } from './check-settings.ts';
 * import { freshVessel } from './fresh-vessel.ts';
 * const tank = freshVessel('tank 4', { entry: 1, at: 0 });
 * nextCheck(tank, CHECK_DEFAULTS) // => { at: 30 * 86400000, why: 'usual', is_low: false, urges_dose: true }
 * nextCheck({ ...tank, free_mg_L: { value: 8, at: 0, entry: 1 } }, CHECK_DEFAULTS)?.at // => 14 * 86400000
 * nextCheck({ ...tank, empty: 5 }, CHECK_DEFAULTS) // => undefined
 * ```
 */
export function nextCheck(vessel: Vessel, settings: CheckSettings): NextCheck | undefined {
  const stage = vessel.traits.stage?.value;
  if (vessel.empty !== undefined || vessel.unwatched === true || stage === 'bottled') return undefined;
  if (stage !== undefined && STAGES_WITHOUT_CHECKS.includes(stage)) return undefined;
  const urges_dose = stage === undefined || !UNFINISHED_STAGES.includes(stage);
  const is_low = urges_dose && vessel.free_mg_L !== undefined && vessel.free_mg_L.value < LOW_FREE_mg_L;
  const later = vessel.later ?? -Infinity;

  const added_at = unlandedSince(vessel);
  if (added_at !== undefined) {
    const at = Math.max(added_at + settings.after_addition_hours * HOUR_ms, later);
    return { at, why: 'landing', is_low, urges_dose };
  }
  const why = is_low || isBarrel(vessel.vessel) ? 'often' : 'usual';
  const days = why === 'often' ? settings.often_days : settings.usual_days;
  const usual = unmeasuredSince(vessel) + days * DAY_ms;
  const short = urges_dose ? shortFrom(vessel, settings) : undefined;
  if (short !== undefined && short < usual)
    return { at: Math.max(short, later), why: 'forecast', is_low, urges_dose };
  return { at: Math.max(usual, later), why, is_low, urges_dose };
}

/** A forecast calls for no second reading sooner than this, days (own choice). */
const SOONEST_days = 3;

/** The earliest that free SO2 may fall below what the wine needs, by its own readings; never right after a reading. */
function shortFrom(vessel: Vessel, { neededOf }: CheckSettings): number | undefined {
  const needed_mg_L = neededOf?.(vessel);
  if (needed_mg_L === undefined || vessel.free_mg_L === undefined) return undefined;
  const found = forecastOf(vessel, needed_mg_L);
  if (found.by !== 'readings') return undefined;
  return Math.max(found.from, vessel.free_mg_L.at + SOONEST_days * DAY_ms);
}

/** When the last addition went in that no reading has shown yet. */
function unlandedSince({ unlanded, additions, last_at }: Vessel): number | undefined {
  if (unlanded.length === 0) return undefined;
  const open = additions.filter(({ entry }) => unlanded.includes(entry)).map(({ at }) => at);
  // A vessel keeps only its last additions in sight.
  return open.length === 0 ? last_at : Math.max(...open);
}

/** The last reading of free SO2; of a wine that has none, when it was first heard of or made by a blend. */
function unmeasuredSince({ free_mg_L, since, voided }: Vessel): number {
  const made = [voided.ph, voided.volume_L].filter(
    (one) => one?.event === 'blended' || one?.event === 'moved',
  );
  return free_mg_L?.at ?? Math.max(since, ...made.map((one) => one?.at ?? since));
}
