import { assertBetween } from '../bounds.ts';

/** Free SO2 in mg/L below which all of an addition may bind (a guild's rule: none may stay free near 0; read). */
export const FREE_LOW_mg_L = 10;

/**
 * How far free SO2 may be expected to rise with an addition: half to a third of it binds.
 *
 * @param dose_mg_L SO2 that goes in, mg/L, 0 or more
 * @returns low and high end of the rise, mg/L
 * @throws RangeError for NaN, infinities and negative values
 *
 * Source: two thirds stay free, one half below 30 mg/L: Handbook of Enology vol. 1 ch. 8 (from memory).
 *
 * @example
 * ```ts
 * riseExpected(27) // => [13.5, 18]
 * ```
 */
export function riseExpected(dose_mg_L: number): readonly [number, number] {
  assertBetween('expect free SO2', 'dose_mg_L', dose_mg_L, 0);
  return [dose_mg_L / 2, (dose_mg_L * 2) / 3];
}

/**
 * Where free SO2 may be expected after an addition: half to a third of it binds. Below 10 mg/L free all of it may.
 *
 * @param free_mg_L before, mg/L, 0 or more
 * @param dose_mg_L SO2 that goes in, mg/L, 0 or more
 * @returns low and high end, mg/L
 * @throws RangeError for NaN, infinities and negative values
 *
 * Source: two thirds stay free, one half below 30 mg/L: Handbook of Enology vol. 1 ch. 8 (from memory). Other sources
 * give 35 to 75 %: none is safe, so the wine is measured again.
 *
 * @example
 * ```ts
 * freeExpected(21, 27) // => [34.5, 39]
 * freeExpected(3, 30) // => [3, 23]
 * ```
 */
export function freeExpected(free_mg_L: number, dose_mg_L: number): readonly [number, number] {
  assertBetween('expect free SO2', 'free_mg_L', free_mg_L, 0);
  const [low, high] = riseExpected(dose_mg_L);
  return [free_mg_L < FREE_LOW_mg_L ? free_mg_L : free_mg_L + low, free_mg_L + high];
}
