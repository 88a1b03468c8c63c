import { assertWithinBounds } from '../bounds.ts';
import type { AdditiveAtHand } from './additive-id.ts';
import { ADDITIVES } from './additives.ts';
import { readStrength } from './read-strength.ts';

/**
 * How much SO2 one unit of an additive gives, as the figures that are multiplied to get it.
 * `of` names which of them there are; the working shows them one by one.
 */
export type SO2Content =
  | { readonly of: 'salt'; readonly per: 'g'; readonly share: number }
  | { readonly of: 'assay'; readonly per: 'g'; readonly share: number; readonly assay_share: number }
  | { readonly of: 'yield'; readonly per: 'g'; readonly fraction: number }
  | { readonly of: 'gas'; readonly per: 'g'; readonly purity_share: number }
  | {
      readonly of: 'salt-solution';
      readonly per: 'mL';
      readonly salt_g_per_100_mL: number;
      readonly share: number;
    }
  | { readonly of: 'SO2-solution'; readonly per: 'mL'; readonly SO2_g_per_100_mL: number }
  | { readonly of: 'SO2-tablet'; readonly per: 'tablet'; readonly SO2_g: number }
  | {
      readonly of: 'salt-tablet';
      readonly per: 'tablet';
      readonly salt_g: number;
      /** SO2 in a gram of that salt, 0 to 1. */
      readonly share: number;
    };

function ofPowder(additive: AdditiveAtHand): SO2Content {
  const { SO2_share: share } = ADDITIVES[additive.id];
  if (additive.strength_percent === undefined) return { of: 'salt', per: 'g', share };
  const fraction = additive.strength_percent / 100;
  return kindOf(additive) === 'SO2-yield'
    ? { of: 'yield', per: 'g', fraction }
    : { of: 'assay', per: 'g', share, assay_share: fraction };
}

function kindOf(additive: AdditiveAtHand): string {
  const percent = additive.strength_percent ?? Number.NaN;
  // The reader has asked where a name could mean two things; here the name is settled.
  const read = readStrength(additive.id, percent, additive.strength_of === 'salt', true);
  if ('kind' in read) return read.kind;
  throw new RangeError(
    `Cannot work out the SO2 in ${additive.id} as its strength must be one that can be read: current value is ${percent} % (${read.problem})`,
  );
}

/**
 * How much SO2 a gram, a millilitre or a tablet of an additive gives.
 *
 * @returns `undefined` when a strength or a size is missing, so that nothing can be said
 * @throws RangeError for a strength or size that cannot be (`read-strength`, `BOUNDS`)
 *
 * Source: shares from `ADDITIVES`; strengths and sizes as stated on the label.
 *
 * @example
 * ```ts
 * SO2ContentOf({ id: 'potassium-metabisulfite-solution', strength_percent: 10 })?.per // => 'mL'
 * SO2ContentOf({ id: 'sulfur-dioxide-solution' }) // => undefined
 * ```
 */
export function SO2ContentOf(additive: AdditiveAtHand): SO2Content | undefined {
  const { kind, SO2_share: share } = ADDITIVES[additive.id];
  assertWithinBounds('work out the SO2 in a tablet', 'tablet_salt_g', additive.tablet_salt_g);
  assertWithinBounds('work out the SO2 in a tablet', 'tablet_SO2_g', additive.tablet_SO2_g);
  if (kind === 'tablet') {
    if (additive.tablet_SO2_g === undefined) return undefined;
    return { of: 'SO2-tablet', per: 'tablet', SO2_g: additive.tablet_SO2_g };
  }
  if (kind === 'gas') {
    if (additive.strength_percent === undefined) return { of: 'gas', per: 'g', purity_share: 1 };
    kindOf(additive);
    return { of: 'gas', per: 'g', purity_share: additive.strength_percent / 100 };
  }
  if (kind === 'powder') {
    const powder = ofPowder(additive);
    if (additive.tablet_salt_g === undefined) return powder;
    return { of: 'salt-tablet', per: 'tablet', salt_g: additive.tablet_salt_g, share: SO2Per(powder) };
  }
  if (additive.strength_percent === undefined) return undefined;
  return kindOf(additive) === 'SO2-per-100mL'
    ? { of: 'SO2-solution', per: 'mL', SO2_g_per_100_mL: additive.strength_percent }
    : { of: 'salt-solution', per: 'mL', salt_g_per_100_mL: additive.strength_percent, share };
}

/**
 * Grams of SO2 in one unit (gram, millilitre, tablet).
 *
 * @example
 * ```ts
 * SO2Per({ of: 'SO2-solution', per: 'mL', SO2_g_per_100_mL: 6 }) // => 0.06
 * SO2Per({ of: 'yield', per: 'g', fraction: 0.57 }) // => 0.57
 * ```
 */
export function SO2Per(content: SO2Content): number {
  switch (content.of) {
    case 'salt':
      return content.share;
    case 'assay':
      return content.share * content.assay_share;
    case 'yield':
      return content.fraction;
    case 'gas':
      return content.purity_share;
    case 'salt-solution':
      return (content.salt_g_per_100_mL / 100) * content.share;
    case 'SO2-solution':
      return content.SO2_g_per_100_mL / 100;
    case 'SO2-tablet':
      return content.SO2_g;
    case 'salt-tablet':
      return content.salt_g * content.share;
  }
}
