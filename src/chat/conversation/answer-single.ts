import type { Reading, Understood } from '../reader/understood.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import type { Reply } from '../replies/reply.ts';
import { answerReading } from './answer-reading.ts';
import { belongs } from './complete.ts';
import { questionFor } from './intents/asking.ts';
import { mannerOf } from './manner.ts';
import type { Memory, Waiting } from './memory.ts';
import { cautionedToday, keeping, nextMemory, waitFor } from './next-memory.ts';
import type { Outcome } from './outcome.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import type { Settings } from './settings.ts';
import { stillWaiting } from './waiting.ts';
import { withShared } from './with-shared.ts';

/** One reading: its answer, the reply, and what is kept for the next message. */
export function answerSingle(
  message: IncomingMessage,
  understood: Understood,
  memory: Memory,
  settings: Settings,
): Handled {
  const [first] = understood.readings;
  if (!first) return { writes: [], replies: [], understood, answers: [] };
  const reading = withShared(first, understood.shared);
  const outcome = answerReading(reading, understood.language, {
    settings,
    manner: mannerOf(reading, understood.decimalMark, settings),
    number: memory.nextNumber,
    cautioned: cautionedToday(memory, message.at),
  });
  const kept = keepsWaiting(reading, stillWaiting(memory, message.at));
  const asked =
    kept && reading.problems.length > 0 ? askAgain(kept, outcome, understood.decimalMark, settings) : outcome;
  const waiting =
    outcome.waits === undefined
      ? kept
      : waitFor(outcome.waits, { number: memory.nextNumber, reading, at: message.at }, settings);
  const reply: Reply = { language: settings.language, lines: asked.lines, buttons: asked.buttons };
  const next = nextMemory(memory, message.at, understood, [{ reading, outcome }], {
    buttons: reply.buttons,
    waiting,
  });
  return { writes: keeping(message, next), replies: [reply], understood, answers: [outcome.answer] };
}

/** Talk in between leaves a question waiting, and so does a slip in the answer to it. */
function keepsWaiting(reading: Reading, waiting: Waiting | undefined): Waiting | undefined {
  if (!waiting || reading.intent === 'chat') return waiting;
  return reading.problems.length > 0 && belongs(waiting.reading, reading) ? waiting : undefined;
}

function askAgain(
  waiting: Waiting,
  outcome: Outcome,
  mark: DecimalMark,
  settings: Settings,
): Pick<Outcome, 'lines' | 'buttons'> {
  const { question, buttons } = questionFor(waiting.field, waiting, 'question', mark, settings);
  return { lines: [...outcome.lines, ...question], buttons };
}
