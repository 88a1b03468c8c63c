import { finishReading } from '../reader/finish-reading.ts';
import type { Reading } from '../reader/understood.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import type { Line } from '../replies/reply.ts';
import { answerSingle } from './answer-single.ts';
import { parseKey } from './buttons.ts';
import { checkFields } from './check-fields.ts';
import { complete } from './complete.ts';
import { line } from './lines/line.ts';
import { questionLine } from './lines/question.ts';
import { vesselText } from './lines/vessel.ts';
import type { Memory, Remembered } from './memory.ts';
import { keeping, waitFor } from './next-memory.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import { chosen } from './press/chosen.ts';
import { moreLines, safetyLines, workingOf } from './press/shown-again.ts';
import type { Settings } from './settings.ts';
import { choicesFor, letterAt, mayWaitFor, waitsFor } from './waiting.ts';
import { mannerOf } from './manner.ts';

/** A button that was pressed: it means the same however often, and an old or unknown one gets a kind line. */
export function handlePress(
  message: IncomingMessage,
  key: string,
  memory: Memory,
  settings: Settings,
): Handled {
  const button = parseKey(key);
  const found = memory.remembered.find(({ number }) => number === button?.number);
  if (!button || !found) return saying(settings, [line('first', 'old-button')]);
  const again = (reading: Reading): Handled => answerAgain(message, checkFields(reading), memory, settings);
  switch (button.does) {
    case 'w':
      return saying(settings, workingOf(found.reading, markOf(memory), settings));
    case 's':
      return saying(settings, safetyLines(found.reading));
    case 'm':
      return moreOf(message, found, memory, settings);
    case 'nf':
      return again(complete(statedOf(found), { fields: { stage: 'malolactic' } }, settings));
    case 'red':
      return again(complete(found.reading, { fields: { style: 'red' } }, settings));
    case 't':
      return askTarget(message, found, memory, settings);
    case 'c': {
      const choice = chosen(found.reading, Number(button.which), markOf(memory), settings);
      if (choice === undefined) return saying(settings, [line('first', 'old-button')]);
      if ('lines' in choice) return saying(settings, choice.lines);
      return asChosen(again(complete(found.reading, { fields: { target: choice.target } }, settings)));
    }
    case 'l': {
      const field = waitsFor(found.reading);
      const choices = field === undefined ? [] : choicesFor(field, found.reading, settings);
      const fields = choices.find((_, at) => letterAt(at) === button.which);
      if (fields === undefined) return saying(settings, [line('first', 'old-button')]);
      return again(complete(found.reading, { fields }, settings));
    }
  }
}

/** The reading as the person stated it: without a target that was the bot's own offer. */
function statedOf({ reading, chosen: isOffer }: Remembered): Reading {
  return isOffer ? withoutTarget(reading) : reading;
}

function withoutTarget(reading: Reading): Reading {
  const { target: _target, ...fields } = reading.fields;
  return { ...reading, fields };
}

/** Keeps of the reading that was just answered that its target was an offer. */
function asChosen({ writes, ...rest }: Handled): Handled {
  return {
    ...rest,
    writes: writes.map(({ memory, ...write }) => {
      const { remembered } = memory;
      const last = remembered.slice(-1).map((one) => ({ ...one, chosen: true as const }));
      return { ...write, memory: { ...memory, remembered: [...remembered.slice(0, -1), ...last] } };
    }),
  };
}

function markOf(memory: Memory): DecimalMark {
  return memory.decimalMark ?? '.';
}

function saying(settings: Settings, lines: readonly Line[]): Handled {
  return { writes: [], replies: [{ language: settings.language, lines, buttons: [] }] };
}

/** The reply to a reading that a button has changed; it is a new one, with buttons of its own. */
function answerAgain(
  message: IncomingMessage,
  reading: Reading,
  memory: Memory,
  settings: Settings,
): Handled {
  const { writes, replies } = answerSingle(
    message,
    { readings: [reading], shared: {}, language: settings.language, decimalMark: markOf(memory) },
    memory,
    settings,
  );
  return { writes, replies };
}

function moreOf(message: IncomingMessage, found: Remembered, memory: Memory, settings: Settings): Handled {
  const { lines, buttons } = moreLines(found, markOf(memory), settings);
  const next: Memory = { ...memory, lastButtons: buttons.map(({ key }) => key) };
  return {
    writes: keeping(message, next),
    replies: [{ language: settings.language, lines, buttons }],
  };
}

/** Another target for a reading: it is asked for and waits, without the one before. */
function askTarget(
  message: IncomingMessage,
  { number, reading }: Remembered,
  memory: Memory,
  settings: Settings,
): Handled {
  const { assumed: _assumed, asks: _asks, ...draft } = withoutTarget(reading);
  const without = finishReading(draft, settings);
  const { waiting: _before, ...others } = memory;
  // At a stage without a usual target nothing may wait: there it is to be written whole.
  const next: Memory = mayWaitFor('target', without)
    ? { ...others, waiting: waitFor('target', { number, reading: without, at: message.at }, settings) }
    : { ...others, askedTarget: { at: message.at, reading: without }, lastButtons: [] };
  const manner = mannerOf(without, markOf(memory), settings);
  const question = questionLine('target', without, manner, settings, 'first');
  const ofWhich = line('first', 'target-of', { vessel: vesselText(reading) });
  return { ...saying(settings, [ofWhich, question]), writes: keeping(message, next) };
}
