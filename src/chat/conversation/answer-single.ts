import type { FieldName, Reading, Understood } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { answerReading } from './answer-reading.ts';
import { isBareNumber } from './bare-number.ts';
import { belongs } from './complete.ts';
import { questionFor } from './intents/asking.ts';
import { line } from './lines/line.ts';
import { withKept } from './lines/kept.ts';
import { problemLines } from './lines/problems.ts';
import { vesselText } from './lines/vessel.ts';
import { mannerOf, type Manner } from './manner.ts';
import type { Here } from './here.ts';
import type { Waiting } from './memory.ts';
import { cautionedToday, keeping, nextMemory, refAt, remembering, waitFor } from './next-memory.ts';
import { noting } from './note.ts';
import { notesOfReading } from './notes-of-reading.ts';
import type { Outcome } from './outcome.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import { asNoted, prepare } from './prepare.ts';
import { asSaid } from './recall.ts';
import type { Settings } from './settings.ts';
import { vesselsProblem } from './vessels-in-problem.ts';
import { stillWaiting } from './waiting.ts';
import { withShared } from './with-shared.ts';

/**
 * One reading: its answer, the reply, and what is kept for the next message.
 *
 * @param completes whether the reading is the one that waited, with its answer
 */
export function answerSingle(
  understood: Understood,
  here: Here,
  { completes = false, chosen = false }: { readonly completes?: boolean; readonly chosen?: boolean } = {},
): Handled {
  const { message, memory, settings } = here;
  const [first] = understood.readings;
  if (!first) return { writes: [], replies: [], understood, answers: [] };
  const reading = prepare(withShared(first, understood.shared), here);
  const manner = mannerOf(reading, understood.decimalMark, here);
  const ref = refAt(here);
  const cautioned = cautionedToday(memory, message.at);
  const outcome = answerReading(reading, understood.language, { settings, manner, ref, cautioned, here });
  const notes = [...notesOfReading(reading, here), ...(outcome.notes ?? [])];
  const logged = asNoted(reading, here);
  const before = stillWaiting(memory, message.at);
  const kept = completes && outcome.doubt ? undefined : keepsWaiting(reading, before);
  const asked = kept ? askAgain(kept, reading, outcome, manner, settings) : outcome;
  const waiting = kept ?? waitingFor(outcome, logged, ref, message.at, settings);
  const muddle = vesselsProblem(textOf(message), reading, settings);
  const lines = muddle
    ? [muddle, line('question', 'problem-no-number', { again: 'correction' })]
    : withKept(asked.lines, reading, here, notes);
  const reply: Reply = { language: settings.language, lines, buttons: asked.buttons };
  const said = [{ reading: logged, outcome, ref }];
  const next = nextMemory(here, understood, said, { buttons: reply.buttons, waiting, chosen });
  return {
    writes: [
      ...noting(here, notes),
      ...(outcome.keeps ?? []),
      ...remembering(here, said, chosen),
      ...keeping(here, next),
    ],
    replies: [reply],
    understood: {
      ...understood,
      readings: [outcome.isLanding ? { ...reading, intent: 'reading' } : reading],
    },
    answers: [outcome.answer],
  };
}

function textOf({ content }: IncomingMessage): string {
  return content.kind === 'text' ? content.text : '';
}

/** What the reply waits for from now on: the field that it asks, or the figure that is in doubt. */
function waitingFor(
  { waits, doubt }: Outcome,
  reading: Reading,
  ref: string,
  at: number,
  settings: Settings,
): Waiting | undefined {
  if (doubt !== undefined) {
    const { field, reading: kept, problems, settledBy, byBareNumber } = doubt;
    const waiting = waitFor(field, { ref, reading: asSaid(kept), at }, settings);
    return { ...waiting, doubt: { problems, settledBy, byBareNumber } };
  }
  return waits === undefined ? undefined : waitFor(waits, { ref, reading: asSaid(reading), at }, settings);
}

/** Talk in between leaves a question waiting, and so does a slip in the answer to it. */
function keepsWaiting(reading: Reading, waiting: Waiting | undefined): Waiting | undefined {
  if (!waiting || reading.intent === 'chat') return waiting;
  return reading.problems.length > 0 && isSlip(waiting.reading, reading) ? waiting : undefined;
}

/** An answer with something wrong in it says little else; what says more, or names a vessel, is a message of its own. */
function isSlip(waiting: Reading, next: Reading): boolean {
  const names = Object.keys(next.fields) as FieldName[];
  const own = names.filter((name) => waiting.fields[name] === undefined);
  return belongs(waiting, next) && own.length <= 1 && !own.includes('vessel') && !own.includes('vessels');
}

/** The question once more after a slip in its answer, and after a nod that answers nothing; not after other talk. */
function askAgain(
  waiting: Waiting,
  reading: Reading,
  outcome: Outcome,
  manner: Manner,
  settings: Settings,
): Pick<Outcome, 'lines' | 'buttons'> {
  const nods = reading.intent === 'chat' && reading.topic === 'thanks';
  if (!nods && reading.problems.length === 0) return outcome;
  const said = nods ? [line('first', 'still-asked')] : slipLines(waiting, reading, outcome);
  if (waiting.doubt !== undefined) {
    const doubtful: Reading = { ...waiting.reading, problems: waiting.doubt.problems };
    const doubt = problemLines(doubtful, vesselText(waiting.reading), manner.mark, 'correction');
    const isTheSame = JSON.stringify(reading.problems) === JSON.stringify(waiting.doubt.problems);
    const slip = said.filter(({ key }) => key !== 'problem-no-number');
    return { lines: [...(isTheSame ? [] : slip), ...doubt], buttons: [] };
  }
  const { question, buttons } = questionFor(waiting.field, waiting, 'question', manner, settings);
  return { lines: [...said, ...question], buttons };
}

/** What was wrong with an answer; a number is none to a question whose choices carry letters. */
function slipLines(waiting: Waiting, { problems }: Reading, outcome: Outcome): Outcome['lines'] {
  const text = problems[0]?.about ?? '';
  const last = Object.keys(waiting.letters).at(-1);
  if (waiting.field !== 'additive' || last === undefined || !isBareNumber(text)) return outcome.lines;
  return [line('first', 'no-such-choice', { text, last })];
}
