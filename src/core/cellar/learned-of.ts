import { joinBinding, learnBinding, type Learned } from '../binding/learned.ts';
import type { Vessel } from './vessel.ts';

/**
 * What the wine in a vessel has bound of what was added to it: by its own landings, and where it was mixed by what its
 * wines bound before. Undefined where fewer than two additions tell. Shares from 0 to 1.
 *
 * Source: `learnBinding`.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const landing = { entry: 3, at: 9, additions: [2], added_at: 5, added_mg_L: 30, before_at: 4, before_mg_L: 18, after_mg_L: 36, bound_share: 0.4 };
 * learnedOf({ ...freshVessel('tank 4', { entry: 1, at: 0 }), landings: [landing, landing] })?.share // => 0.4
 * learnedOf(freshVessel('tank 4', { entry: 1, at: 0 })) // => undefined
 * ```
 */
export function learnedOf(vessel: Pick<Vessel, 'landings' | 'bound_before'>): Learned | undefined {
  return joinBinding(vessel.bound_before, learnBinding(vessel.landings));
}
