import type { Known, Vessel, Voided } from './vessel.ts';

/**
 * A vessel with its volume in litres as it was told; it holds wine then.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * withVolume(freshVessel('tank 4', { entry: 1, at: 0 }), { value: 5200, at: 0, entry: 1 }).volume_L?.value // => 5200
 * ```
 */
export function withVolume(vessel: Vessel, volume_L: Known<number>): Vessel {
  const { empty: _empty, ...held } = vessel;
  const { volume_L: _void, ...voided } = vessel.voided;
  return { ...held, volume_L, voided };
}

/**
 * A vessel whose volume (litres) is another since an event, and not known.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const known = withVolume(freshVessel('tank 4', { entry: 1, at: 0 }), { value: 5200, at: 0, entry: 1 });
 * withoutVolume(known, { event: 'racked', at: 9 }).volume_L // => undefined
 * ```
 */
export function withoutVolume(vessel: Vessel, why: Voided): Vessel {
  const { volume_L, ...others } = vessel;
  return volume_L === undefined ? vessel : { ...others, voided: { ...vessel.voided, volume_L: why } };
}
