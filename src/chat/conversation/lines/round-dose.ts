import type { AdditiveAtHand } from '../../../core/additives/additive-id.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Fields, Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import { measureText } from '../../replies/quantity-text.ts';
import type { Line } from '../../replies/reply.ts';
import type { Manner } from '../manner.ts';
import { redFigures, redValues } from './condition.ts';
import { factsOf } from './facts.ts';
import { line, part } from './line.ts';
import { sumOf } from './measured.ts';
import { shownDose } from './shown-dose.ts';

type Part = Omit<Line, 'room'>;

/** A line of a round: the vessel, what was read of it, and what to weigh, measure or count. */
export function roundDoseLine(
  vessel: string,
  own: Reading,
  answer: DoseAnswer,
  additive: AdditiveAtHand | undefined,
  manner: Manner,
): Line[] {
  const { measure, stock, per_vessel: each, isLimited } = shownDose(answer);
  const shown = each?.measure ?? (each ? undefined : measure);
  const asStock = shown === undefined ? (each?.stock ?? stock) : undefined;
  const amount = shown ?? asStock?.measure;
  if (amount === undefined) return [];
  const strength = asStock?.strength_percent ?? additive?.strength_percent;
  const values = {
    vessel,
    amount: measureText(amount, manner.mark),
    unit: amount.unit === 'tablets' ? 'tablets' : 'other',
    additive: asStock?.additive ?? additive?.id ?? 'none',
    strength: strength === undefined ? 'none' : numberText(strength, 2, manner.mark),
    tablet: asStock === undefined ? 'fits' : 'too-large',
    all: each && amount ? measureText(sumOf(amount, each.count), manner.mark) : 'none',
    limited: isLimited ? 'limited' : 'none',
    ...redOf(answer, manner),
  };
  return withReadBack('round-dose', values, own, manner);
}

/** The amount were it a red: its kind, and its text. */
function redOf(answer: DoseAnswer, manner: Manner): { red: string; redAmount: string } {
  const figures = redFigures(answer);
  if (figures === undefined) return { red: 'unsaid', redAmount: '' };
  const values: Partial<Line['values']> = redValues(figures, manner);
  return { red: values['kind'] ?? 'some', redAmount: values['amount'] ?? '' };
}

/** A line of a round where nothing is needed. */
export function roundNothingLine(vessel: string, own: Reading, manner: Manner): Line[] {
  return withReadBack('round-nothing', { vessel }, own, manner);
}

function withReadBack(
  key: 'round-dose' | 'round-nothing',
  values: Line['values'],
  own: Reading,
  manner: Manner,
): Line[] {
  const list = readBack(own, manner);
  if (list.length === 0) return [line('first', `${key}-bare`, values)];
  return [{ ...line('first', key, values), list }];
}

/** What was read of one vessel, short: its volume, pH and free SO2 as bare figures, the rest by name. */
function readBack(own: Reading, manner: Manner): Part[] {
  return factsOf(own, manner)
    .filter(({ key }) => key !== 'fact-strength' && key !== 'fact-tablet')
    .map((fact): Part => {
      if (fact.key === 'fact-ph') return part('fact-figure', { figure: fact.values['ph'] ?? '' });
      if (fact.key === 'fact-free' && own.fields.ph !== undefined)
        return part('fact-figure', { figure: fact.values['free'] ?? '' });
      // A row has room for the volume as it was written alone.
      const volume = fact.values['volume']?.replace(/\s\(.*\)$/, '');
      return volume === undefined ? fact : { ...fact, values: { ...fact.values, volume } };
    })
    .concat(bindingParts(own.fields, manner));
}

/** An allowance or a share that binds, as parts of a list. */
export function bindingParts(fields: Fields, { mark }: Manner): Part[] {
  const { binding_allowance_percent: percent, binding_share: share } = fields;
  return [
    ...(percent === undefined ? [] : [part('fact-allowance', { percent: numberText(percent, 1, mark) })]),
    ...(share === undefined ? [] : [part('fact-share', { percent: numberText(share * 100, 0, mark) })]),
  ];
}
