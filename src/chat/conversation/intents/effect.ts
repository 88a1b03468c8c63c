import { effect } from '../../../core/dose/effect.ts';
import type { EffectAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { buttonsFor } from '../buttons.ts';
import { numberOf, statedAmount } from '../lines/amount-text.ts';
import { assumedLines } from '../lines/assumed.ts';
import { cautionLines } from '../lines/cautions.ts';
import { factLines } from '../lines/facts.ts';
import { basisLines } from '../lines/basis.ts';
import { bottledLines } from '../lines/bottled.ts';
import { landingLine, riseLine } from '../lines/landing.ts';
import { line } from '../lines/line.ts';
import { vesselText } from '../lines/vessel.ts';
import { underLines, warningLines } from '../lines/warnings.ts';
import { workingLines } from '../lines/working.ts';
import { perLitre, type Manner } from '../manner.ts';
import { shortened } from '../lines/problems.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { additiveOf, toEffectRequest } from '../to-requests.ts';
import { massText } from '../../replies/quantity-text.ts';
import { volumeText } from '../../replies/volume-text.ts';
import type { Line } from '../../replies/reply.ts';
import { missing } from './missing.ts';
import { fermentStop } from './ferment-stop.ts';

/** The answer to "what does this amount do": mg/L it adds, and where the wine lands. */
export function answerEffect(reading: Reading, turn: Turn): Outcome {
  const answer = effect(toEffectRequest(reading, turn.settings));
  if (reading.notes.some(({ id }) => id === 'ferment-stop')) return fermentStop(reading, answer, turn);
  const additive = additiveOf(reading);
  if (reading.asks.length > 0 || additive === undefined || answer.adds_mg_L === undefined)
    return missing(reading, turn);
  const { manner } = turn;
  const inFull = !turn.cautioned.has(additive.id);
  const first = firstOfEffect(reading, answer, turn);
  const landing = landingLine(reading, answer, manner);
  const heavy = [
    ...bottledLines(reading),
    ...underLines(answer.warnings, manner),
    ...warningLines(answer.warnings, manner, 'first').filter(({ key }) => key === 'warning-addition-large'),
  ];
  return {
    answer,
    inRound: [...heavy, ...first.slice(0, 1)],
    lines: [
      ...heavy,
      ...first,
      ...(reading.assumed.stage === undefined ? [] : [line('condition', 'condition-stage')]),
      ...(landing ? [landing] : expectedRise(reading, answer.adds_mg_L, manner)),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...basisLines(reading, answer, manner),
      ...workingLines(answer.steps, manner),
      ...warningLines(answer.warnings, manner, 'warning', [
        'addition-large',
        ...(landing ? (['free-low-may-bind-all'] as const) : []),
      ]),
      ...cautionLines(additive, inFull),
    ],
    buttons: buttonsFor(turn.ref, [...(inFull ? [] : (['s'] as const)), 'w', 'm']),
    ...(inFull && { cautioned: additive.id }),
  };
}

/** Without readings: how far free SO2 may be expected to rise, where the wine does not ferment. */
function expectedRise({ fields }: Reading, adds_mg_L: number, manner: Manner): Line[] {
  if (fields.stage === 'must') return [line('effect', 'effect-must')];
  return fields.stage === 'fermenting' ? [] : [riseLine(adds_mg_L, manner)];
}

/** The rate as the person wrote it, where the whole of it is known; else per hectolitre. */
function rateText({ fields, where }: Reading, { mark }: Manner): string {
  const written = where.rate_mg_L?.text ?? '';
  if (/\d.*(\/|\s\p{L}+\s).*\p{L}/u.test(written)) return shortened(written);
  return `${massText((fields.rate_mg_L ?? 0) / 10, mark)}/hL`;
}

function firstOfEffect(reading: Reading, answer: EffectAnswer, { manner }: Turn): Line[] {
  const { fields } = reading;
  const additive = fields.additive ?? reading.assumed.additive ?? 'potassium-metabisulfite';
  const values = { vessel: vesselText(reading), adds: perLitre(answer.adds_mg_L ?? 0, manner) };
  const volume_L = fields.volume_L ?? reading.assumed.volume_L;
  if (fields.rate_mg_L !== undefined) {
    const rate = rateText(reading, manner);
    const ofAdditive = perLitre(fields.rate_mg_L, manner);
    const first = line('first', 'adds-rate', { ...values, rate, ofAdditive, additive });
    if (answer.mass_g === undefined || volume_L === undefined) return [first];
    const volume = volumeText(volume_L, manner.volumeUnit, manner.mark);
    const amount = massText(answer.mass_g, manner.mark);
    return [first, line('first', 'adds-rate-mass', { volume, amount })];
  }
  const amount = statedAmount(fields, additiveOf(reading) ?? { id: additive }, manner.mark);
  if (amount === undefined) return [];
  return [{ ...line('first', 'adds', { ...values, number: numberOf(amount) }), list: [amount] }];
}
