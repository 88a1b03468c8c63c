import type { AdditiveAtHand } from '../additives/additive-id.ts';
import { SO2ContentOf, SO2Per, type SO2Content } from '../additives/so2-content.ts';
import { SO2In, withoutTablets } from '../additives/so2-in.ts';
import type { AddedRequest } from './request.ts';

/** What follows from an amount, a rate or a concentration that is given, as far as it does. */
export interface Given {
  readonly SO2_g?: number;
  /** mg/L of SO2. */
  readonly adds_mg_L?: number;
  /** g of additive where a rate meets a volume. */
  readonly mass_g?: number;
  readonly content?: SO2Content;
}

const byWeight = (additive: AdditiveAtHand): SO2Content | undefined => {
  if (additive.id === 'tablet') return { of: 'SO2-tablet', per: 'tablet', SO2_g: 1 };
  return SO2ContentOf(withoutTablets(additive));
};

function fromRate(request: AddedRequest, rate_mg_L: number): Given {
  const { volume_L, additive } = request;
  const mass = volume_L === undefined ? {} : { mass_g: (rate_mg_L * volume_L) / 1000 };
  const content = additive === undefined ? undefined : byWeight(additive);
  if (content === undefined || content.per === 'mL') return mass;
  const adds_mg_L = rate_mg_L * SO2Per(content);
  const SO2 = volume_L === undefined ? {} : { SO2_g: (adds_mg_L * volume_L) / 1000 };
  return { ...SO2, adds_mg_L, ...mass, content };
}

/**
 * What an amount, a rate of additive (mg/L) or a concentration of SO2 (mg/L) that is given comes to.
 *
 * @param request amount in g, mL or tablets; volume in L
 *
 * @example
 * ```ts
 * givenBy({ rate_mg_L: 100, additive: { id: 'potassium-metabisulfite' } }).adds_mg_L // => 57.629
 * givenBy({ mass_g: 100, volume_L: 2000, additive: { id: 'potassium-metabisulfite' } }).adds_mg_L // => 28.8145
 * givenBy({ mass_g: 100 }) // => {}
 * ```
 */
export function givenBy(request: AddedRequest): Given {
  const { volume_L, additive, rate_mg_L, added_mg_L } = request;
  if (rate_mg_L !== undefined) return fromRate(request, rate_mg_L);
  if (added_mg_L !== undefined) {
    const SO2 = volume_L === undefined ? {} : { SO2_g: (added_mg_L * volume_L) / 1000 };
    return { ...SO2, adds_mg_L: added_mg_L };
  }
  if (additive === undefined) return {};
  const SO2_g = SO2In(request, additive);
  if (SO2_g === undefined) return {};
  const content = request.mass_g === undefined ? SO2ContentOf(additive) : byWeight(additive);
  return {
    SO2_g,
    ...(volume_L === undefined ? {} : { adds_mg_L: (SO2_g * 1000) / volume_L }),
    ...(content === undefined ? {} : { content }),
  };
}
