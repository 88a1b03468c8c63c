import { freeExpected } from '../binding/free-expected.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';

/** What is known before an addition: pH, free and total SO2 in mg/L. */
export interface Before {
  readonly ph?: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
}

/** Where the wine lands, mg/L; a key is absent where the reading for it is. */
export interface Landing {
  readonly free_after_mg_L?: number;
  readonly free_expected_mg_L?: readonly [number, number];
  readonly molecular_after_mg_L?: number;
  readonly total_after_mg_L?: number;
}

/**
 * Where a wine lands after an addition. Free: with the wanted rise (if the stated allowance is right; with none, if
 * nothing binds); expected: with half to a third of the dose bound; total: with the whole dose.
 *
 * @param before readings, mg/L
 * @param add_mg_L rise of free SO2, mg/L, not negative
 * @param dose_mg_L SO2 that goes in, mg/L, not negative
 * @param pK from `dissociation`
 *
 * @example
 * ```ts
 * landing({ free_mg_L: 21, total_mg_L: 60 }, 27, 27, 1.81) // => { free_after_mg_L: 48, free_expected_mg_L: [34.5, 39], total_after_mg_L: 87 }
 * ```
 */
export function landing(before: Before, add_mg_L: number, dose_mg_L: number, pK: number): Landing {
  const { ph, free_mg_L, total_mg_L } = before;
  const total = total_mg_L === undefined ? {} : { total_after_mg_L: total_mg_L + dose_mg_L };
  if (free_mg_L === undefined) return total;
  const free_after_mg_L = free_mg_L + add_mg_L;
  return {
    free_after_mg_L,
    free_expected_mg_L: freeExpected(free_mg_L, dose_mg_L),
    ...(ph === undefined ? {} : { molecular_after_mg_L: molecularSO2(free_after_mg_L, ph, pK) }),
    ...total,
  };
}
