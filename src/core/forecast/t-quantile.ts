import { assertBetween } from '../bounds.ts';

/** 95 % quantile of the normal distribution (no unit). */
const Z_95 = 1.6448536;

/**
 * 95 % quantile of Student's t: 90 of 100 intervals of ± so many standard errors hold the true value.
 *
 * @param freedom degrees of freedom, 3 or more
 * @returns no unit; within 0.01 of printed tables from 4 degrees on
 * @throws RangeError below 3
 *
 * Source: Cornish–Fisher expansion (Abramowitz & Stegun 26.7.5; from memory).
 *
 * @example
 * ```ts
 * tQuantile95(10) // => 1.81
 * tQuantile95(1000) // => 1.646
 * ```
 */
export function tQuantile95(freedom: number): number {
  assertBetween('look up a quantile', 'freedom', freedom, 3);
  const z = Z_95;
  const first = (z ** 3 + z) / 4;
  const second = (5 * z ** 5 + 16 * z ** 3 + 3 * z) / 96;
  const third = (3 * z ** 7 + 19 * z ** 5 + 17 * z ** 3 - 15 * z) / 384;
  return z + first / freedom + second / freedom ** 2 + third / freedom ** 3;
}
