import type { FreePoint } from '../forecast/decline.ts';
import { forecast, type Forecast } from '../forecast/forecast.ts';
import type { Container } from '../forecast/published-rates.ts';
import { isBarrel } from './is-barrel.ts';
import type { Happened, Vessel } from './vessel.ts';

/**
 * The readings of free SO2 (mg/L) that show how this wine loses it: since its last addition, since it was racked,
 * moved or bottled, and since the wine is the one it is. Topping is part of how a barrel lies. Where free SO2 rose by more
 * than readings err, something went in that nobody noted: it begins anew there.
 *
 * Range: as many readings as a vessel keeps in sight.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const tank = { ...freshVessel('tank 4', { entry: 1, at: 0 }), readings: [{ entry: 1, at: 0, free_mg_L: 30 }, { entry: 3, at: 9, free_mg_L: 28 }] };
 * freePoints(tank).length // => 2
 * freePoints({ ...tank, additions: [{ entry: 2, at: 5, by: 1 }] }).length // => 1
 * freePoints({ ...tank, handled: { entry: 2, at: 5 } }).length // => 1
 * freePoints({ ...tank, additions: [{ entry: 2, at: 0, by: 1 }] }).length // => 1
 * ```
 */
export function freePoints({ readings, additions, ...vessel }: Vessel): readonly FreePoint[] {
  const events = [vessel.changed, vessel.handled, ...additions].filter((one) => one !== undefined);
  const points = readings.flatMap(({ at, entry, free_mg_L }) =>
    free_mg_L === undefined || events.some((event) => isBefore({ at, entry }, event))
      ? []
      : [{ at, free_mg_L }],
  );
  return points.slice(
    Math.max(
      0,
      points.findLastIndex((point, i) => rose(points[i - 1], point)),
    ),
  );
}

/** Two readings differ by this in one of a thousand by their error alone (± 10 % is two standard deviations). */
const RISE_LARGEST = 1.25;

const rose = (before: FreePoint | undefined, { free_mg_L }: FreePoint): boolean =>
  before !== undefined && free_mg_L > RISE_LARGEST * Math.max(before.free_mg_L, LEAST_mg_L);

/** Below this a rise is an error of the reading, mg/L (own threshold). */
const LEAST_mg_L = 4;

/** In time, and within a minute in the order in which it was told. */
const isBefore = (one: Happened, other: Happened): boolean =>
  one.at < other.at || (one.at === other.at && one.entry < other.entry);

/**
 * Where the wine of a vessel lies: in a barrel by its name, in bottles by its stage, else in a tank.
 *
 * Range: any vessel, whatever its litres.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * containerOf(freshVessel('barrel 17', { entry: 1, at: 0 })) // => 'barrel'
 * ```
 */
export function containerOf({ vessel, traits }: Vessel): Container {
  if (traits.stage?.value === 'bottled') return 'bottle';
  return isBarrel(vessel) ? 'barrel' : 'tank';
}

/**
 * When the free SO2 of a vessel falls below what it needs; times in milliseconds since 1970.
 *
 * @param needed_mg_L free SO2 that its pH asks for, mg/L, above 0
 *
 * Source: `forecast`.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * forecastOf(freshVessel('tank 4', { entry: 1, at: 0 }), 25) // => { by: 'none', why: 'unmeasured' }
 * ```
 */
export function forecastOf(vessel: Vessel, needed_mg_L: number): Forecast {
  return forecast({ points: freePoints(vessel), needed_mg_L, container: containerOf(vessel) });
}
