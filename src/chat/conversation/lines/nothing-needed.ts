import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { molecularPerLitre, perLitre, type Manner } from '../manner.ts';
import { line } from './line.ts';
import { targetValues } from './target-text.ts';
import { vesselText } from './vessel.ts';

/** Whether the wine already holds what is aimed at. */
export function saidNothingNeeded(answer: DoseAnswer): boolean {
  return answer.warnings.some(({ code }) => code === 'no-addition-needed');
}

/** Nothing to add, and why. */
export function nothingLines(reading: Reading, answer: DoseAnswer, manner: Manner): Line[] {
  const first = line('first', 'dose-nothing', { vessel: vesselText(reading) });
  const target = reading.fields.target ?? reading.assumed.target;
  const { free_mg_L, ph } = reading.fields;
  if (target === undefined || free_mg_L === undefined) return [first];
  const values = { ...targetValues(target, manner), free: perLitre(free_mg_L, manner) };
  if (answer.molecular_mg_L === undefined || ph === undefined)
    return [first, line('effect', 'nothing-why-free', values)];
  const molecular = molecularPerLitre(answer.molecular_mg_L, manner);
  return [first, line('effect', 'nothing-why', { ...values, molecular, ph: numberText(ph, 2, manner.mark) })];
}
