import { DAY_ms } from '../time/durations.ts';
import { tQuantile95 } from './t-quantile.ts';

/** Free SO2 in mg/L at a moment (milliseconds since 1970). */
export interface FreePoint {
  readonly at: number;
  readonly free_mg_L: number;
}

/** When free SO2 falls below a level, milliseconds since 1970: as expected, and the ends of a 90 % interval. */
export interface Crossing {
  /** Absent where the readings do not fall. */
  readonly below_at?: number;
  /** The earliest that it may be; the first reading where it may be below already. */
  readonly from: number;
  /** The latest; absent where it may never be. */
  readonly to?: number;
  /** Share that is lost in 30 days, below 0 where it rises. */
  readonly lost_in_30_days: number;
}

/** Fewest readings that a decline is read from. */
export const POINTS_FEWEST = 3;

/** Readings below this say nothing in a logarithm, mg/L (own threshold). */
const LEAST_mg_L = 1;

/** Standard deviation of a reading as a share of it (± 10 % is two; common practice), worth so many readings. */
const ERROR_SHARE = 0.05;
const ERROR_FREEDOM = 4;

/** Shortest time that a decline is read from, days (own threshold). */
const SHORTEST_days = 3;

/**
 * When free SO2 falls below a level, by a first-order decline through readings: a straight line through the logarithms,
 * with a 90 % interval for where it crosses (Fieller). The error of a reading is taken from how they scatter, together
 * with the usual ± 10 %. Undefined for fewer than three readings, or within three days.
 *
 * Range: free SO2 from 1 mg/L; times in milliseconds since 1970.
 * Source: first-order loss of free SO2 (general); least squares and Fieller's interval (general).
 *
 * @param points in any order
 * @param level_mg_L free SO2, above 0
 *
 * @example
 * ```ts
 * const day = 86400000;
 * const points = [{ at: 0, free_mg_L: 40 }, { at: 30 * day, free_mg_L: 36 }, { at: 60 * day, free_mg_L: 32.4 }];
 * Math.round((crossingOf(points, 25)?.below_at ?? 0) / day) // => 134
 * crossingOf(points.slice(1), 25) // => undefined
 * ```
 */
export function crossingOf(points: readonly FreePoint[], level_mg_L: number): Crossing | undefined {
  if (!(level_mg_L > 0)) return undefined;
  const fit = fitOf(points);
  if (fit === undefined) return undefined;
  const { start, x_days: x, y, falls, spread_days: spread, n, scatter } = fit;
  const gap = y - Math.log(level_mg_L);
  const q = (tQuantile95(n - 2 + ERROR_FREEDOM) * scatter) ** 2;
  // (gap − falls·u)² = q·(1/n + u²/spread), u days from the middle of the readings.
  const [a, b, c] = [falls ** 2 - q / spread, -2 * gap * falls, gap ** 2 - q / n];
  const root = b ** 2 - 4 * a * c;
  const ends = root < 0 ? [] : [(-b - Math.sqrt(root)) / (2 * a), (-b + Math.sqrt(root)) / (2 * a)];
  const still = ends.filter((u) => gap - falls * u >= 0);
  const past = ends.filter((u) => gap - falls * u < 0);
  const at = (u: number): number => start + (x + u) * DAY_ms;
  return {
    ...(falls > 0 && { below_at: at(gap / falls) }),
    from: still.length === 0 ? start : Math.max(start, at(Math.max(...still))),
    ...(falls > 0 && a > 0 && past.length > 0 && { to: at(Math.min(...past)) }),
    lost_in_30_days: 1 - Math.exp(-falls * 30),
  };
}

interface Fit {
  readonly start: number;
  /** Means of days since `start` and of ln free; sum of squared days about the mean. */
  readonly x_days: number;
  readonly y: number; // pure number
  readonly spread_days: number; // squared
  /** By how much ln free falls in a day. */
  readonly falls: number; // pure number a day
  /** Standard deviation of ln free. */
  readonly scatter: number; // pure number
  /** How many readings. */
  readonly n: number;
}

function fitOf(points: readonly FreePoint[]): Fit | undefined {
  const used = points.filter(({ free_mg_L }) => free_mg_L >= LEAST_mg_L);
  const n = used.length;
  if (n < POINTS_FEWEST) return undefined;
  const start = used.reduce((least, { at }) => Math.min(least, at), Infinity);
  const days = used.map(({ at }) => (at - start) / DAY_ms);
  const logs = used.map(({ free_mg_L }) => Math.log(free_mg_L));
  const x = days.reduce((sum, one) => sum + one, 0) / n;
  const y = logs.reduce((sum, one) => sum + one, 0) / n;
  const spread = days.reduce((sum, one) => sum + (one - x) ** 2, 0);
  if (days.reduce((most, one) => Math.max(most, one), 0) < SHORTEST_days) return undefined;
  const falls = -days.reduce((sum, one, i) => sum + (one - x) * ((logs[i] ?? 0) - y), 0) / spread;
  const rest = days.reduce((sum, one, i) => sum + ((logs[i] ?? 0) - y + falls * (one - x)) ** 2, 0);
  const scatter = Math.sqrt((rest + ERROR_FREEDOM * ERROR_SHARE ** 2) / (n - 2 + ERROR_FREEDOM));
  return { start, x_days: x, y, spread_days: spread, falls, scatter, n };
}
