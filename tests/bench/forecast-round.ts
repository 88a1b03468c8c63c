import { forecast } from '../../src/core/forecast/forecast.ts';
import { timeOf } from './timing.ts';

const READINGS = 10_000;
const DAY_ms = 86_400_000;

/** Milliseconds of a forecast over 10,000 readings of one vessel. */
export function timeForecast(): Promise<number> {
  const points = Array.from({ length: READINGS }, (_, day) => ({
    at: day * DAY_ms,
    // A wave in place of chance: the same every time.
    free_mg_L: 40 * Math.exp(-0.00003 * day) * (1 + 0.05 * Math.sin(day * 1.7)),
  }));
  return timeOf(() => forecast({ points, needed_mg_L: 25, container: 'tank' }), { times: 50, warmUp: 10 });
}
