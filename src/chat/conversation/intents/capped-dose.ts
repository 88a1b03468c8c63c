import type { Reading } from '../../reader/understood.ts';
import { doseButtons } from '../buttons.ts';
import { assumedLines } from '../lines/assumed.ts';
import { basisLines } from '../lines/basis.ts';
import { bottledLines } from '../lines/bottled.ts';
import {
  cappedFirst,
  cappedInRound,
  designationLines,
  keptLine,
  lawAssumedLines,
  limitValues,
  type Capped,
} from '../lines/capped.ts';
import { cautionLines } from '../lines/cautions.ts';
import { expectationLines } from '../lines/expectation.ts';
import { factLines } from '../lines/facts.ts';
import { firstOfDose, hasAmount } from '../lines/first-dose.ts';
import { givenAnswer } from '../lines/given-answer.ts';
import { line } from '../lines/line.ts';
import { roundDoseLine } from '../lines/round-dose.ts';
import { vesselText } from '../lines/vessel.ts';
import { underLines, warningLines } from '../lines/warnings.ts';
import { workingLines } from '../lines/working.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { additiveOf } from '../to-requests.ts';
import { vesselsIn } from '../vessels-named.ts';

/**
 * A dose that passes a limit which was read: first the smaller one, with what it gives and the rule; of the full dose
 * nothing shows until it is asked for a second time. Nothing at all where there is no room left.
 */
export function cappedDose(reading: Reading, answer: Capped, turn: Turn): Outcome {
  const additive = additiveOf(reading);
  const given = givenAnswer(answer);
  const { manner, ref } = turn;
  const isNothing = additive === undefined || !hasAmount(given);
  const [first, ...more] = isNothing ? [] : firstOfDose(vesselText(reading), given, additive, manner);
  const inFull = additive !== undefined && !isNothing && !turn.cautioned.has(additive.id);
  const head =
    first === undefined
      ? line('first', 'dose-at-limit', limitValues(reading, answer, manner))
      : cappedFirst(first, reading, answer, manner);
  const { binding_allowance_percent: _percent, binding_share: _share, ...fields } = reading.fields;
  return {
    answer,
    inRound:
      first === undefined || additive === undefined
        ? [head]
        : [
            ...roundDoseLine(
              vesselText(reading),
              turn.round?.own ?? reading,
              { ...answer, warnings: given.warnings },
              turn.round?.isOneAdditive ? undefined : additive,
              manner,
            ),
            cappedInRound(reading, answer, manner),
          ],
    lines: [
      ...bottledLines(reading),
      head,
      ...underLines(given.warnings, manner),
      ...more,
      keptLine(reading, answer, manner),
      ...(reading.assumed.stage === undefined || first === undefined
        ? []
        : [line('condition', 'condition-stage')]),
      ...(first === undefined ? [] : expectationLines({ ...reading, fields }, given, undefined, manner)),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner, first !== undefined),
      ...lawAssumedLines(reading, turn.settings),
      ...designationLines(reading, turn.settings),
      ...(first === undefined ? [] : basisLines(reading, given, manner)),
      ...(first === undefined ? [] : workingLines(given.steps, manner)),
      ...warningLines(given.warnings, manner, 'warning', ['free-low-may-bind-all']),
      ...(additive === undefined || first === undefined ? [] : cautionLines(additive, inFull)),
    ],
    buttons: doseButtons(ref, {
      mayBeNoted: turn.here.role !== 'guest' && vesselsIn(reading.fields).length > 0 && first !== undefined,
      isCapped: true,
      stageAssumed: reading.assumed.stage !== undefined,
      mayBeRed: false,
      colourUnknown: isColourUnknown(reading, turn),
      cautionsShort: first !== undefined && !inFull,
    }),
    ...(inFull && additive && { cautioned: additive.id }),
  };
}

/** The colour opens another limit: it is offered where nobody has told it. */
function isColourUnknown(reading: Reading, { settings }: Turn): boolean {
  return lawAssumedLines(reading, settings).some(({ list = [] }) =>
    list.some(({ values }) => values['code'] === 'colour-assumed'),
  );
}
