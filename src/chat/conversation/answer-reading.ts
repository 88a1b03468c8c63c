import type { Language, Reading } from '../reader/understood.ts';
import { answerAdded } from './intents/added.ts';
import { answerChat } from './intents/chat.ts';
import { answerOrder } from './intents/command/order.ts';
import { answerStatement } from './intents/command/statement.ts';
import { answerDoseOfVessel } from './intents/dose-of-vessel.ts';
import { answerEffect } from './intents/effect.ts';
import { answerEmergency } from './intents/emergency.ts';
import { answerOtherAddition } from './intents/other-addition.ts';
import { answerProblem } from './intents/problem.ts';
import { answerReading as answerKeptReading } from './intents/reading.ts';
import { answerSolution } from './intents/solution.ts';
import { answerTitration } from './intents/titration.ts';
import { whenIsUnclear } from './intents/when-unclear.ts';
import { line } from './lines/line.ts';
import type { Outcome, Turn } from './outcome.ts';

/**
 * What to say to one reading: an emergency before a problem, a problem before every figure. Never nothing: where no
 * answer, question, problem or talk comes of it, it is asked for anew.
 */
export function answerReading(reading: Reading, language: Language, turn: Turn): Outcome {
  const outcome = answerByIntent(reading, language, turn);
  if (saysSomething(outcome)) return outcome;
  const lines = [line('first', 'problem-not-understood'), ...outcome.lines];
  return { answer: null, inRound: lines.slice(0, 1), lines, buttons: [] };
}

/** An order; every other command stands alone in its message. */
function answerOrdered(reading: Reading, turn: Turn): Outcome {
  return reading.command?.name === 'order' ? answerOrder(reading, turn) : answerChat(reading);
}

/** Lines about what was read or assumed alone tell nobody anything. */
function saysSomething({ lines, inRound }: Outcome): boolean {
  return (
    inRound.length > 0 &&
    lines.some(({ room }) => room === 'first' || room === 'question' || room === 'effect')
  );
}

/** A sample that is still to be taken tells nothing; of a dose for tomorrow only its own hour counts. */
function sampledWhen(reading: Reading, turn: Turn): Outcome | undefined {
  const isOfSample =
    reading.intent === 'reading' ||
    reading.intent === 'titration' ||
    (reading.intent === 'dose' && reading.when !== undefined);
  return isOfSample ? whenIsUnclear(reading, turn) : undefined;
}

function answerByIntent(reading: Reading, language: Language, turn: Turn): Outcome {
  if (reading.intent === 'emergency') return answerEmergency(language, reading.topic);
  if (reading.problems.length > 0) return answerOtherAddition(reading, turn) ?? answerProblem(reading, turn);
  const unsaid = reading.when || reading.marks.toCome ? sampledWhen(reading, turn) : undefined;
  if (unsaid) return unsaid;
  switch (reading.intent) {
    case 'dose':
      return answerDoseOfVessel(reading, turn);
    case 'effect':
      return answerEffect(reading, turn);
    case 'added':
      return answerAdded(reading, turn);
    case 'reading':
      return answerKeptReading(reading, turn);
    case 'solution':
      return answerSolution(reading, turn);
    case 'command':
      return answerStatement(reading, turn) ?? answerOrdered(reading, turn);
    case 'titration':
      return answerTitration(reading, turn);
    case 'chat':
      return answerChat(reading);
  }
}
