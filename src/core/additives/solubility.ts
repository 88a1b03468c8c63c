import type { SourceKey } from '../sources.ts';
import type { AdditiveId } from './additive-id.ts';

/** How much of a salt a litre of water takes, as it was published. */
export interface Solubility {
  readonly salt_g_per_L: number;
  readonly at_C: number;
  readonly source: SourceKey;
}

/**
 * Published solubilities, g in a litre, the least first: the two of the potassium salt disagree, and the least is the
 * bound. No table over temperature could be read, so that nothing is known below the temperature that stands here.
 *
 * @example
 * ```ts
 * SOLUBILITIES['potassium-metabisulfite'][0]?.salt_g_per_L // => 250
 * ```
 */
export const SOLUBILITIES = {
  'potassium-metabisulfite': [
    { salt_g_per_L: 250, at_C: 20, source: 'food-additives-data-book' },
    { salt_g_per_L: 450, at_C: 20, source: 'encyclopedia-page' },
  ],
  'sodium-metabisulfite': [{ salt_g_per_L: 470, at_C: 25, source: 'sodium-data-sheet' }],
} as const satisfies Readonly<Partial<Record<AdditiveId, readonly Solubility[]>>>;

/** A powder whose solubility is on file. */
export type SolublePowder = keyof typeof SOLUBILITIES;

/** Below the published temperature a stock may hold this share of the bound, as no figure is known there (own threshold). */
const SHARE_WHEN_COLDER = 0.5;

/**
 * Whether a stock surely dissolves: at most the least published figure, and in colder water at most half of it.
 *
 * @param salt_g_per_L grams in a litre, not negative
 * @param temperature_C °C of the water; unknown counts as the published temperature
 *
 * Source: `SOLUBILITIES`.
 *
 * @example
 * ```ts
 * dissolves('potassium-metabisulfite', 250) // => true
 * dissolves('potassium-metabisulfite', 251) // => false
 * dissolves('potassium-metabisulfite', 200, 8) // => false
 * ```
 */
export function dissolves(id: SolublePowder, salt_g_per_L: number, temperature_C?: number): boolean {
  const [least] = SOLUBILITIES[id];
  const isColder = temperature_C !== undefined && temperature_C < least.at_C;
  return salt_g_per_L <= least.salt_g_per_L * (isColder ? SHARE_WHEN_COLDER : 1) * (1 + 1e-9);
}
