import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import { publishedButtons } from '../buttons.ts';
import { assumedLines } from '../lines/assumed.ts';
import { factLines } from '../lines/facts.ts';
import { line } from '../lines/line.ts';
import { afterMustLines, mustRangeLines } from '../lines/must.ts';
import { questionLine } from '../lines/question.ts';
import { vesselText } from '../lines/vessel.ts';
import { wholeExample } from '../lines/whole-example.ts';
import { warningLines } from '../lines/warnings.ts';
import { molecularPerLitre } from '../manner.ts';
import type { Outcome, Turn } from '../outcome.ts';

/**
 * "No sulfite now" in fermenting and malolactic wine, and the question for a figure in must and base wine, where no
 * target was stated; undefined where a dose may be given. Nothing waits for an answer.
 */
export function noDose(reading: Reading, answer: DoseAnswer, turn: Turn): Outcome | undefined {
  const { stage } = reading.fields;
  if (!reading.asks.includes('target') || stage === undefined) return undefined;
  if (stage === 'fermenting' || stage === 'malolactic') return noSulfiteNow(reading, stage, answer, turn);
  if (reading.asks[0] === 'target' && (stage === 'must' || stage === 'base'))
    return askHowMuch(reading, answer, turn);
  return undefined;
}

function echo(reading: Reading, turn: Turn): Line[] {
  return [...factLines(reading, turn.manner), ...assumedLines(reading, turn.manner, false)];
}

function noSulfiteNow(
  reading: Reading,
  stage: 'fermenting' | 'malolactic',
  answer: DoseAnswer,
  turn: Turn,
): Outcome {
  const first = line('first', `no-dose-${stage}`, { vessel: vesselText(reading) });
  const molecular =
    answer.molecular_mg_L === undefined
      ? []
      : [
          line('effect', 'no-dose-molecular', {
            molecular: molecularPerLitre(answer.molecular_mg_L, turn.manner),
          }),
        ];
  const why = line('effect', stage === 'fermenting' ? 'no-dose-why-fermenting' : 'no-dose-why');
  return {
    answer,
    inRound: [first],
    lines: [
      first,
      ...molecular,
      why,
      line('effect', 'no-dose-all-the-same', wholeExample(reading, turn.manner, turn.settings)),
      ...echo(reading, turn),
      ...warningLines(answer.warnings, turn.manner, 'warning', [
        'no-dose-at-this-stage',
        'molecular-above-2',
      ]),
    ],
    buttons: [],
    askedTarget: true,
  };
}

function askHowMuch(reading: Reading, answer: DoseAnswer, turn: Turn): Outcome {
  const vessel = vesselText(reading);
  const question = questionLine('target', reading, turn.manner, turn.settings, 'first');
  return {
    answer,
    inRound: [line('first', 'round-target-stage', { vessel })],
    lines: [
      question,
      ...(reading.fields.stage === 'must' ? publishedLines(reading, turn) : []),
      ...echo(reading, turn),
    ],
    buttons: publishedButtons(turn.ref, reading, turn.manner),
    askedTarget: true,
  };
}

/** The published figures to choose from, or the question on which they hang, and what follows from an addition. */
function publishedLines(reading: Reading, { manner }: Turn): Line[] {
  return [
    ...mustRangeLines(reading, manner),
    ...(reading.marks.fruitState === undefined && reading.fields.product === undefined
      ? [line('effect', 'must-say-state')]
      : []),
    ...afterMustLines({}, manner).slice(1),
  ];
}
