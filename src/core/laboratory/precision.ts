import type { SourceKey } from '../sources.ts';
import type { TitrationMethod } from './titration.ts';

/** How far two results of one wine may lie apart, mg/L: in one laboratory, and in two. */
export interface Precision {
  readonly method: TitrationMethod;
  readonly of: 'free' | 'total';
  /** mL of sample, and mg/L of SO2 up to which, or above which, it holds. */
  readonly sample_mL: number;
  readonly up_to_mg_L?: number;
  readonly above_mg_L?: number;
  readonly repeatability_mg_L: number;
  readonly repeatability_source: SourceKey;
  readonly reproducibility_mg_L: number;
  readonly source: SourceKey;
}

/**
 * Published precision, mg/L. Total SO2 by aeration only: for free SO2, and for iodine, no figure is on file.
 *
 * Source: Regulation (EEC) No 2676/90 (reproducibility, read); OIV-MA-AS323-04A (repeatability, from memory).
 *
 * @example
 * ```ts
 * PRECISION.map((row) => row.reproducibility_mg_L) // => [9, 15]
 * ```
 */
export const PRECISION: readonly Precision[] = [
  {
    method: 'aeration',
    of: 'total',
    sample_mL: 50,
    up_to_mg_L: 50,
    repeatability_mg_L: 1,
    repeatability_source: 'oiv-as323-04a-repeatability',
    reproducibility_mg_L: 9,
    source: 'eec-2676-90-aeration',
  },
  {
    method: 'aeration',
    of: 'total',
    sample_mL: 20,
    above_mg_L: 50,
    repeatability_mg_L: 6,
    repeatability_source: 'oiv-as323-04a-repeatability',
    reproducibility_mg_L: 15,
    source: 'eec-2676-90-aeration',
  },
];

/**
 * The published precision of a result, where one is on file for its method, sample (mL) and level (mg/L).
 *
 * Source: `PRECISION`.
 *
 * @example
 * ```ts
 * precisionOf({ method: 'aeration', of: 'total', sample_mL: 20 }, 96)?.reproducibility_mg_L // => 15
 * precisionOf({ method: 'aeration', of: 'free', sample_mL: 20 }, 24) // => undefined
 * ```
 */
export function precisionOf(
  titration: Pick<Precision, 'method' | 'of' | 'sample_mL'>,
  found_mg_L: number,
): Precision | undefined {
  return PRECISION.find(
    ({ method, of, sample_mL, up_to_mg_L = Infinity, above_mg_L = -Infinity }) =>
      method === titration.method &&
      of === titration.of &&
      sample_mL === titration.sample_mL &&
      found_mg_L <= up_to_mg_L &&
      found_mg_L > above_mg_L,
  );
}
