/** What one sample showed: free and total SO2 in mg/L, at least one of them. `at` in milliseconds since 1970. */
export interface ChartReading {
  readonly at: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
}

/** An addition, in mg/L of SO2 where that is known. */
export interface ChartAddition {
  readonly at: number;
  readonly added_mg_L?: number;
}

/** Why nothing is asked of free SO2: the pH is not known, or the wine is of a kind or stage without a usual target. */
export type NothingAsked = 'no-ph' | 'no-target';

/**
 * What is asked of free SO2 from a moment on, until the next step: mg/L at a pH, which is of the moment `ph_at`, for a
 * molecular target in mg/L.
 */
export type NeededStep =
  | {
      readonly at: number;
      readonly needed_mg_L: number;
      readonly ph: number;
      readonly ph_at: number;
      readonly molecular_mg_L: number;
    }
  | { readonly at: number; readonly nothing: NothingAsked };

/** Where the wine in a vessel came from, and when. */
export interface CameFrom {
  readonly at: number;
  readonly vessels: readonly string[];
}

/** The free and bound SO2 of the wine in a vessel over time. The lists are in the order of time. */
export interface ChartData {
  readonly vessel: string;
  readonly readings: readonly [ChartReading, ...ChartReading[]];
  readonly additions: readonly ChartAddition[];
  readonly needed: readonly NeededStep[];
  /** When another wine was blended into it. */
  readonly blended: readonly number[];
  readonly came_from?: CameFrom;
  /** Since when the vessel is empty; what is shown is the wine that was in it. */
  readonly empty?: number;
  /** The legal limit of total SO2. */
  readonly limit_mg_L?: number;
}
