import { landingOf } from '../../../core/cellar/landing-of.ts';
import type { DoseAnswer } from '../../../core/dose/answer.ts';
import type { Reading } from '../../reader/understood.ts';
import { momentText } from '../../replies/moment-text.ts';
import type { Line } from '../../replies/reply.ts';
import { vesselName } from '../../replies/vessel-name.ts';
import { planKey } from '../keys.ts';
import { landedLines } from '../lines/landed.ts';
import { withLearned } from '../lab/with-learned.ts';
import { withRange } from '../lab/with-range.ts';
import { line } from '../lines/line.ts';
import { onItLines } from '../lines/on-it.ts';
import type { Outcome, Turn } from '../outcome.ts';
import { PLAN_ms, type Plan } from '../plan.ts';
import { saidFields } from '../recall.ts';
import { toBeWeighed } from '../to-be-weighed.ts';
import { tellingOf } from '../telling.ts';
import { whenOf } from '../when.ts';
import { answerDose } from './dose.ts';
import { dosedAlready } from './dosed-already.ts';

/**
 * The answer to a question for a dose, with what is known of the vessel: what went in before comes first, then the dose,
 * where the last addition landed, and who else is about to dose it.
 */
export function answerDoseOfVessel(reading: Reading, turn: Turn): Outcome {
  const dosed = dosedAlready(reading, turn);
  if (dosed) return dosed;
  const outcome = withLearned(reading, withRange(reading, answerDose(reading, turn), turn), turn);
  const landed = landedAt(reading, turn);
  const news = [...emptyLines(reading, turn), ...landed, ...onItLines(reading, turn.here)];
  const isLanding = landed.length > 0 && saidFields(reading).target === undefined;
  return {
    ...outcome,
    lines: afterFirst(outcome.lines, news),
    keeps: planOf(reading, outcome, turn),
    ...(isLanding && { isLanding: true as const }),
  };
}

/** What has to be seen stands right under the answer. */
function afterFirst(lines: readonly Line[], news: readonly Line[]): Line[] {
  const at = lines.findIndex(({ room }) => room !== 'first');
  const place = at < 0 ? lines.length : at;
  return [...lines.slice(0, place), ...news, ...lines.slice(place)];
}

/** That the vessel was down as empty: a slip of its name, or wine that nobody told of. */
function emptyLines({ fields }: Reading, { here }: Turn): Line[] {
  const vessel = fields.vessel === undefined ? undefined : here.vessels.get(fields.vessel);
  if (vessel?.empty === undefined) return [];
  const values = { vessel: vesselName(vessel.vessel), when: momentText(vessel.empty, tellingOf(here)) };
  return [line('first', 'odd-empty', values)];
}

/** Where the additions before this sample landed. */
function landedAt(reading: Reading, turn: Turn): Line[] {
  const { here } = turn;
  const { vessel: name, free_mg_L } = saidFields(reading);
  const vessel = name === undefined ? undefined : here.vessels.get(name);
  if (vessel === undefined || free_mg_L === undefined) return [];
  if (reading.marks.conditional || reading.noted?.includes('free_mg_L')) return [];
  const landing = landingOf(vessel, { entry: here.nextEntry, at: whenOf(reading, here).at, free_mg_L });
  return landing ? landedLines(vessel.vessel, landing, turn) : [];
}

/** Keeps what is to be weighed, so that an addition told later is known to be it. */
function planOf(reading: Reading, { answer }: Outcome, { here, ref }: Turn): Outcome['keeps'] & object {
  const { vessel } = reading.fields;
  const weighed = answer === null ? undefined : toBeWeighed(reading, answer as DoseAnswer);
  if (vessel === undefined || weighed === undefined) return [];
  const { at, chat } = here.message;
  const plan: Plan = { ...weighed, ref, chat, at };
  return [{ kind: 'keep', key: planKey(vessel), text: JSON.stringify(plan), until: at + PLAN_ms }];
}
