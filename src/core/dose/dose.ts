import { SO2ContentOf } from '../additives/so2-content.ts';
import { bindingCovered } from '../binding/allowance.ts';
import { pKOf, type Dissociation } from '../chemistry/dissociation.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';
import { STAGES_WITHOUT_TARGET, type Target } from '../wine.ts';
import { aimAt, type Aim } from './aim.ts';
import { afterMust, MALOLACTIC_UNHARMED_mg_L } from './after-must.ts';
import type { DoseAnswer, Warning } from './answer.ts';
import { capped } from './capped.ts';
import { checkDoseRequest } from './check-request.ts';
import { choicesFor } from './choices.ts';
import { doseSteps } from './dose-steps.ts';
import { fallbackWarnings } from './fallback-warning.ts';
import { landing } from './landing.ts';
import { oxygenLoss, SO2_PER_OXYGEN_MEASURED } from './oxygen-loss.ts';
import { portionOf, type Portioned } from './portion.ts';
import { redAmountWarnings } from './red-amount.ts';
import type { DoseRequest } from './request.ts';
import { decidingLimit, limitsOn, roomToLimit } from './room-to-limit.ts';
import { isRoundingCoarse } from './rounding.ts';
import {
  additionWarnings,
  factWarnings,
  smellWarnings,
  stageNotOverWarnings,
  stageWarnings,
} from './shared-warnings.ts';
import { FREE_NEED_HIGH_mg_L } from './thresholds.ts';
import { smallnessWarnings } from './smallness-warnings.ts';
import { startWarnings } from './start-warnings.ts';
import { inOrder } from './warnings.ts';

/**
 * The answer to a question for a dose, as far as it is known: molecular SO2 now, free SO2 needed, mg/L to add, what
 * to weigh, where the wine lands, the working and the warnings. Volumes in L, SO2 in mg/L, additive in g, mL, tablets.
 * Without a target, or at a stage that has none of its own, it says the molecular SO2 and gives no dose.
 *
 * @param request readings and what is aimed at; every reading may be unknown
 * @throws RangeError for figures outside `BOUNDS`; TypeError for an allowance and a share that binds at once
 *
 * Source: OIV-MA-AS323-04C (formula, read); the constant of the basis (`chemistry/dissociation`).
 *
 * @example
 * ```ts
 * dose({ volume_L: 5488.8470868, ph: 3.58, free_mg_L: 21, additive: { id: 'potassium-metabisulfite' }, target: { molecular_mg_L: 0.8 }, targetStated: false, stage: 'finished', stageStated: false, basis: 'pk-1.81' }).measure // => { value: 256, unit: 'g' }
 * dose({ ph: 3.58, target: { molecular_mg_L: 0.8 }, targetStated: false, stage: 'finished', stageStated: false, basis: 'pk-1.81' }).target_free_mg_L // => 47.907
 * ```
 */
export function dose(request: DoseRequest): DoseAnswer {
  checkDoseRequest(request);
  const { ph, free_mg_L } = request;
  const dissociation = pKOf(request.basis, request.alcohol_percent, request.temperature_C);
  const { pK } = dissociation;
  const target = targetOf(request);
  const molecular_mg_L =
    ph === undefined || free_mg_L === undefined ? undefined : molecularSO2(free_mg_L, ph, pK);
  const now = {
    ...(molecular_mg_L === undefined ? {} : { molecular_mg_L }),
    ...(ph === undefined ? {} : { pK, basis: dissociation.basis }),
  };
  const aim = target === undefined ? {} : aimAt(target, request, pK);
  const asked = target === undefined ? withoutTarget(request) : { ...request, target };
  const room = roomToLimit(request);
  const portioned =
    aim.dose_mg_L === undefined ? undefined : portionOf(request, aim.dose_mg_L, room.ceiling_mg_L);
  const content =
    portioned === undefined || request.additive === undefined ? undefined : SO2ContentOf(request.additive);
  const after = aim.add_mg_L === undefined ? {} : landing(request, aim.add_mg_L, aim.dose_mg_L ?? 0, pK);
  const warnings: Warning[] = [...factWarnings(request), ...basisWarnings(asked, dissociation)];
  if (target === undefined) {
    const standing = { ...freeOf(request), ...totalOf(request), ...now };
    warnings.push(
      ...stageWarnings(request.stage),
      ...startWarnings(request.stage, standing),
      ...smellWarnings(now),
    );
  } else {
    warnings.push(...stageNotOverWarnings(request.stage));
    if (!request.stageStated) warnings.push({ code: 'stage-assumed', values: { stage: request.stage } });
    warnings.push(...redAmountWarnings(asked, pK, room), ...aimWarnings(asked, aim, portioned));
    warnings.push(
      ...(aim.dose_mg_L === undefined
        ? smellWarnings(now)
        : additionWarnings(
            { dose_mg_L: aim.dose_mg_L, ...now, ...after, ...freeOf(request), ...totalFromOf(request) },
            room,
          )),
    );
  }
  const ofMust =
    request.stage === 'must' && aim.dose_mg_L !== undefined && aim.dose_mg_L > 0
      ? { after_must: afterMust(aim.dose_mg_L) }
      : {};
  if (ofMust.after_must !== undefined && (aim.dose_mg_L ?? 0) > MALOLACTIC_UNHARMED_mg_L)
    warnings.push({
      code: 'must-may-hinder-malolactic',
      values: { malolactic_unharmed_mg_L: MALOLACTIC_UNHARMED_mg_L },
    });
  const choices =
    target !== undefined && isChoice(request, aim) ? choicesFor(request, target, pK, room) : undefined;
  const { dose_mg_L, add_mg_L } = aim;
  const cap =
    dose_mg_L === undefined || add_mg_L === undefined
      ? undefined
      : capped(request, { dose_mg_L, add_mg_L }, room, pK);
  const limit = target === undefined ? undefined : decidingLimit(room, dose_mg_L ?? 0);
  return {
    ...now,
    ...aim,
    ...portioned?.shown,
    ...after,
    ...ofMust,
    ...bottlingOf(request, aim),
    ...(limit === undefined ? {} : { limit, limits: limitsOn(room) }),
    ...(cap === undefined ? {} : { capped: cap }),
    warnings: inOrder(warnings),
    ...(choices === undefined ? {} : { choices }),
    steps: doseSteps({
      request: asked,
      dissociation,
      aim,
      ...(content === undefined ? {} : { content }),
      ...(portioned === undefined ? {} : { rounded: portioned.rounded }),
      ...(portioned?.roundedEach === undefined ? {} : { roundedEach: portioned.roundedEach }),
    }),
  };
}

