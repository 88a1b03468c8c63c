import { assertBetween } from '../bounds.ts';

/** Temperature units. A temperature is no multiple of anything, so it has functions and no factor. */
export type TemperatureUnitId = 'C' | 'F';

/** Absolute zero in °C, exact by definition. */
export const ABSOLUTE_ZERO_C = -273.15;

/**
 * A temperature in °C.
 *
 * @param value in `unit`, from absolute zero up
 * @returns °C; by definition (°F − 32) × 5/9
 * @throws RangeError for NaN, infinities and what lies below absolute zero
 *
 * @example
 * ```ts
 * celsiusFrom(57, 'F') // => 13.888888889
 * celsiusFrom(14, 'C') // => 14
 * ```
 */
export function celsiusFrom(value: number, unit: TemperatureUnitId): number {
  const temperature_C = unit === 'C' ? value : ((value - 32) * 5) / 9;
  assertBetween('convert a temperature', 'temperature_C', temperature_C, ABSOLUTE_ZERO_C);
  return temperature_C;
}

/**
 * °C in another unit.
 *
 * @param temperature_C in °C, from absolute zero up
 * @returns in `unit`
 * @throws RangeError for NaN, infinities and what lies below absolute zero
 *
 * @example
 * ```ts
 * celsiusTo(20, 'F') // => 68
 * ```
 */
export function celsiusTo(temperature_C: number, unit: TemperatureUnitId): number {
  assertBetween('convert a temperature', 'temperature_C', temperature_C, ABSOLUTE_ZERO_C);
  return unit === 'C' ? temperature_C : (temperature_C * 9) / 5 + 32;
}
