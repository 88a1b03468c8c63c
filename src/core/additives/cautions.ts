import type { AdditiveId } from './additive-id.ts';
import { ADDITIVES } from './additives.ts';

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

/**
 * The cautions that go with an additive, in the order to show them.
 *
 * @example
 * ```ts
 * cautionsOf('sulfur-dioxide-gas')[0] // => 'trained-people-with-breathing-apparatus'
 * ```
 */
export function cautionsOf(id: AdditiveId): readonly CautionId[] {
  return ADDITIVES[id].cautions;
}
