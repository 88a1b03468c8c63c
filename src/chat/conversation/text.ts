import type { CellarView } from '../../core/cellar/cellar-store.ts';
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
import { withVessels, type Here } from './here.ts';
import { answerCommand } from './intents/command/command.ts';
import { keepManner } from './keep-manner.ts';
import { line } from './lines/line.ts';
import type { Memory, Waiting } from './memory.ts';
import { refAt } from './next-memory.ts';
import type { Handled } from './ports.ts';
import { handlePress } from './press.ts';
import { parseRoundKey } from './round/round-key.ts';
import { agreement } from '../reader/agreement.ts';
import { replying } from './replying.ts';
import type { Settings } from './settings.ts';
import { strengthAnswer } from './strength-answer.ts';
import { vesselsNamed } from './vessels-named.ts';
import { stillWaiting } from './waiting.ts';
import { withRedTold } from './with-red-told.ts';
import { withShared } from './with-shared.ts';
import { withShelvesFor } from './with-shelves.ts';

/** A text: a mark of a button, an answer to the question that waits, or a message of its own. */
export async function handleText(text: string, here: Here, view: CellarView): Promise<Handled> {
  const { message, memory, settings } = here;
  const waiting = stillWaiting(memory, message.at);
  const mark = text.trim().toLowerCase();
  const chosen = waiting && (waiting.letters[mark] ?? choiceByWords(mark, waiting));
  if (chosen) return answerChosen(waiting, chosen, here, view);
  const key = waiting ? undefined : (buttonOfMark(mark, memory) ?? agreedKey(text, memory));
  if (key !== undefined) return handlePress(key, here, view);
  if (!waiting && isNoButton(mark, memory)) return noSuchButton(mark, here);
  if (!waiting && askedAllTheSame(memory) !== undefined && agreement(text) === 'no')
    return replying(here, { lines: [line('first', 'full-dose-left')] });
  const understood = keepManner(read(text, mark, waiting, memory, settings), text, memory);
  const alone = figureAfterTarget(text.trim(), understood, here);
  if (alone) return alone;
  const whole = completed(understood, waiting, settings);
  const near = await withShelvesFor(whole, await withVessels(here, view, vesselsNamed(whole)), view);
  const [only, another] = whole.readings;
  if (only === undefined || another) return answerRound(checked(whole), near);
  const plan = only && addedAsPlanned(only, near);
  if (plan !== undefined) return handlePress(plan, near, view);
  const commanded = only.intent === 'command' ? await answerCommand(only, near, view) : undefined;
  if (commanded) return { ...commanded, understood: whole, answers: commanded.answers ?? [null] };
  const told = only.intent === 'titration' ? await withRedTold(near, only, view) : near;
  return answerSingle(checked(whole), told, { completes: whole !== understood });
}

/** A number while no field waits presses the button that has it. */
function buttonOfMark(mark: string, { lastButtons }: Memory): string | undefined {
  return /^\d{1,3}$/.test(mark) ? lastButtons[Number(mark) - 1] : undefined;
}

/** The question whether the full dose is to be given all the same, where it stands in the last reply. */
const askedAllTheSame = ({ lastButtons }: Memory): string | undefined =>
  lastButtons.find((key) => parseKey(key)?.does === 'fy');

/** "Yes" to that question. */
function agreedKey(text: string, memory: Memory): string | undefined {
  const asked = askedAllTheSame(memory);
  return asked !== undefined && agreement(text) === 'yes' ? asked : undefined;
}

/** A number that could be meant for a button, and that none has. */
function isNoButton(mark: string, memory: Memory): boolean {
  if (!/^\d{1,3}$/.test(mark) || memory.lastButtons.length === 0) return false;
  return mark.length === 1 || followsChoice(memory);
}

/** After a choice a number may repeat one of its figures, which is no reading. */
function followsChoice({ lastButtons, lastWasChosen }: Memory): boolean {
  return lastButtons.some((key) => parseKey(key)?.does === 'c') || lastWasChosen === true;
}

/** "I added it": what was reckoned for that vessel last went in, or what stands above. */
function addedAsPlanned({ fields, command }: Reading, here: Here): string | undefined {
  const { vessel } = fields;
  if (command?.name === 'full-dose')
    return here.memory.lastButtons.find((key) => parseKey(key)?.does === 'f') ?? `f:${refAt(here, -1)}`;
  if (command?.name !== 'added-it') return undefined;
  if (vessel === undefined)
    return here.memory.lastButtons.find(
      (key) => parseKey(key)?.does === 'a' || parseRoundKey(key)?.does === 'ra',
    );
  const plan = here.plans.get(vessel);
  return plan?.chat === here.message.chat ? `a:${plan.ref}` : undefined;
}

async function answerChosen(
  waiting: Waiting,
  fields: Fields,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { memory, settings } = here;
  const reading = checkFields(complete(waiting.reading, { fields }, settings));
  const decimalMark = memory.decimalMark ?? '.';
  const understood = { readings: [reading], shared: {}, language: settings.language, decimalMark };
  const known = await withVessels(here, view, vesselsNamed(understood));
  const near = await withShelvesFor(understood, known, view);
  return answerSingle(understood, near, { completes: true });
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
  const [only, another] = understood.readings;
  if (!waiting || !only || another || only.problems.length > 0) return understood;
  const next: Reading = asAnswered(waiting, withShared(only, understood.shared));
  if (!answers(waiting, next)) return understood;
  return { ...understood, readings: [completeWaiting(waiting, next, settings)], shared: {} };
}
