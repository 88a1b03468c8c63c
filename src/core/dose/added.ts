import type { AdditiveAtHand } from '../additives/additive-id.ts';
import { SO2ContentOf } from '../additives/so2-content.ts';
import { pKOf } from '../chemistry/dissociation.ts';
import type { AddedAnswer } from './answer.ts';
import { checkAmount, checkFacts } from './check-request.ts';
import { doseSteps } from './dose-steps.ts';
import { effectSteps } from './effect-steps.ts';
import { givenBy } from './given-amount.ts';
import { limitWarnings } from './limit-warnings.ts';
import { portionOf } from './portion.ts';
import type { AddedRequest } from './request.ts';
import { decidingLimit, roomToLimit } from './room-to-limit.ts';
import { factWarnings } from './shared-warnings.ts';
import { inOrder } from './warnings.ts';

/**
 * What follows from an addition that was made: its mg/L of SO2 where the volume is known, its SO2 in grams, and the
 * amount of the additive where only the mg/L was said. Volumes in L, additive in g, mL or tablets.
 *
 * @param request exactly one amount; volume and additive may be unknown
 * @throws RangeError for figures outside `BOUNDS`
 *
 * Source: shares of SO2 from `additives`.
 *
 * @example
 * ```ts
 * added({ mass_g: 82, additive: { id: 'potassium-metabisulfite' } }).SO2_g // => 47.2558
 * added({ added_mg_L: 26, volume_L: 1000, additive: { id: 'potassium-metabisulfite' } }).mass_g // => 45.116
 * added({ added_mg_L: 26 }) // => { added_mg_L: 26, warnings: [], steps: [] }
 * ```
 */
export function added(request: AddedRequest): AddedAnswer {
  checkFacts('enter an addition', request);
  checkAmount('enter an addition', request);
  const { mass_g, additive_volume_mL, tablets, added_mg_L, additive } = request;
  const { content, adds_mg_L, ...given } = givenBy(request);
  if (added_mg_L !== undefined && given.SO2_g !== undefined && additive !== undefined) {
    return fromConcentration(request, added_mg_L, additive);
  }
  const steps = effectSteps({
    request,
    ...(content === undefined ? {} : { content }),
    leadsTo: adds_mg_L ?? given.SO2_g,
  });
  return {
    ...(adds_mg_L === undefined ? {} : { added_mg_L: adds_mg_L }),
    ...(mass_g === undefined ? {} : { mass_g }),
    ...(additive_volume_mL === undefined ? {} : { additive_volume_mL }),
    ...(tablets === undefined ? {} : { tablets }),
    ...given,
    ...afterAddition(request, adds_mg_L),
    steps,
  };
}

/** Whether the additive may go in at all, and how the total stands once it is in, where the total before it is known. */
function afterAddition(
  request: AddedRequest,
  added_mg_L: number | undefined,
): Pick<AddedAnswer, 'total_after_mg_L' | 'limit' | 'warnings'> {
  const { total_mg_L, total_from } = request;
  const against = factWarnings(request).filter(({ code }) => code === 'additive-not-permitted');
  if (total_mg_L === undefined || added_mg_L === undefined) return { warnings: against };
  const room = roomToLimit(request);
  const limit = decidingLimit(room, added_mg_L);
  return {
    total_after_mg_L: total_mg_L + added_mg_L,
    ...(limit === undefined ? {} : { limit }),
    warnings: inOrder([
      ...against,
      ...limitWarnings(room, added_mg_L, total_from === undefined ? {} : { total_from }),
    ]),
  };
}

/** Only the mg/L was said: how much of the additive that was. */
function fromConcentration(request: AddedRequest, added_mg_L: number, additive: AdditiveAtHand): AddedAnswer {
  const { volume_L } = request;
  const add = { target: { add_mg_L: added_mg_L }, targetStated: true } as const;
  const { shown, rounded } = portionOf({ ...request, additive }, added_mg_L) ?? {};
  const { SO2_g, mass_g, additive_volume_mL, tablets } = shown ?? {};
  const content = SO2ContentOf(additive);
  const steps = doseSteps({
    request: {
      ...add,
      additive,
      ...(volume_L === undefined ? {} : { volume_L }),
      ...(request.volume_display === undefined ? {} : { volume_display: request.volume_display }),
      stage: 'finished',
      stageStated: false,
      basis: 'pk-1.81',
    },
    dissociation: pKOf('pk-1.81'),
    aim: { add_mg_L: added_mg_L, dose_mg_L: added_mg_L },
    ...(content === undefined ? {} : { content }),
    ...(rounded === undefined ? {} : { rounded }),
  });
  return {
    added_mg_L,
    ...(SO2_g === undefined ? {} : { SO2_g }),
    ...(mass_g === undefined ? {} : { mass_g }),
    ...(additive_volume_mL === undefined ? {} : { additive_volume_mL }),
    ...(tablets === undefined ? {} : { tablets }),
    ...afterAddition(request, added_mg_L),
    steps,
  };
}
