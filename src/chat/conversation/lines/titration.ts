import { ascorbicCountsAs_mg_L } from '../../../core/laboratory/ascorbic.ts';
import { precisionOf } from '../../../core/laboratory/precision.ts';
import type { Titration, TitrationAnswer } from '../../../core/laboratory/titration.ts';
import type { Reading } from '../../reader/understood.ts';
import type { SaidTitration } from '../../reader/titration/said-titration.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { perLitre, type Manner } from '../manner.ts';
import { resultOf } from '../to-titration.ts';
import { line, listLine, part } from './line.ts';
import { vesselText } from './vessel.ts';

/** Ascorbic acid whose effect is told as an example, mg/L (an addition that is usual; common practice). */
const EXAMPLE_ASCORBIC_mg_L = 50;

/** What the titration comes to. */
export function resultLine(
  reading: Reading,
  titration: Titration,
  answer: TitrationAnswer,
  manner: Manner,
): Line {
  return line('first', 'titration-result', {
    vessel: vesselText(reading),
    of: titration.of,
    result: numberText(resultOf(answer), 1, manner.mark),
    unit: manner.unit,
    method: titration.method,
  });
}

/** The volumes and the titrant as they were read, and a pH that stands beside them. */
export function titrationFacts(said: SaidTitration, { mark }: Manner, ph?: number): Line[] {
  const { sample_mL, titrant_mL, blank_mL, titrant, ascorbic_mg_L } = said;
  const text = (value: number): string => numberText(value, 4, mark);
  const parts = [
    ...(sample_mL === undefined ? [] : [part('titration-sample', { volume: text(sample_mL) })]),
    ...(titrant_mL === undefined ? [] : [part('titration-titrant', { volume: text(titrant_mL) })]),
    ...(blank_mL === undefined ? [] : [part('titration-blank', { volume: text(blank_mL) })]),
    ...(titrant === undefined
      ? []
      : 'strength' in titrant
        ? [
            part('titration-strength', {
              strength: numberText(titrant.strength, 6, mark),
              unit: titrant.unit ?? 'none',
            }),
          ]
        : [part('titration-iodate', { mass: text(titrant.iodate_mg), volume: text(titrant.flask_mL) })]),
    ...(ascorbic_mg_L === undefined ? [] : [part('titration-ascorbic', { amount: text(ascorbic_mg_L) })]),
    ...(ph === undefined ? [] : [part('fact-ph', { ph: numberText(ph, 2, mark) })]),
  ];
  return listLine('assumed', 'titration-read', parts);
}

/** What was taken for granted: that it is free SO2, and that there was no blank. */
export function titrationAssumed(said: SaidTitration): Line[] {
  return [
    ...(said.of === undefined ? [line('assumed', 'titration-free-assumed')] : []),
    ...(said.blank_mL === undefined ? [line('assumed', 'titration-no-blank')] : []),
  ];
}

/** What the figure means: iodine in moles, ascorbic acid, how far another laboratory may be off. */
export function titrationMeaning(
  said: SaidTitration,
  titration: Titration,
  answer: TitrationAnswer,
  manner: Manner,
): Line[] {
  const { method, of, sample_mL } = titration;
  const text = (value: number, decimals: number): string => numberText(value, decimals, manner.mark);
  const lines: Line[] = [];
  if (method === 'iodine' && said.titrant && 'unit' in said.titrant && said.titrant.unit === 'M')
    lines.push(
      line('effect', 'titration-molar', {
        molar: text(said.titrant.strength, 6),
        normal: text(answer.normality, 6),
      }),
    );
  if (method === 'iodine' && said.ascorbic_mg_L === undefined)
    lines.push(
      line('effect', 'titration-ascorbic-asked', {
        amount: text(EXAMPLE_ASCORBIC_mg_L, 0),
        counts: text(ascorbicCountsAs_mg_L(EXAMPLE_ASCORBIC_mg_L), 0),
        unit: manner.unit,
      }),
    );
  const precision = precisionOf({ method, of, sample_mL }, resultOf(answer));
  if (precision !== undefined)
    lines.push(
      line('effect', 'titration-precision', {
        again: text(precision.repeatability_mg_L, 0),
        other: perLitre(precision.reproducibility_mg_L, manner),
      }),
    );
  return lines;
}
