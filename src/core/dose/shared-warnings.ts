import { PH_USUAL } from '../bounds.ts';
import type { AdditiveAtHand } from '../additives/additive-id.ts';
import { notPermittedBy, type PermitFacts } from '../limits/permitted.ts';
import { STAGES_WITHOUT_TARGET, type Stage } from '../wine.ts';
import { FREE_LOW_mg_L } from '../binding/free-expected.ts';
import type { Warning } from './answer.ts';
import { limitWarnings } from './limit-warnings.ts';
import type { RoomToLimit } from './room-to-limit.ts';
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
 * What the pH (usual from 2.8 to 4.2) and the additive call for, by the law of the market.
 *
 * Source: `limits/permitted`.
 *
 * @example
 * ```ts
 * factWarnings({ ph: 4.3 }) // => [{ code: 'ph-unusual', values: { ph: 4.3 } }]
 * factWarnings({ additive: { id: 'ammonium-bisulfite-solution' }, stage: 'must' }) // => []
 * ```
 */
export function factWarnings(
  facts: PermitFacts & { readonly ph?: number; readonly additive?: AdditiveAtHand },
): readonly Warning[] {
  const warnings: Warning[] = [];
  const { ph, additive } = facts;
  if (ph !== undefined && (ph < PH_USUAL.min || ph > PH_USUAL.max)) {
    warnings.push({ code: 'ph-unusual', values: { ph } });
  }
  if (additive?.id === 'sulfur-dioxide-gas') warnings.push({ code: 'gas-needs-training', values: {} });
  const against = additive && notPermittedBy(additive.id, facts);
  if (additive !== undefined && against !== undefined)
    warnings.push({ code: 'additive-not-permitted', values: { additive: additive.id, ...against } });
  return warnings;
}

/** What an addition makes of a wine; mg/L. */
export interface Addition {
  readonly dose_mg_L: number;
  readonly free_mg_L?: number;
  readonly free_after_mg_L?: number;
  readonly molecular_mg_L?: number;
  readonly molecular_after_mg_L?: number;
  /** Where the total is from. */
  readonly total_from?: 'measured' | 'running-sum';
}

/**
 * What an addition calls for, whoever chose it: size, smell, binding, limit.
 *
 * @example
 * ```ts
 * additionWarnings({ dose_mg_L: 120 }, { found: { none: { region: 'oiv', product: 'mead', reason: 'not-on-file' }, notes: [] }, least_total_mg_L: 0, totalKnown: true, kept_mg_L: 15 }).map((warning) => warning.code) // => ['addition-large', 'no-limit-on-file']
 * ```
 */
export function additionWarnings(addition: Addition, room: RoomToLimit): readonly Warning[] {
  const { dose_mg_L, free_mg_L } = addition;
  const warnings: Warning[] = [];
  if (dose_mg_L > ADDITION_LARGE_mg_L) warnings.push({ code: 'addition-large', values: { dose_mg_L } });
  if (free_mg_L !== undefined && free_mg_L < FREE_LOW_mg_L && dose_mg_L > 0) {
    warnings.push({ code: 'free-low-may-bind-all', values: { free_mg_L } });
  }
  warnings.push(...smellWarnings(addition));
  return [...warnings, ...limitWarnings(room, dose_mg_L, addition)];
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
