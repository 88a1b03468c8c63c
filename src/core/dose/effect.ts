import { pKOf } from '../chemistry/dissociation.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';
import type { EffectAnswer, Warning } from './answer.ts';
import { checkAmount, checkFacts } from './check-request.ts';
import { effectSteps } from './effect-steps.ts';
import { fallbackWarnings } from './fallback-warning.ts';
import { givenBy } from './given-amount.ts';
import { landing } from './landing.ts';
import type { EffectRequest } from './request.ts';
import { decidingLimit, limitsOn, roomToLimit } from './room-to-limit.ts';
import { additionWarnings, factWarnings, stageNotOverWarnings } from './shared-warnings.ts';
import { inOrder } from './warnings.ts';

/**
 * What an amount in a volume, or a rate of additive, does to a wine: mg/L of SO2, and with readings where it lands.
 * Volumes in L, SO2 in mg/L, additive in g, mL or tablets, a rate in mg of additive per L.
 *
 * @param request an amount or a rate; every reading may be unknown
 * @throws RangeError for figures outside `BOUNDS`
 *
 * Source: shares of SO2 from `additives`; OIV-MA-AS323-04C (formula, read).
 *
 * @example
 * ```ts
 * effect({ rate_mg_L: 100, additive: { id: 'potassium-metabisulfite' }, stage: 'finished', stageStated: false, toStopFermentation: false, basis: 'pk-1.81' }).adds_mg_L // => 57.629
 * effect({ mass_g: 100, volume_L: 2000, additive: { id: 'potassium-metabisulfite' }, stage: 'finished', stageStated: false, toStopFermentation: false, basis: 'pk-1.81' }).adds_mg_L // => 28.8145
 * ```
 */
export function effect(request: EffectRequest): EffectAnswer {
  checkFacts('tell the effect', request);
  checkAmount('tell the effect', request);
  const { ph, free_mg_L } = request;
  const { content, ...given } = givenBy(request);
  const { adds_mg_L } = given;
  const dissociation = pKOf(request.basis, request.alcohol_percent, request.temperature_C);
  const { pK } = dissociation;
  const after = adds_mg_L === undefined ? {} : landing(request, adds_mg_L, adds_mg_L, pK);
  const lands = 'molecular_after_mg_L' in after;
  const room = roomToLimit(request);
  const limit = adds_mg_L === undefined ? undefined : decidingLimit(room, adds_mg_L);
  const warnings: Warning[] = [...factWarnings(request), ...stageNotOverWarnings(request.stage)];
  if (request.toStopFermentation) {
    warnings.push({
      code: 'does-not-stop-fermentation',
      values: adds_mg_L === undefined ? {} : { adds_mg_L },
    });
  }
  if (adds_mg_L !== undefined) {
    const readings = {
      ...(free_mg_L === undefined ? {} : { free_mg_L }),
      ...(free_mg_L === undefined || ph === undefined
        ? {}
        : { molecular_mg_L: molecularSO2(free_mg_L, ph, pK) }),
    };
    const from = request.total_from === undefined ? {} : { total_from: request.total_from };
    warnings.push(...additionWarnings({ dose_mg_L: adds_mg_L, ...readings, ...after, ...from }, room));
    if (lands && ph !== undefined) warnings.push(...fallbackWarnings(dissociation, { ph, ...readings }));
  }
  return {
    ...given,
    ...after,
    ...(lands ? { pK, basis: dissociation.basis } : {}),
    ...(limit === undefined ? {} : { limit, limits: limitsOn(room) }),
    warnings: inOrder(warnings),
    steps: effectSteps({
      request,
      ...(content === undefined ? {} : { content }),
      ...(lands ? { dissociation } : {}),
      leadsTo: adds_mg_L ?? given.SO2_g,
    }),
  };
}
