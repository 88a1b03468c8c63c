import type { Dissociation } from '../chemistry/dissociation.ts';
import { freeSO2Needed } from '../chemistry/free-so2-needed.ts';
import { molecularSO2 } from '../chemistry/molecular-so2.ts';
import type { Warning } from './answer.ts';

/**
 * That the basis which was asked for could not be used: why, and by how much the need would change at the nearest
 * point that its table has (alcohol unknown: at 12 % vol; temperature unknown or below the table: at 20 °C).
 *
 * @param dissociation with its `fallback`
 * @param facts pH; molecular target and free SO2 in mg/L, if known
 *
 * @example
 * ```ts
 * fallbackWarnings({ pK: 1.81, basis: 'pk-1.81', source: 'uc-1982' }, { ph: 3.5 }) // => []
 * ```
 */
export function fallbackWarnings(
  dissociation: Dissociation,
  facts: { readonly ph: number; readonly molecular_target_mg_L?: number; readonly free_mg_L?: number },
): readonly Warning[] {
  const { fallback, pK } = dissociation;
  if (fallback === undefined) return [];
  const { ph, molecular_target_mg_L: target, free_mg_L } = facts;
  const compared = fallback.compared_pK;
  const values: Record<string, number | string> = { ...fallback, pK };
  if (target !== undefined) {
    values['compared_target_free_mg_L'] = freeSO2Needed(target, ph, compared);
    values['need_change_mg_L'] = freeSO2Needed(target, ph, compared) - freeSO2Needed(target, ph, pK);
  }
  if (free_mg_L !== undefined) values['compared_molecular_mg_L'] = molecularSO2(free_mg_L, ph, compared);
  return [{ code: 'basis-fallback', values }];
}
