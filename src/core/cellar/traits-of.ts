import type { WineTraits } from './entry.ts';
import type { Vessel } from './vessel.ts';

/**
 * What is told of a vessel's wine as it stands now, without when it was told: alcohol in % vol, sugar in g/L, density in
 * kg/L, what is kept for bottling in mg/L. Nothing where nothing was told. The law of a wine hangs on all of it.
 *
 * @example
 * ```ts
 * traitsOf({ traits: { style: { value: 'red', at: 5, entry: 2 } } }) // => { style: 'red' }
 * ```
 */
export function traitsOf({ traits }: Pick<Vessel, 'traits'>): WineTraits {
  return Object.fromEntries(Object.entries(traits).map(([trait, { value }]) => [trait, value]));
}
