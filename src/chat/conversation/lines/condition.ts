import type { DoseAnswer, Measure, Warning } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { concentrationText, molecularText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import { perLitre, type Manner } from '../manner.ts';
import { line } from './line.ts';
import { bareAmount } from './measured.ts';

/** Core's figures for the same wine as a red, where its colour is unknown and makes another dose. */
export function redFigures(answer: Pick<DoseAnswer, 'warnings'>): Warning['values'] | undefined {
  return answer.warnings.find(({ code, values }) => code === 'style-unknown' && values['style'] === 'red')
    ?.values;
}

/** What the first line depends on: that the fermentations are over, and the amount for a red. */
export function conditionLines(reading: Reading, answer: DoseAnswer, manner: Manner): Line[] {
  const stage = reading.assumed.stage === undefined ? [] : [line('condition', 'condition-stage')];
  const red = redFigures(answer);
  return red === undefined ? stage : [...stage, line('condition', 'condition-red', redValues(red, manner))];
}

/**
 * The amount for a red as the sentences take it: `kind` is `none` where nothing is needed, `over` where it passes the
 * limit too; `amount` is then `none`, or its text.
 */
export function redValues(values: Warning['values'], manner: Manner): Line['values'] {
  const limit = concentrationText(numberIn(values, 'limit_mg_L'), manner.mark);
  const red = redTargetText(values, manner.mark);
  const more = { kind: values['over_limit'] === undefined ? 'some' : 'over', limit, red };
  const each = measureNamed(values, 'each_measure');
  const measure = each ?? measureNamed(values, 'measure');
  const amount = bareAmount(measure, each ? 'several' : 'one', manner);
  if (amount) return { ...more, ...amount };
  const dose = numberIn(values, 'dose_mg_L');
  const rise = { unit: 'other', count: 'one', amount: `+ ${perLitre(dose, manner)}` };
  return dose === 0 ? { ...more, ...rise, kind: 'none', amount: 'none' } : { ...more, ...rise };
}

/** What a red is aimed at in those figures, as text without its unit. */
export function redTargetText(values: Warning['values'], mark: Manner['mark']): string {
  return molecularText(numberIn(values, 'target_molecular_mg_L'), mark);
}

function measureNamed(values: Warning['values'], name: string): Measure | undefined {
  const value = values[`${name}_value`];
  const unit = values[`${name}_unit`];
  return typeof value === 'number' && typeof unit === 'string'
    ? { value, unit: unit as Measure['unit'] }
    : undefined;
}

function numberIn(values: Warning['values'], name: string): number {
  const value = values[name];
  return typeof value === 'number' ? value : 0;
}
