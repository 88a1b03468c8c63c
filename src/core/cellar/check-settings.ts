import type { Vessel } from './vessel.ts';

/** When a vessel is to be measured again. */
export interface CheckSettings {
  /** After an addition, to see where it landed. */
  readonly after_addition_hours: number;
  /** After the last reading. */
  readonly usual_days: number;
  /** After the last reading of a barrel, or of a wine with little free SO2. */
  readonly often_days: number;
  /** The free SO2 (mg/L) that a wine needs, as far as that is known: where its own readings say when it falls below. */
  readonly neededOf?: (vessel: Vessel) => number | undefined;
}

/** A day after an addition and a month after a reading (common practice, no source); every two weeks: own choice. */
export const CHECK_DEFAULTS: CheckSettings = { after_addition_hours: 24, usual_days: 30, often_days: 14 };

/** Below this much free SO2 a wine is measured more often (own choice). */
export const LOW_FREE_mg_L = 10;
