import type { DoseAnswer, WarningCode } from '../../../core/dose/answer.ts';
import { RISE_NEGLIGIBLE_mg_L } from '../../../core/dose/thresholds.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { massText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { molecularPerLitre, type Manner } from '../manner.ts';
import { line } from './line.ts';
import { targetValues } from './target-text.ts';
import { vesselText } from './vessel.ts';

/** Whether the wine already holds what is aimed at. */
export function saidNothingNeeded(answer: DoseAnswer): boolean {
  return answer.warnings.some(({ code }) => code === 'no-addition-needed');
}

/** Whether there is nothing to weigh: enough is there, or too little is missing. */
export function saidNothingToWeigh({ warnings }: DoseAnswer): boolean {
  return warnings.some(({ code }) => NOTHING_TO_WEIGH.includes(code));
}

const NOTHING_TO_WEIGH: readonly WarningCode[] = [
  'no-addition-needed',
  'addition-negligible',
  'gas-too-little',
];

/** Nothing to add, or nothing that can be measured out, and why. */
export function nothingLines(reading: Reading, answer: DoseAnswer, manner: Manner): Line[] {
  const first = firstOfNothing(vesselText(reading), answer, manner);
  const target = reading.fields.target ?? reading.assumed.target;
  const { free_mg_L, ph } = reading.fields;
  if (target === undefined || free_mg_L === undefined || 'add_mg_L' in target) return [first];
  const values = {
    ...targetValues(target, manner),
    free: `${numberText(free_mg_L, 1, manner.mark)} ${manner.unit}`,
  };
  if (answer.molecular_mg_L === undefined || ph === undefined)
    return [first, line('effect', 'nothing-why-free', values)];
  const molecular = molecularPerLitre(answer.molecular_mg_L, manner);
  return [first, line('effect', 'nothing-why', { ...values, molecular, ph: numberText(ph, 2, manner.mark) })];
}

function firstOfNothing(vessel: string, answer: DoseAnswer, manner: Manner): Line {
  if (saidNothingNeeded(answer)) return line('first', 'dose-nothing', { vessel });
  const each = answer.per_vessel ?? answer;
  if (answer.warnings.some(({ code }) => code === 'gas-too-little'))
    return line('first', 'dose-gas-too-little', { vessel, amount: massText(each.mass_g ?? 0, manner.mark) });
  const rise = answer.add_mg_L ?? 0;
  const short = `${numberText(rise, rise < 0.1 ? 2 : 1, manner.mark)} ${manner.unit}`;
  return line('first', rise < RISE_NEGLIGIBLE_mg_L ? 'dose-negligible' : 'dose-too-fine', { vessel, short });
}
