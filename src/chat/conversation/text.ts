import { readMessage } from '../reader/read-message.ts';
import type { Fields, Reading, Understood } from '../reader/understood.ts';
import { answerOfNames } from './answer-of-names.ts';
import { answerRound } from './answer-round.ts';
import { answerSingle } from './answer-single.ts';
import { figureAfterTarget, isBareNumber, noSuchButton, numberAskedAbout } from './bare-number.ts';
import { parseKey } from './buttons.ts';
import { checkFields } from './check-fields.ts';
import { choiceByWords } from './choice-by-words.ts';
import { answers, asAnswered, complete, completeWaiting } from './complete.ts';
import { keepManner } from './keep-manner.ts';
import type { Memory, Waiting } from './memory.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import { handlePress } from './press.ts';
import type { Settings } from './settings.ts';
import { strengthAnswer } from './strength-answer.ts';
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
  const chosen = waiting && (waiting.letters[mark] ?? choiceByWords(mark, waiting));
  if (chosen) return answerChosen(message, waiting, chosen, memory, settings);
  if (!waiting) {
    const pressed = byKeyboard(message, mark, memory, settings);
    if (pressed) return pressed;
  }
  const understood = keepManner(read(text, mark, waiting, memory, settings), text, memory);
  const alone = figureAfterTarget(message, text.trim(), understood, memory, settings);
  if (alone) return alone;
  if (understood.readings.length !== 1) return answerRound(message, checked(understood), memory, settings);
  const whole = completed(understood, waiting, settings);
  return answerSingle(message, checked(whole), memory, settings, whole !== understood);
}

/** A number while no field waits: a button, or one that no button has. */
function byKeyboard(
  message: IncomingMessage,
  mark: string,
  memory: Memory,
  settings: Settings,
): Handled | undefined {
  if (!/^\d{1,3}$/.test(mark) || memory.lastButtons.length === 0) return undefined;
  const button = memory.lastButtons[Number(mark) - 1];
  if (button !== undefined) return handlePress(message, button, memory, settings);
  return mark.length === 1 || followsChoice(memory) ? noSuchButton(mark, memory, settings) : undefined;
}

/** After a choice a number may repeat one of its figures, which is no reading. */
function followsChoice({ lastButtons, remembered }: Memory): boolean {
  return lastButtons.some((key) => parseKey(key)?.does === 'c') || remembered.at(-1)?.chosen === true;
}

function answerChosen(
  message: IncomingMessage,
  waiting: Waiting,
  fields: Fields,
  memory: Memory,
  settings: Settings,
): Handled {
  const reading = checkFields(complete(waiting.reading, { fields }, settings));
  const decimalMark = memory.decimalMark ?? '.';
  const understood = { readings: [reading], shared: {}, language: settings.language, decimalMark };
  return answerSingle(message, understood, memory, settings, true);
}

/** The message as it is read beside the question that waits. */
function read(
  text: string,
  mark: string,
  waiting: Waiting | undefined,
  memory: Memory,
  settings: Settings,
): Understood {
  if (waiting && isBareNumber(mark)) {
    const { doubt } = waiting;
    const again = { ...waiting.reading, problems: doubt?.problems ?? [], asks: [] };
    const asked = numberAskedAbout(mark, settings, memory.decimalMark);
    // A number alone leaves in doubt which figure it is.
    if (doubt && !doubt.byBareNumber && !mark.startsWith('+')) return { ...asked, readings: [again] };
    // A number can be no answer to a question for a name: it is neither a choice nor a reading of its own.
    if (waiting.field === 'additive') return asked;
  }
  const said = waiting?.field === 'strength_percent' ? strengthAnswer(text) : text;
  const understood = readMessage(
    said,
    settings,
    waiting?.doubt?.byBareNumber === false ? undefined : waiting,
  );
  return waiting ? withNames(understood, text, waiting, settings) : understood;
}

/** A name alone is talk to the reader; beside a question for it, it is the answer. */
function withNames(understood: Understood, text: string, waiting: Waiting, settings: Settings): Understood {
  const [only, another] = understood.readings;
  if (only === undefined || another !== undefined || only.intent !== 'chat' || only.topic !== undefined)
    return understood;
  const names = answerOfNames(text, waiting, settings);
  if (names === undefined) return understood;
  return { ...understood, readings: [{ ...only, ...names, intent: waiting.reading.intent, problems: [] }] };
}

function checked(understood: Understood): Understood {
  return { ...understood, readings: understood.readings.map((one) => checkFields(one, understood.shared)) };
}

/** The message with its one reading completed by the one that waits, where it completes it. */
function completed(understood: Understood, waiting: Waiting | undefined, settings: Settings): Understood {
  const [only] = understood.readings;
  if (!waiting || !only || only.problems.length > 0) return understood;
  const next: Reading = asAnswered(waiting, withShared(only, understood.shared));
  if (!answers(waiting, next)) return understood;
  return { ...understood, readings: [completeWaiting(waiting, next, settings)], shared: {} };
}
