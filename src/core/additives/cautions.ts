import type { AdditiveId } from './additive-id.ts';

/**
 * What to beware of, by id; the sentences are the locales'. Sources: International Chemical Safety Cards 0074, 1134,
 * 1175, 1254 and data sheets (read); ammonium for grapes and must only: OIV II.1.12, Oeno 7/2003 (read);
 * foaming in wine full of CO2, crushing plain tablets and measuring again after a day: common practice, no source.
 *
 * @example
 * ```ts
 * CAUTION_IDS.includes('asthma') // => true
 * ```
 */
export const CAUTION_IDS = [
  'trained-people-with-breathing-apparatus',
  'grapes-and-must-only',
  'ventilate',
  'never-lean-in',
  'gloves-goggles',
  'no-acid-no-chlorine',
  'no-other-acid-no-chlorine',
  'asthma',
  'crush-first',
  'dissolve-first',
  'foams-with-carbon-dioxide',
  'mix-and-measure-again',
  'label-and-rules-first',
] as const;
/** The id of a caution; its sentence is `caution-<id>` in the locales. */
export type CautionId = (typeof CAUTION_IDS)[number];

const AROUND: readonly CautionId[] = [
  'ventilate',
  'never-lean-in',
  'gloves-goggles',
  'no-acid-no-chlorine',
  'asthma',
];
const AFTER: readonly CautionId[] = ['mix-and-measure-again', 'label-and-rules-first'];
const POWDER: readonly CautionId[] = [...AROUND, 'dissolve-first', 'foams-with-carbon-dioxide', ...AFTER];
const DISSOLVED: readonly CautionId[] = [...AROUND, 'foams-with-carbon-dioxide', ...AFTER];

const CAUTIONS: Readonly<Record<AdditiveId, readonly CautionId[]>> = {
  'potassium-metabisulfite': POWDER,
  'sodium-metabisulfite': POWDER,
  'potassium-metabisulfite-solution': DISSOLVED,
  'sodium-metabisulfite-solution': DISSOLVED,
  'potassium-bisulfite-solution': DISSOLVED,
  'ammonium-bisulfite-solution': ['grapes-and-must-only', ...DISSOLVED],
  'sulfur-dioxide-solution': DISSOLVED,
  'sulfur-dioxide-gas': ['trained-people-with-breathing-apparatus', ...AROUND, ...AFTER],
  tablet: DISSOLVED,
};

/** Where an additive goes. */
export type CautionUse = 'wine' | 'water' | 'water-with-acid';

/** What only wine asks for: a stock in water neither foams nor is measured again. */
const IN_WINE_ONLY: readonly CautionId[] = [
  'grapes-and-must-only',
  'crush-first',
  'dissolve-first',
  'foams-with-carbon-dioxide',
  'mix-and-measure-again',
];

/**
 * The cautions that go with an additive, in the order to show them.
 *
 * @param use where it goes: into wine, into water for a stock, or into water with citric acid
 * @param asTablets whether it comes as small plain tablets, which are crushed and then dissolved
 *
 * @example
 * ```ts
 * cautionsOf('sulfur-dioxide-gas')[0] // => 'trained-people-with-breathing-apparatus'
 * cautionsOf('potassium-metabisulfite', 'water').includes('foams-with-carbon-dioxide') // => false
 * cautionsOf('potassium-metabisulfite', 'wine', true).includes('crush-first') // => true
 * ```
 */
export function cautionsOf(
  id: AdditiveId,
  use: CautionUse = 'wine',
  asTablets = false,
): readonly CautionId[] {
  const all = CAUTIONS[id].map((one) => {
    if (one === 'no-acid-no-chlorine' && use === 'water-with-acid') return 'no-other-acid-no-chlorine';
    return one === 'dissolve-first' && asTablets ? 'crush-first' : one;
  });
  return use === 'wine' ? all : all.filter((one) => !IN_WINE_ONLY.includes(one));
}
