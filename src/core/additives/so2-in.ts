import { assertWithinBounds } from '../bounds.ts';
import type { AdditiveAtHand } from './additive-id.ts';
import { ADDITIVES } from './additives.ts';
import { SO2ContentOf, SO2Per } from './so2-content.ts';

/** An amount of an additive as it is measured: grams, millilitres or tablets. */
export interface AdditiveAmount {
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  readonly tablets?: number;
}

/**
 * Grams of SO2 in an amount of an additive.
 *
 * A mass of effervescent tablets is grams of SO2 (their size is), a mass of small plain tablets grams of the salt.
 *
 * @returns g, or `undefined` where it does not follow (a solution by mass, a powder by volume, no strength)
 * @throws RangeError for amounts outside `BOUNDS`
 *
 * Source: `SO2ContentOf`.
 *
 * @example
 * ```ts
 * SO2In({ mass_g: 100 }, { id: 'potassium-metabisulfite' }) // => 57.629
 * SO2In({ additive_volume_mL: 350 }, { id: 'potassium-metabisulfite-solution', strength_percent: 10 }) // => 20.170
 * SO2In({ tablets: 3 }, { id: 'potassium-metabisulfite', tablet_salt_g: 0.44 }) // => 0.7607
 * SO2In({ mass_g: 100 }, { id: 'sulfur-dioxide-solution', strength_percent: 6 }) // => undefined
 * ```
 */
export function SO2In(amount: AdditiveAmount, additive: AdditiveAtHand): number | undefined {
  const { mass_g, additive_volume_mL, tablets } = amount;
  assertWithinBounds('work out SO2', 'mass_g', mass_g);
  assertWithinBounds('work out SO2', 'additive_volume_mL', additive_volume_mL);
  assertWithinBounds('work out SO2', 'tablets', tablets);
  if (mass_g !== undefined) {
    if (additive.id === 'tablet') return mass_g;
    const content = SO2ContentOf(withoutTablets(additive));
    return content?.per === 'g' ? mass_g * SO2Per(content) : undefined;
  }
  const content = SO2ContentOf(additive);
  if (content === undefined) return undefined;
  if (additive_volume_mL !== undefined && content.per === 'mL') return additive_volume_mL * SO2Per(content);
  if (tablets !== undefined && content.per === 'tablet') return tablets * SO2Per(content);
  return undefined;
}

/**
 * The same additive by weight, whatever the size of its tablets.
 *
 * @example
 * ```ts
 * withoutTablets({ id: 'potassium-metabisulfite', tablet_salt_g: 0.44 }) // => { id: 'potassium-metabisulfite' }
 * ```
 */
export function withoutTablets(additive: AdditiveAtHand): AdditiveAtHand {
  if (ADDITIVES[additive.id].kind !== 'powder' || additive.tablet_salt_g === undefined) return additive;
  const { tablet_salt_g: _size, ...powder } = additive;
  return powder;
}
