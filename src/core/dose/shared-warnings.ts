import { PH_USUAL } from '../bounds.ts';
import type { AdditiveAtHand, AdditiveId } from '../additives/additive-id.ts';
import { ADDITIVES } from '../additives/additives.ts';
import type { SourceKey } from '../sources.ts';
import { STAGES_WITHOUT_TARGET, type Product, type Stage } from '../wine.ts';
import { FREE_LOW_mg_L } from '../binding/free-expected.ts';
import type { Warning } from './answer.ts';
import { standingAfter, type RoomToLimit } from './room-to-limit.ts';
import { ADDITION_LARGE_mg_L, MALOLACTIC_CEILINGS, MOLECULAR_SMELT_mg_L } from './thresholds.ts';

/**
 * That no dose belongs to this stage, with the published ceilings where malolactic fermentation is to come.
 *
 * @example
 * ```ts
 * stageWarnings('must') // => [{ code: 'no-dose-at-this-stage', values: { stage: 'must' } }]
 * stageWarnings('finished') // => []
 * ```
 */
export function stageWarnings(stage: Stage): readonly Warning[] {
  if (!STAGES_WITHOUT_TARGET.includes(stage)) return [];
  const ceilings = stage === 'malolactic' ? MALOLACTIC_CEILINGS : {};
  return [{ code: 'no-dose-at-this-stage', values: { stage, ...ceilings } }];
}

/**
 * That an addition goes into wine that still ferments, or whose malolactic fermentation is still to come, with the
 * published ceilings. Must and base wine take their additions as a matter of course.
 *
 * @example
 * ```ts
 * stageNotOverWarnings('fermenting')[0]?.values['stage'] // => 'fermenting'
 * stageNotOverWarnings('must') // => []
 * ```
 */
export function stageNotOverWarnings(stage: Stage): readonly Warning[] {
  if (stage !== 'malolactic' && stage !== 'fermenting') return [];
  return [{ code: 'stage-not-over', values: { stage, ...MALOLACTIC_CEILINGS } }];
}

/**
 * What the pH (usual from 2.8 to 4.2) and the additive call for: ammonium bisulfite is for grapes and must only, and
 * sodium metabisulfite stands in no sheet for wine.
 *
 * Source: OIV II.1.12 and Oeno 7/2003 (read).
 *
 * @example
 * ```ts
 * factWarnings({ ph: 4.3 }) // => [{ code: 'ph-unusual', values: { ph: 4.3 } }]
 * factWarnings({ additive: { id: 'ammonium-bisulfite-solution' }, stage: 'must' }) // => []
 * ```
 */
export function factWarnings(facts: {
  readonly ph?: number;
  readonly additive?: AdditiveAtHand;
  readonly stage?: Stage;
  readonly product?: Product;
}): readonly Warning[] {
  const warnings: Warning[] = [];
  const { ph, additive } = facts;
  if (ph !== undefined && (ph < PH_USUAL.min || ph > PH_USUAL.max)) {
    warnings.push({ code: 'ph-unusual', values: { ph } });
  }
  if (additive?.id === 'sulfur-dioxide-gas') warnings.push({ code: 'gas-needs-training', values: {} });
  if (additive !== undefined && !isPermitted(additive.id, facts)) {
    warnings.push({
      code: 'additive-not-permitted',
      values: { additive: additive.id, rule: 'oiv-ii-1.12' satisfies SourceKey },
    });
  }
  return warnings;
}

function isPermitted(
  id: AdditiveId,
  { stage, product }: { readonly stage?: Stage; readonly product?: Product },
): boolean {
  if (id === 'ammonium-bisulfite-solution') return stage === 'must';
  // The code speaks of wine alone.
  return product !== undefined || ADDITIVES[id].contains !== 'sodium';
}

/** What an addition makes of a wine; mg/L. */
export interface Addition {
  readonly dose_mg_L: number;
  readonly free_mg_L?: number;
  readonly free_after_mg_L?: number;
  readonly molecular_mg_L?: number;
  readonly molecular_after_mg_L?: number;
}

/**
 * What an addition calls for, whoever chose it: size, smell, binding, limit.
 *
 * @example
 * ```ts
 * additionWarnings({ dose_mg_L: 120 }, { found: { noneFor: 'mead' }, least_total_mg_L: 0, totalKnown: true }).map((warning) => warning.code) // => ['addition-large', 'no-limit-on-file']
 * ```
 */
export function additionWarnings(addition: Addition, room: RoomToLimit): readonly Warning[] {
  const { dose_mg_L, free_mg_L, free_after_mg_L } = addition;
  const warnings: Warning[] = [];
  if (dose_mg_L > ADDITION_LARGE_mg_L) warnings.push({ code: 'addition-large', values: { dose_mg_L } });
  if (free_mg_L !== undefined && free_mg_L < FREE_LOW_mg_L && dose_mg_L > 0) {
    warnings.push({ code: 'free-low-may-bind-all', values: { free_mg_L } });
  }
  warnings.push(...smellWarnings(addition));
  return [...warnings, ...totalWarnings(room, dose_mg_L, free_after_mg_L)];
}

function totalWarnings(room: RoomToLimit, dose_mg_L: number, free_after_mg_L?: number): readonly Warning[] {
  const { limit, noneFor } = room.found;
  const warnings: Warning[] = [];
  const standing = standingAfter(room, dose_mg_L);
  if (limit === undefined) warnings.push({ code: 'no-limit-on-file', values: { none_for: noneFor } });
  else if (standing !== 'within') {
    warnings.push({
      code: standing === 'over' ? 'total-over-limit' : 'total-near-limit',
      values: {
        rule: limit.rule,
        limit_mg_L: limit.limit_mg_L,
        total_after_mg_L: room.least_total_mg_L + dose_mg_L,
        total: room.totalKnown ? 'known' : 'at-least',
      },
    });
  }
  if (!room.totalKnown) {
    warnings.push({
      code: 'total-unknown',
      values: {
        ...(free_after_mg_L === undefined ? {} : { free_after_mg_L }),
        ...(limit === undefined ? {} : { limit_mg_L: limit.limit_mg_L }),
      },
    });
  }
  return warnings;
}

/**
 * That molecular SO2 is, or will be, above what is smelt.
 *
 * @example
 * ```ts
 * smellWarnings({ molecular_after_mg_L: 2.1 }) // => [{ code: 'molecular-above-2', values: { molecular_after_mg_L: 2.1 } }]
 * ```
 */
export function smellWarnings(
  addition: Pick<Addition, 'molecular_mg_L' | 'molecular_after_mg_L'>,
): readonly Warning[] {
  const { molecular_mg_L, molecular_after_mg_L } = addition;
  if (Math.max(molecular_mg_L ?? 0, molecular_after_mg_L ?? 0) <= MOLECULAR_SMELT_mg_L) return [];
  return [
    {
      code: 'molecular-above-2',
      values: {
        ...(molecular_mg_L === undefined ? {} : { molecular_mg_L }),
        ...(molecular_after_mg_L === undefined ? {} : { molecular_after_mg_L }),
      },
    },
  ];
}
