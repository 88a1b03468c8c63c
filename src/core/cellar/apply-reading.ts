import type { Entry, Measurement } from './entry.ts';
import { KEPT } from './kept-lengths.ts';
import { landingOf } from './landing-of.ts';
import type { Known, SampleKept, Vessel } from './vessel.ts';
import { withTraits } from './with-traits.ts';
import { withVolume } from './with-volume.ts';

/**
 * A vessel after a reading of it: pH, free and total SO2 in mg/L, temperature in °C, volume in litres. The first free
 * SO2 after additions is where they landed.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const reading = { entry: 1, at: 5, key: 'k', noted_at: 5, by: 1, kind: 'reading', vessels: ['tank 4'], free_mg_L: 21 };
 * applyReading(freshVessel('tank 4', reading), reading).free_mg_L // => { value: 21, at: 5, entry: 1 }
 * ```
 */
export function applyReading(before: Vessel, reading: Entry & Measurement): Vessel {
  const { at, entry, ph, free_mg_L, total_mg_L, temperature_C, volume_L } = reading;
  const known = <T>(value: T): Known<T> => ({ value, at, entry });
  const { empty: _empty, ...held } = withTraits(before, reading, reading);
  const full = volume_L === undefined ? held : withVolume(held, known(volume_L));
  const sample: SampleKept = {
    entry,
    at,
    ...(ph !== undefined && { ph }),
    ...(free_mg_L !== undefined && { free_mg_L }),
    ...(total_mg_L !== undefined && { total_mg_L }),
    ...(temperature_C !== undefined && { temperature_C }),
  };
  const { ph: _void, ...voided } = full.voided;
  return {
    ...full,
    readings:
      Object.keys(sample).length > 2 ? [...full.readings, sample].slice(-KEPT.readings) : full.readings,
    ...(ph !== undefined && { ph: known(ph), voided }),
    ...(total_mg_L !== undefined && { total_mg_L: known(total_mg_L), added_since_total_mg_L: 0 }),
    ...(free_mg_L !== undefined && landed(before, known(free_mg_L))),
  };
}

function landed(before: Vessel, free: Known<number>): Pick<Vessel, 'free_mg_L' | 'unlanded' | 'landings'> {
  const landing = landingOf(before, { entry: free.entry, at: free.at, free_mg_L: free.value });
  return {
    free_mg_L: free,
    unlanded: [],
    landings: landing ? [...before.landings, landing].slice(-KEPT.landings) : before.landings,
  };
}
