import type { DoseAnswer, WarningCode } from '../../../core/dose/answer.ts';
import { ADDITION_LARGE_mg_L, MOLECULAR_SMELT_mg_L } from '../../../core/dose/thresholds.ts';

/** Said of the full dose, of which nothing shows where a smaller one is given. */
const OF_THE_FULL_DOSE: readonly WarningCode[] = [
  'total-over-limit',
  'free-over-limit',
  'total-near-limit',
  'style-unknown',
  'rounding-coarse',
  'allowance-covers-less',
];

/**
 * The answer as it is shown: in place of a dose that passes a limit the smaller one, with what it gives and its own
 * working, and nothing that tells the full one. Any other answer is shown as it is.
 */
export function givenAnswer(answer: DoseAnswer): DoseAnswer {
  const { capped } = answer;
  if (capped === undefined) return answer;
  const { molecular_mg_L, target_free_mg_L, target_molecular_mg_L, pK, basis, limit, limits } = answer;
  const { rule: _rule, kept_mg_L: _kept, ...given } = capped;
  return {
    ...(molecular_mg_L !== undefined && { molecular_mg_L }),
    ...(target_free_mg_L !== undefined && { target_free_mg_L }),
    ...(target_molecular_mg_L !== undefined && { target_molecular_mg_L }),
    ...(pK !== undefined && { pK }),
    ...(basis !== undefined && { basis }),
    ...(limit !== undefined && { limit }),
    ...(limits !== undefined && { limits }),
    ...given,
    warnings: answer.warnings.filter((warning) => isOfGiven(warning.code, capped)),
  };
}

function isOfGiven(code: WarningCode, capped: NonNullable<DoseAnswer['capped']>): boolean {
  if (code === 'addition-large') return capped.dose_mg_L > ADDITION_LARGE_mg_L;
  if (code === 'molecular-above-2') return (capped.molecular_after_mg_L ?? 0) > MOLECULAR_SMELT_mg_L;
  return !OF_THE_FULL_DOSE.includes(code);
}
