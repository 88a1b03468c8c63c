import type { TemperatureUnitId } from '../../core/units/temperature.ts';
import { celsiusFrom } from '../../core/units/temperature.ts';

/** Colder than this, or hotter, is no temperature at all; own thresholds, in either unit. */
const COLDEST = -273;
const HOTTEST = 1_000_000;

/**
 * A temperature in °C as somebody said it. What no scale knows stays as it stands, for the bounds to refuse.
 *
 * @param value In `unit`, any number.
 * @param unit `C` or `F`.
 * @example
 * ```ts
 * celsiusSaid(50, 'F') // => 10
 * celsiusSaid(-510, 'C') // => -510
 * ```
 */
export const celsiusSaid = (value: number, unit: TemperatureUnitId): number =>
  value > COLDEST && value < HOTTEST ? celsiusFrom(value, unit) : value;
