import { dose } from '../../../core/dose/dose.ts';
import type { DoseAnswer, WarningCode } from '../../../core/dose/answer.ts';
import type { DoseRequest } from '../../../core/dose/request.ts';
import type { Line } from '../../replies/reply.ts';
import type { Reading } from '../../reader/understood.ts';
import { choiceButtons, doseButtons } from '../buttons.ts';
import { assumedLines } from '../lines/assumed.ts';
import { cautionLines } from '../lines/cautions.ts';
import { choiceLines } from '../lines/choice.ts';
import { conditionLines, redFigures } from '../lines/condition.ts';
import { expectationLines } from '../lines/expectation.ts';
import { factLines } from '../lines/facts.ts';
import { isCapped, lawAssumedLines } from '../lines/capped.ts';
import { firstOfDose, hasAmount } from '../lines/first-dose.ts';
import { basisLines } from '../lines/basis.ts';
import { bottlingLines } from '../lines/bottling.ts';
import { bottledLines } from '../lines/bottled.ts';
import { line } from '../lines/line.ts';
import { mixedSampleLines } from '../lines/mixed-sample.ts';
import { numberText } from '../../replies/number-text.ts';
import { nothingLines, saidNothingNeeded, saidNothingToWeigh } from '../lines/nothing-needed.ts';
import { shortLines } from '../lines/stock.ts';
import { roundDoseLine, roundNothingLine } from '../lines/round-dose.ts';
import { vesselText } from '../lines/vessel.ts';
import { underLines, warningLines } from '../lines/warnings.ts';
import { workingLines } from '../lines/working.ts';
import { doseOf } from '../dose-of.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { toBeWeighed } from '../to-be-weighed.ts';
import { additiveOf, toDoseRequest } from '../to-requests.ts';
import { vesselsIn } from '../vessels-named.ts';
import { cappedDose } from './capped-dose.ts';
import { fermentStop } from './ferment-stop.ts';
import { noDose } from './no-dose.ts';
import { notPermitted } from './not-permitted.ts';
import { partialDose } from './partial-dose.ts';

/** Each way out of a choice says for itself how much it takes and whether it may be taken. */
const SAID_BY_THE_CHOICE: readonly WarningCode[] = [
  'free-needed-high',
  'addition-large',
  'total-over-limit',
  'total-near-limit',
  'total-unknown',
];

/** The answer to a question for a dose: no sulfite now, a choice, a dose, or what can be said so far and one question. */
export function answerDose(reading: Reading, turn: Turn): Outcome {
  const request = toDoseRequest(reading, turn.settings);
  const answer = doseOf(reading, turn.settings);
  if (reading.notes.some(({ id }) => id === 'ferment-stop')) return fermentStop(reading, null, turn);
  const refused = noDose(reading, answer, turn) ?? notPermitted(reading, answer, turn);
  if (refused) return refused;
  if (reading.asks.length > 0) return partialDose(reading, request, answer, turn);
  if (saidNothingToWeigh(answer)) return nothing(reading, answer, turn);
  if (answer.choices) return choice(reading, answer, turn);
  if (isCapped(answer)) return cappedDose(reading, answer, turn);
  return wholeDose(reading, request, answer, turn);
}

function wholeDose(reading: Reading, request: DoseRequest, answer: DoseAnswer, turn: Turn): Outcome {
  const additive = additiveOf(reading);
  if (additive === undefined || !hasAmount(answer)) return partialDose(reading, request, answer, turn);
  const { manner, ref } = turn;
  const inFull = !turn.cautioned.has(additive.id);
  const first = firstOfDose(vesselText(reading), answer, additive, manner);
  const condition = conditionLines(reading, answer, manner);
  const warned = warningLines(answer.warnings, manner, 'warning', lowIsSaid(reading));
  const said = [...underLines(answer.warnings, manner), ...warned];
  return {
    answer,
    inRound: [
      ...roundDoseLine(
        vesselText(reading),
        turn.round?.own ?? reading,
        answer,
        turn.round?.isOneAdditive ? undefined : additive,
        manner,
      ),
      ...underLines(answer.warnings, manner),
      ...warningLines(answer.warnings, manner, 'first', ['free-low-may-bind-all']).filter(isOfRound),
    ],
    // A line of a round says no more than its own line; its cautions stand under the round.
    lines: turn.round
      ? [...first, ...cautionLines(additive, inFull)]
      : [
          ...bottledLines(reading),
          ...first.slice(0, 1),
          ...underLines(answer.warnings, manner),
          ...first.slice(1),
          ...shortLines(toBeWeighed(reading, answer), turn.here),
          ...condition,
          ...bottlingLines(reading, answer, turn),
          ...expectationLines(reading, answer, otherArithmetic(request), manner),
          ...mixedSampleLines(reading),
          ...factLines(reading, manner),
          ...assumedLines(reading, manner),
          ...(said.some(({ key }) => NAMES_A_LIMIT.includes(key))
            ? lawAssumedLines(reading, turn.settings)
            : []),
          ...basisLines(reading, answer, manner),
          ...workingLines(answer.steps, manner),
          ...warned,
          ...cautionLines(additive, inFull),
        ],
    buttons: turn.round
      ? []
      : doseButtons(ref, {
          mayBeNoted:
            turn.here.role !== 'guest' &&
            vesselsIn(reading.fields).length > 0 &&
            toBeWeighed(reading, answer) !== undefined,
          stageAssumed: reading.assumed.stage !== undefined,
          mayBeRed: redFigures(answer) !== undefined,
          colourUnknown: isColourUnknown(reading),
          cautionsShort: !inFull,
        }),
    ...(inFull && { cautioned: additive.id }),
  };
}

