import { dose } from '../../../core/dose/dose.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { DoseRequest } from '../../../core/dose/request.ts';
import { litresFrom } from '../../../core/units/volume.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { molecularPerLitre, perLitre, type Manner } from '../manner.ts';
import { givenAnswer } from './given-answer.ts';
import { line } from './line.ts';
import { measuredAmount } from './measured.ts';
import { vesselText } from './vessel.ts';

/** The volume a rate is told for: a hectolitre, or a thousand gallons. */
const PER = {
  metric: { volume_L: 100, text: 'hL' },
  us: { volume_L: litresFrom(1000, 'galUS'), text: '1\u202f000 gal' },
  imperial: { volume_L: litresFrom(1000, 'galUK'), text: '1\u202f000 imp gal' },
} as const;

/** What can be said before all is known: the rate to add, the free SO2 needed at this pH, molecular SO2 now. */
export function knownSoFar(
  reading: Reading,
  request: DoseRequest,
  answer: DoseAnswer,
  manner: Manner,
): Line[] {
  const vessel = vesselText(reading);
  const now = nowLine(reading, answer, vessel, manner);
  const need = needLine(reading, answer, vessel, manner);
  if (answer.choices || !answer.dose_mg_L) return [need, now].filter((one) => one !== undefined);
  const detail = [now && { ...now, room: 'effect' as const }, need && { ...need, room: 'effect' as const }];
  return [
    rateLine(reading, request, answer.dose_mg_L, vessel, manner),
    ...detail
      .filter((one) => one !== undefined)
      .map((one) => ({ ...one, values: { ...one.values, vessel: 'none' } })),
  ];
}

/** The dose that is shown: the smaller one, unless the full one was asked for with the rule that it passes. */
const asked = (answer: DoseAnswer, { over_rule }: Reading): DoseAnswer =>
  answer.capped?.rule === over_rule ? answer : givenAnswer(answer);

function rateLine(
  reading: Reading,
  request: DoseRequest,
  dose_mg_L: number,
  vessel: string,
  manner: Manner,
): Line {
  const per = PER[manner.units];
  const { vessels: _vessels, ...wine } = request;
  const forOne = asked(dose({ ...wine, volume_L: per.volume_L }), reading);
  const values = { vessel, dose: perLitre(dose_mg_L, manner) };
  if (request.additive === undefined || forOne.measure === undefined || forOne.measure.unit === 'tablets')
    return line('first', 'dose-rate-bare', values);
  const amount = measuredAmount(forOne, request.additive, manner);
  return line('first', 'dose-rate', { ...values, ...amount, per: per.text });
}

function nowLine(reading: Reading, answer: DoseAnswer, vessel: string, manner: Manner): Line | undefined {
  const { ph, free_mg_L } = reading.fields;
  if (answer.molecular_mg_L === undefined || ph === undefined || free_mg_L === undefined) return undefined;
  return line('first', 'dose-now', {
    vessel,
    molecular: molecularPerLitre(answer.molecular_mg_L, manner),
    ph: numberText(ph, 2, manner.mark),
    free: `${numberText(free_mg_L, 1, manner.mark)} ${manner.unit}`,
  });
}

function needLine(reading: Reading, answer: DoseAnswer, vessel: string, manner: Manner): Line | undefined {
  const { ph } = reading.fields;
  if (answer.target_free_mg_L === undefined || answer.target_molecular_mg_L === undefined || ph === undefined)
    return undefined;
  return line('first', 'dose-need', {
    vessel,
    ph: numberText(ph, 2, manner.mark),
    molecular: molecularPerLitre(answer.target_molecular_mg_L, manner),
    free: perLitre(answer.target_free_mg_L, manner),
  });
}
