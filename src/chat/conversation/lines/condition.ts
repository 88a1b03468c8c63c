import type { DoseAnswer, Measure, Warning } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { concentrationText, measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';

/** Core's figures for the same wine as a red, where its colour is unknown and makes another dose. */
export function redFigures(answer: Pick<DoseAnswer, 'warnings'>): Warning['values'] | undefined {
  return answer.warnings.find(({ code, values }) => code === 'style-unknown' && values['style'] === 'red')
    ?.values;
}

/** What the first line depends on: that the fermentations are over, and the amount for a red. */
export function conditionLines(reading: Reading, answer: DoseAnswer, manner: Manner): Line[] {
  const stage = stageLines(reading);
  const red = redFigures(answer);
  return red === undefined ? stage : [...stage, line('condition', 'condition-red', redValues(red, manner))];
}

/** A stated aim is reckoned at every stage; where sulfite does harm, it is said beside it. */
function stageLines({ assumed, fields }: Reading): Line[] {
  if (assumed.stage !== undefined) return [line('condition', 'condition-stage')];
  if (fields.stage === 'malolactic') return [line('condition', 'no-dose-why')];
  return fields.stage === 'fermenting' ? [line('condition', 'no-dose-why-fermenting')] : [];
}

/** The amount for a red as the sentences take it: `none` where nothing is needed, `over` where the limit forbids it. */
export function redValues(values: Warning['values'], manner: Manner): Line['values'] {
  if (values['over_limit'] !== undefined) return { amount: 'over' };
  const each = values['each_measure_value'] === undefined ? '' : 'each_';
  const value = values[`${each}measure_value`];
  const unit = values[`${each}measure_unit`];
  if (typeof value === 'number' && typeof unit === 'string') {
    const measure = { value, unit: unit as Measure['unit'] };
    const tablets = unit === 'tablets' ? 'tablets' : 'other';
    return {
      amount: measureText(measure, manner.mark),
      unit: tablets,
      each: each === '' ? 'one' : 'several',
    };
  }
  const dose = values['dose_mg_L'];
  if (typeof dose !== 'number' || dose === 0) return { amount: 'none' };
  return {
    amount: `+ ${concentrationText(dose, manner.mark)} ${manner.unit}`,
    unit: 'other',
    each: 'one',
  };
}
