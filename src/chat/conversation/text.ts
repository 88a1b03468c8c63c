import { readMessage } from '../reader/read-message.ts';
import type { Understood } from '../reader/understood.ts';
import { answerRound } from './answer-round.ts';
import { answerSingle } from './answer-single.ts';
import { bareNumberAfterTarget, isBareNumber, numberAskedAbout } from './bare-number.ts';
import { checkFields } from './check-fields.ts';
import { complete, completes } from './complete.ts';
import type { Memory, Waiting } from './memory.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import { handlePress } from './press.ts';
import type { Settings } from './settings.ts';
import { stillWaiting } from './waiting.ts';
import { withShared } from './with-shared.ts';

/** A text: a mark of a button, an answer to the question that waits, or a message of its own. */
export function handleText(
  message: IncomingMessage,
  text: string,
  memory: Memory,
  settings: Settings,
): Handled {
  const waiting = stillWaiting(memory, message.at);
  const mark = text.trim().toLowerCase();
  const letter = waiting?.letters[mark];
  if (waiting && letter) {
    const reading = checkFields(complete(waiting.reading, { fields: letter }, settings));
    const understood: Understood = {
      readings: [reading],
      shared: {},
      language: settings.language,
      decimalMark: memory.decimalMark ?? '.',
    };
    return answerSingle(message, understood, memory, settings);
  }
  const asked = bareNumberAfterTarget(message, mark, memory, settings);
  if (asked) return asked;
  const button = /^\d{1,2}$/.test(mark) ? memory.lastButtons[Number(mark) - 1] : undefined;
  if (!waiting && button !== undefined) return handlePress(message, button, memory, settings);
  // A number can be no answer to a question for a name: it is neither a choice nor a reading of its own.
  const understood =
    waiting?.field === 'additive' && isBareNumber(mark)
      ? numberAskedAbout(mark, settings, memory.decimalMark)
      : readMessage(text, settings, waiting);
  if (understood.readings.length === 1)
    return answerSingle(message, checked(completed(understood, waiting, settings)), memory, settings);
  return answerRound(message, checked(understood), memory, settings);
}

function checked(understood: Understood): Understood {
  return { ...understood, readings: understood.readings.map((one) => checkFields(one, understood.shared)) };
}

/** The message with its one reading completed by the one that waits, where it completes it. */
function completed(understood: Understood, waiting: Waiting | undefined, settings: Settings): Understood {
  const [only] = understood.readings;
  if (!waiting || !only || only.problems.length > 0) return understood;
  const next = withShared(only, understood.shared);
  if (!completes(waiting.reading, next)) return understood;
  return { ...understood, readings: [complete(waiting.reading, next, settings)], shared: {} };
}
