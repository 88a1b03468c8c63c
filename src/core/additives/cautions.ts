import type { AdditiveId } from './additive-id.ts';

/**
 * What to beware of, by id; the sentences are the locales'. Sources: International Chemical Safety Cards 0074, 1134,
 * 1175, 1254 and data sheets (read); ammonium for grapes and must only: OIV II.1.12, Oeno 7/2003 (read);
 * foaming in wine full of CO2 and measuring again after a day: common practice, no source.
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
  'asthma',
  'dissolve-first',
  'foams-with-carbon-dioxide',
  'mix-and-measure-again',
  'label-and-rules-first',
] as const;
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

/**
 * The cautions that go with an additive, in the order to show them.
 *
 * @example
 * ```ts
 * cautionsOf('sulfur-dioxide-gas')[0] // => 'trained-people-with-breathing-apparatus'
 * ```
 */
export function cautionsOf(id: AdditiveId): readonly CautionId[] {
  return CAUTIONS[id];
}