/** What holds for a market as a whole would stand under every line of a round. */
function isOfRound({ key }: Line): boolean {
  return (
    key !== 'warning-total-unknown-most' &&
    key !== 'warning-limit-unconfirmed' &&
    key !== 'warning-no-limit-on-file'
  );
}

/** Lines that name a limit, so that what was taken for it is worth a word. */
const NAMES_A_LIMIT: readonly Line['key'][] = [
  'warning-total-near-limit',
  'warning-total-over-limit',
  'warning-total-unknown-most',
];

/** Whether a vessel is named whose colour nobody has told. */
function isColourUnknown({ fields }: Reading): boolean {
  return fields.vessel !== undefined && fields.style === undefined && fields.product === undefined;
}

/** Without allowance or share the line about landing says what a low free SO2 means. */
function lowIsSaid({ fields }: Reading): readonly WarningCode[] {
  const stated = fields.binding_allowance_percent ?? fields.binding_share;
  return stated === undefined && fields.free_mg_L !== undefined ? ['free-low-may-bind-all'] : [];
}

/** The same question with a share added read as a share lost, and the other way round; undefined with neither. */
function otherArithmetic(request: DoseRequest): DoseAnswer | undefined {
  const { binding_allowance_percent: percent, binding_share: share, ...rest } = request;
  if (percent !== undefined && percent > 0 && percent <= 80)
    return dose({ ...rest, binding_share: percent / 100 });
  return share === undefined ? undefined : dose({ ...rest, binding_allowance_percent: share * 100 });
}

function choice(reading: Reading, answer: DoseAnswer, turn: Turn): Outcome {
  const { manner, ref } = turn;
  const additive = additiveOf(reading);
  const vessel = vesselText(reading);
  const ph = numberText(reading.fields.ph ?? 0, 2, manner.mark);
  return {
    answer,
    inRound: [line('first', 'round-choice', { vessel, ph })],
    lines: [
      ...bottledLines(reading),
      ...choiceLines(reading, vessel, answer, additive, manner),
      ...underLines(answer.warnings, manner).filter(({ key }) => key !== 'warning-total-over-limit'),
      ...(reading.assumed.stage === undefined ? [] : [line('condition', 'condition-stage')]),
      ...bottlingLines(reading, answer, turn),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...basisLines(reading, answer, manner),
      ...warningLines(answer.warnings, manner, 'warning', SAID_BY_THE_CHOICE),
      // Under a choice there is no button `Safety`.
      ...(additive === undefined ? [] : cautionLines(additive, true)),
    ],
    buttons: choiceButtons(ref, answer.choices ?? [], redFigures(answer) !== undefined, manner),
    ...(additive && { cautioned: additive.id }),
  };
}

function nothing(reading: Reading, answer: DoseAnswer, turn: Turn): Outcome {
  const { manner, ref } = turn;
  const first = nothingLines(reading, answer, manner);
  return {
    answer,
    inRound: saidNothingNeeded(answer)
      ? roundNothingLine(vesselText(reading), turn.round?.own ?? reading, manner)
      : first.slice(0, 1),
    lines: [
      ...first,
      ...conditionLines(reading, answer, manner),
      ...bottlingLines(reading, answer, turn),
      ...factLines(reading, manner),
      ...assumedLines(reading, manner),
      ...warningLines(answer.warnings, manner, 'warning', ['rounding-coarse']),
    ],
    buttons: doseButtons(ref, {
      mayBeNoted: false,
      stageAssumed: reading.assumed.stage !== undefined,
      mayBeRed: false,
      colourUnknown: isColourUnknown(reading),
      cautionsShort: false,
    }),
  };
}
