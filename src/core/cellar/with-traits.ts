import type { Stage } from '../wine.ts';
import type { Entry, WineTraits } from './entry.ts';
import { TRAIT_NAMES } from './trait-names.ts';
import type { Happened, Known, KnownTraits, Vessel } from './vessel.ts';

/**
 * A vessel with what was told of its wine: alcohol in % vol, sugar in g/L. Wine that goes into malolactic or comes out
 * of it has another pH from then on, so that the pH known before is void, and binds otherwise than before.
 *
 * Source: common practice, no source (malolactic fermentation raises the pH).
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const told = { entry: 2, at: 5, key: 'k', noted_at: 5, by: 1, kind: 'vessel', event: 'told', vessels: ['tank 4'] };
 * withTraits(freshVessel('tank 4', told), { style: 'red' }, told).traits.style?.value // => 'red'
 * ```
 */
export function withTraits(vessel: Vessel, told: WineTraits, { at, entry }: Entry): Vessel {
  const fresh = TRAIT_NAMES.flatMap((name) => {
    const value = told[name];
    return value === undefined ? [] : [[name, { value, at, entry } satisfies Known<unknown>] as const];
  });
  if (fresh.length === 0) return vessel;
  const traits: KnownTraits = { ...vessel.traits, ...Object.fromEntries(fresh) };
  const isBottled = told.stage === 'bottled' && vessel.traits.stage?.value !== 'bottled';
  const changed = { ...vessel, traits, ...(isBottled && { handled: { at, entry } }) };
  const before = vessel.traits.stage?.value;
  if (isFermented(before, told.stage))
    return withoutPH({ ...asNewWine(changed, { at, entry }), unlanded: [] }, 'fermentation', at);
  const isMalolactic = told.stage !== undefined && told.stage !== before;
  if (!isMalolactic || (before !== 'malolactic' && told.stage !== 'malolactic')) return changed;
  return withoutPH(asNewWine(changed, { at, entry }), 'malolactic', at);
}

/** A wine that binds otherwise than before: what was learned of it holds no longer. */
function asNewWine(vessel: Vessel, changed: Happened): Vessel {
  const { bound_before: _bound, ...others } = vessel;
  return { ...others, landings: [], changed };
}

/** Whether what was must is wine now: its pH is another, and what went into the must has bound. */
function isFermented(before: Stage | undefined, now: Stage | undefined): boolean {
  const isMust = before === 'must' || before === 'fermenting';
  return isMust && now !== undefined && now !== 'must' && now !== 'fermenting';
}

/**
 * A vessel whose pH is void since an event (time in milliseconds), if it was known at all.
 *
 * Source: common practice, no source.
 *
 * @example
 * ```ts
 * import { freshVessel } from './fresh-vessel.ts';
 * const known = { ...freshVessel('tank 4', { entry: 1, at: 0 }), ph: { value: 3.5, at: 0, entry: 1 } };
 * withoutPH(known, 'acid', 7).voided.ph // => { event: 'acid', at: 7 }
 * ```
 */
export function withoutPH(
  vessel: Vessel,
  event: 'fermentation' | 'malolactic' | 'acid' | 'blended',
  at: number,
): Vessel {
  const { ph, ...others } = vessel;
  return ph === undefined ? vessel : { ...others, voided: { ...vessel.voided, ph: { event, at } } };
}
