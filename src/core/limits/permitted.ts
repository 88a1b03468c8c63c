import type { Region } from './region.ts';
import type { Product, Stage } from '../wine.ts';
import type { AdditiveId } from '../additives/additive-id.ts';
import { ADDITIVES } from '../additives/additives.ts';

/** Why an additive may not go in, by the rule that says so. */
export interface NotPermitted {
  readonly rule: string;
  readonly reason: 'ammonium' | 'sodium' | 'organic' | 'organic-none';
  readonly region: Region;
  /** `unconfirmed`: from memory, or no rule on file that lets it in. */
  readonly confidence: 'read' | 'unconfirmed';
}

/** What the law asks about an additive. */
export interface PermitFacts {
  readonly region?: Region;
  readonly stage?: Stage;
  readonly product?: Product;
  readonly organic?: boolean | 'made-with';
}

/** Markets with a rule on sodium in wine: it stands in no list of what may go into wine. */
const SODIUM_RULES: Readonly<Partial<Record<Region, Pick<NotPermitted, 'rule' | 'confidence'>>>> = {
  oiv: { rule: 'oiv-ii-1.12', confidence: 'read' },
  eu: { rule: 'eu-2019-934-practices', confidence: 'unconfirmed' },
  uk: { rule: 'uk-2019-934-practices', confidence: 'unconfirmed' },
  ar: { rule: 'ar-inv-281-85', confidence: 'read' },
};

/**
 * Why an additive may not go into a wine by the law of a market; `undefined` where nothing on file speaks against it.
 * Ammonium bisulfite is for grapes and must. Sodium salts stand in no list for wine of the OIV, the EU, the UK and
 * Argentina; elsewhere no list was read, so that it is unconfirmed. Organic wine of the EU and the UK takes SO2 and
 * potassium salts only, that of the US no sulfite at all. Potassium salts and SO2 go in everywhere on file.
 *
 * Sources: OIV II.1.12 and Oeno 7/2003 (read); the wine institute of Argentina by Resolution 281/85 (read); Regulation
 * 889/2008 Annex VIIIa (read) and a UK certification body's notice of 17.6.2025 on cider, mead and fruit wine (read);
 * the US agency's page on organic wine (read); sodium in the EU and the UK: from memory.
 *
 * @example
 * ```ts
 * notPermittedBy('sodium-metabisulfite', { region: 'oiv' })?.rule // => 'oiv-ii-1.12'
 * notPermittedBy('potassium-metabisulfite', { region: 'us', organic: true })?.reason // => 'organic-none'
 * notPermittedBy('ammonium-bisulfite-solution', { stage: 'must' }) // => undefined
 * ```
 */
export function notPermittedBy(
  id: AdditiveId,
  { region = 'oiv', stage, product, organic = false }: PermitFacts,
): NotPermitted | undefined {
  const { contains } = ADDITIVES[id];
  if (region === 'us' && organic === true)
    return { rule: 'us-organic', reason: 'organic-none', region, confidence: 'read' };
  const isOtherThanPotassium = contains === 'sodium' || contains === 'ammonium';
  if (organic !== false && (region === 'eu' || region === 'uk') && isOtherThanPotassium)
    return { rule: `${region}-organic-sources`, reason: 'organic', region, confidence: 'read' };
  if (contains === 'ammonium' && stage !== 'must')
    return {
      rule: 'oiv-ii-1.12',
      reason: 'ammonium',
      region,
      confidence: region === 'oiv' ? 'read' : 'unconfirmed',
    };
  // The rules on sodium speak of wine alone.
  const isWine = product === undefined || product === 'alcohol-free';
  if (contains !== 'sodium' || !isWine) return undefined;
  const rule = SODIUM_RULES[region] ?? { rule: 'no-list-read', confidence: 'unconfirmed' };
  return { ...rule, reason: 'sodium', region };
}
