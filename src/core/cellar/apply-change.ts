import { additiveOf } from './apply-addition.ts';
import type { Entry, VesselChange } from './entry.ts';
import { emptied } from './pour.ts';
import type { Known, Vessel } from './vessel.ts';
import { withTraits, withoutPH } from './with-traits.ts';
import { withoutVolume, withVolume } from './with-volume.ts';

/**
 * A vessel after something that happened to it alone: traits told, racked, topped, emptied, postponed. Volumes are
 * litres. Racking and topping make the volume void unless it was told, an acid makes the pH void; undefined when the
 * vessel is forgotten.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const racked = { entry: 2, at: 5, key: 'k', noted_at: 5, by: 1, kind: 'vessel', event: 'racked', vessels: ['tank 4'], volume_L: 6100 };
 * applyChange(freshVessel('tank 4', racked), racked)?.volume_L?.value // => 6100
 * ```
 */
export function applyChange(before: Vessel, change: Entry & VesselChange): Vessel | undefined {
  const { at, entry, volume_L, event } = change;
  const known = <T>(value: T): Known<T> => ({ value, at, entry });
  switch (event) {
    case 'told':
      return told(before, change);
    case 'racked': {
      const racked = { ...before, handled: { at, entry } };
      return volume_L === undefined
        ? withoutVolume(racked, { event, at })
        : withVolume(racked, known(volume_L));
    }
    case 'topped':
      return withoutVolume(before, { event, at });
    case 'acid':
      return withoutPH(before, event, at);
    case 'emptied':
      return emptied(before, at);
    case 'lot':
      return change.lot === undefined ? before : { ...withoutEmpty(before), lot: known(change.lot) };
    case 'later':
      return change.until === undefined ? before : { ...before, later: change.until };
    case 'unwatched':
      return { ...before, unwatched: true };
    case 'watched': {
      const { unwatched: _unwatched, later: _later, ...watched } = before;
      return watched;
    }
    case 'forgotten':
      return undefined;
    case 'moved':
    case 'blended':
      return before;
  }
}

function withoutEmpty(vessel: Vessel): Vessel {
  const { empty: _empty, ...held } = vessel;
  return held;
}

function told(before: Vessel, change: Entry & VesselChange): Vessel {
  const { at, entry, volume_L, capacity_L, usual } = change;
  const withWords = withTraits(before, change, change);
  const held = withWords === before ? before : withoutEmpty(withWords);
  const full = volume_L === undefined ? held : withVolume(held, { value: volume_L, at, entry });
  return {
    ...full,
    ...(capacity_L !== undefined && { capacity_L: { value: capacity_L, at, entry } }),
    ...(usual !== undefined && { usual: { value: additiveOf(usual), at, entry } }),
  };
}
