import type { Learned } from '../../../core/binding/learned.ts';
import type { FreeRow } from '../../../core/laboratory/free-table.ts';
import type { Step } from '../../../core/working.ts';

/** A dose as a range, low and high; molecular SO2 in mg/L that one is sure of. */
export interface RangeData {
  readonly dose_mg_L: readonly [number, number];
  readonly mass_g?: readonly [number, number];
  readonly additive_volume_mL?: readonly [number, number];
  readonly tablets?: readonly [number, number];
  readonly molecular_sure_mg_L: number;
  readonly ph_plus_minus: number; // no unit
  readonly free_plus_minus_mg_L: number;
}

/** When free SO2 falls below what is needed: days of the cellar's calendar; `null` where no day can be told. */
export interface ForecastData {
  readonly by: 'readings' | 'published' | 'none';
  readonly needed_mg_L: number;
  readonly below_on: string | null;
  /** From and to: nine of ten times it lies between. */
  readonly interval: readonly [string | null, string | null];
}

/** Two wines as one, before binding moves; shares are of the other wine in the blend, least and most. */
export interface BlendData {
  readonly with: string;
  readonly shares: readonly [number, number] | null;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
}

/** Molecular SO2 of a wine by one basis, and what its target needs; mg/L. */
export interface MolecularData {
  readonly basis: string;
  readonly pK: number;
  readonly molecular_mg_L?: number;
  readonly target_free_mg_L: number;
}

/** What stands beside a dose where it was asked for, or where the wine has told it. */
export interface BesideDose {
  readonly range?: RangeData;
  readonly binding?: Learned;
}

/** What the laboratory and a wine's own ways are asked for. */
export interface LabAnswer extends BesideDose {
  readonly forecast?: ForecastData;
  readonly blend?: readonly BlendData[];
  readonly molecular?: readonly MolecularData[];
  readonly table?: readonly FreeRow[];
  readonly steps: readonly Step[];
}
