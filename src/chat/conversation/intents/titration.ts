import type { TitrationAnswer } from '../../../core/laboratory/titration.ts';
import type { Reading } from '../../reader/understood.ts';
import { numberText } from '../../replies/number-text.ts';
import type { Line } from '../../replies/reply.ts';
import { buttonsFor } from '../buttons.ts';
import { assumedLines } from '../lines/assumed.ts';
import { line } from '../lines/line.ts';
import { resultLine, titrationAssumed, titrationFacts, titrationMeaning } from '../lines/titration.ts';
import { workingLines } from '../lines/working.ts';
import { redToldKey } from '../keys.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { gapOf, isTooMuch, resultOf, titrationOf, toTitration } from '../to-titration.ts';

/** A titration: what it comes to, what that means, and for a vessel one tap that keeps it; nothing is kept before. */
export function answerTitration(reading: Reading, turn: Turn): Outcome {
  const { manner, ref, here } = turn;
  const said = reading.titration ?? {};
  const titration = toTitration(said);
  const answer = titrationOf(said);
  if (titration === undefined || answer === undefined) return gap(reading, turn);
  const { vessel } = reading.fields;
  const first = resultLine(reading, titration, answer, manner);
  const tooMuch = isTooMuch(answer) ? [line('first', 'titration-too-much')] : [];
  const high = redReadsHigh(reading, turn);
  return {
    answer,
    inRound: [first, ...tooMuch],
    lines: [
      first,
      ...tooMuch,
      ...titrationMeaning(said, titration, answer, manner),
      ...high,
      ...(vessel === undefined ? [line('question', 'titration-name-vessel')] : []),
      ...titrationFacts(said, manner, reading.fields.ph),
      ...titrationAssumed(said),
      ...assumedLines(reading, manner),
      ...workingLines(answer.steps, manner),
    ],
    buttons: vessel === undefined || here.role === 'guest' || isTooMuch(answer) ? [] : buttonsFor(ref, ['k']),
    // In a round it is not said.
    ...(high.length > 0 &&
      turn.round === undefined &&
      vessel !== undefined && { keeps: [{ kind: 'keep', key: redToldKey(vessel), text: '1' } as const] }),
  };
}

/** Acidified methods set free what anthocyanins hold: said once of a red, and never corrected. */
function redReadsHigh({ fields, titration }: Reading, { here }: Turn): Line[] {
  const known = fields.vessel === undefined ? undefined : here.vessels.get(fields.vessel);
  const style = fields.style ?? known?.traits.style?.value;
  const isFree = titration?.of !== 'total';
  return isFree && style === 'red' && here.isRedTold !== true ? [line('effect', 'titration-red-high')] : [];
}

/** What is missing, with the whole message that would be read; of iodine without N or M what either would give. */
function gap(reading: Reading, { manner }: Turn): Outcome {
  const said = reading.titration ?? {};
  const missing = gapOf(said) ?? 'strength';
  const asked = line('first', 'titration-asks', { missing, method: said.method ?? 'none' });
  const lines = [
    asked,
    ...(missing === 'unit' ? eitherUnit(reading, manner) : []),
    ...titrationFacts(said, manner),
  ];
  return { answer: null, inRound: [asked], lines, buttons: [] };
}

function eitherUnit({ titration = {} }: Reading, { mark, unit }: Turn['manner']): Line[] {
  const { titrant } = titration;
  if (titrant === undefined || !('strength' in titrant)) return [];
  const as = (one: 'N' | 'M'): TitrationAnswer | undefined =>
    titrationOf({ ...titration, titrant: { strength: titrant.strength, unit: one } });
  const [normal, molar] = [as('N'), as('M')];
  if (normal === undefined || molar === undefined) return [];
  return [
    line('effect', 'titration-either', {
      strength: numberText(titrant.strength, 6, mark),
      normal: numberText(resultOf(normal), 1, mark),
      molar: numberText(resultOf(molar), 1, mark),
      unit,
    }),
  ];
}