/** What oxygen takes at bottling, where it is stated. */
function bottlingOf(request: DoseRequest, { target_free_mg_L }: Aim): Pick<DoseAnswer, 'bottling'> {
  const { oxygen_mg_L } = request;
  if (oxygen_mg_L === undefined) return {};
  const counted_mg_L = oxygenLoss(request);
  const least = oxygenLoss({ oxygen_mg_L, SO2_mg_per_mg_O2: SO2_PER_OXYGEN_MEASURED });
  const after =
    target_free_mg_L === undefined ? {} : { free_at_bottling_mg_L: target_free_mg_L - counted_mg_L };
  return {
    bottling: { oxygen_mg_L, loss_mg_L: [least, oxygenLoss({ oxygen_mg_L })], counted_mg_L, ...after },
  };
}

/** An assumed target is only ever for wine whose fermentations are over. */
function targetOf({ target, targetStated, stage }: DoseRequest): Target | undefined {
  return targetStated || !STAGES_WITHOUT_TARGET.includes(stage) ? target : undefined;
}

function withoutTarget(request: DoseRequest): DoseRequest {
  const { target: _dropped, ...rest } = request;
  return rest;
}

const freeOf = ({ free_mg_L }: DoseRequest): { free_mg_L?: number } =>
  free_mg_L === undefined ? {} : { free_mg_L };

const totalOf = ({ total_mg_L }: DoseRequest): { total_mg_L?: number } =>
  total_mg_L === undefined ? {} : { total_mg_L };

const totalFromOf = ({ total_from }: DoseRequest): Pick<DoseRequest, 'total_from'> =>
  total_from === undefined ? {} : { total_from };

/** A high need that nobody stated is a choice and not a dose; it is told in whole mg/L, and so it is compared. */
const isHigh = (request: DoseRequest, aim: Aim): boolean =>
  !request.targetStated && Math.round(aim.target_free_mg_L ?? 0) > FREE_NEED_HIGH_mg_L;
const isChoice = (request: DoseRequest, aim: Aim): boolean =>
  isHigh(request, aim) && request.ph !== undefined && (aim.add_mg_L ?? 0) > 0;

function basisWarnings(request: DoseRequest, dissociation: Dissociation): readonly Warning[] {
  const { ph, target } = request;
  if (ph === undefined) return [];
  const molecular = target !== undefined && 'molecular_mg_L' in target ? target.molecular_mg_L : undefined;
  return fallbackWarnings(dissociation, {
    ph,
    ...(molecular === undefined ? {} : { molecular_target_mg_L: molecular }),
    ...freeOf(request),
  });
}

function aimWarnings(request: DoseRequest, aim: Aim, portioned: Portioned | undefined): readonly Warning[] {
  const warnings: Warning[] = [];
  const { add_mg_L, dose_mg_L, target_free_mg_L } = aim;
  const { binding_allowance_percent: percent } = request;
  if (add_mg_L === 0) {
    warnings.push({
      code: 'no-addition-needed',
      values: target_free_mg_L === undefined ? {} : { target_free_mg_L, ...freeOf(request) },
    });
  }
  warnings.push(...smallnessWarnings(add_mg_L ?? 0, request.additive, portioned?.shown));
  if (target_free_mg_L !== undefined && isHigh(request, aim) && add_mg_L !== 0) {
    warnings.push({ code: 'free-needed-high', values: { target_free_mg_L } });
  }
  if (percent !== undefined && percent > 0 && add_mg_L !== undefined && add_mg_L > 0) {
    warnings.push({
      code: 'allowance-covers-less',
      values: {
        binding_allowance_percent: percent,
        covers_percent: bindingCovered(percent),
        factor: 1 + percent / 100,
        third_binding_factor: 1.5,
      },
    });
  }
  const { rounding_mg_L, measure_gives_mg_L } = portioned?.shown.per_vessel ?? portioned?.shown ?? {};
  if (rounding_mg_L !== undefined && dose_mg_L !== undefined && isRoundingCoarse(rounding_mg_L, dose_mg_L)) {
    warnings.push({
      code: 'rounding-coarse',
      values: { rounding_mg_L, ...(measure_gives_mg_L === undefined ? {} : { measure_gives_mg_L }) },
    });
  }
  return warnings;
}
