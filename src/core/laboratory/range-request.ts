import type { Allowance } from '../binding/allowance.ts';
import type { Dissociation } from '../chemistry/dissociation.ts';
import type { Target } from '../wine.ts';
import type { Step } from '../working.ts';

/** What a range is made of. A ± is two standard deviations; SO2 in mg/L. */
export interface RangeRequest extends Allowance {
  readonly ph: number;
  readonly free_mg_L: number;
  readonly target: Exclude<Target, { add_mg_L: number }>;
  readonly dissociation: Dissociation;
  /** Without unit. */
  readonly ph_plus_minus?: number;
  readonly free_plus_minus_mg_L?: number;
}

/** A dose as a range, mg/L; low and high are never negative. */
export interface DoseRange {
  readonly dose_mg_L: readonly [number, number];
  /** Half of the range before it is cut off at 0. */
  readonly plus_minus_mg_L: number;
  /** Without unit. */
  readonly ph_plus_minus: number;
  readonly free_plus_minus_mg_L: number;
  /** Molecular SO2 after the dose that the errors of pH and free SO2 leave one sure of, if what binds is as reckoned; below
   * 10 mg/L free only what is there already. */
  readonly molecular_sure_mg_L: number;
  readonly steps: readonly Step[];
}
