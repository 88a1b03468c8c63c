import type { CellarView } from '../../core/cellar/cellar-store.ts';
import { mustFigures } from '../../core/dose/must-ranges.ts';
import { finishReading } from '../reader/finish-reading.ts';
import type { Reading } from '../reader/understood.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import type { Line } from '../replies/reply.ts';
import { answerSingle } from './answer-single.ts';
import { parseEntryKey, parseKey, type Does } from './buttons.ts';
import { checkFields } from './check-fields.ts';
import { complete } from './complete.ts';
import { takeImport } from './handle-file.ts';
import { withVessels, type Here } from './here.ts';
import { readingKey } from './keys.ts';
import { stay, stayingWith } from './language.ts';
import { line } from './lines/line.ts';
import { questionLine } from './lines/question.ts';
import { vesselText } from './lines/vessel.ts';
import type { Memory, Remembered } from './memory.ts';
import { keeping, waitFor } from './next-memory.ts';
import type { Handled } from './ports.ts';
import { chosen } from './press/chosen.ts';
import { pressEntry } from './press/entry-buttons.ts';
import { askFullDose, ruleAgreedTo } from './press/full-dose.ts';
import { claimDose, noteDose, noteWorkedOut, orderDose } from './press/log-buttons.ts';
import { keepTitration } from './press/keep-titration.ts';
import { answerSampled } from './press/sampled.ts';
import { moreLines, safetyLines, workingOf } from './press/shown-again.ts';
import { asSaid } from './recall.ts';
import { pressRound } from './round/press-round.ts';
import { parseRoundKey } from './round/round-key.ts';
import type { Settings } from './settings.ts';
import { vesselsIn } from './vessels-named.ts';
import { choicesFor, letterAt, mayWaitFor, waitsFor } from './waiting.ts';
import { mannerOf } from './manner.ts';
import { withShelves } from './with-shelves.ts';

/** A button that was pressed: it means the same however often, and an old or unknown one gets a kind line. */
export async function handlePress(key: string, here: Here, view: CellarView): Promise<Handled> {
  const { settings, message } = here;
  const stays = stayingWith(key);
  if (stays !== undefined) return stay(stays, here);
  const ofEntry = parseEntryKey(key);
  if (ofEntry) return pressEntry(ofEntry, here, view);
  const ofRound = parseRoundKey(key);
  if (ofRound) return pressRound(ofRound, here, view);
  const button = parseKey(key);
  if (button?.does === 'i') return takeImport(button.ref, here, view);
  const kept = button && (await view.kept(readingKey(message.chat, button.ref)));
  const remembered = kept === undefined ? undefined : (JSON.parse(kept) as Remembered);
  // A button is for those who see it.
  if (!button || remembered?.chat !== message.chat) return saying(settings, [line('first', 'old-button')]);
  const { reading, at } = remembered;
  const found: Remembered = { ...remembered, reading: { ...reading, said_at: reading.said_at ?? at } };
  const known = await withVessels(here, view, vesselsIn(found.reading.fields));
  const near = await withShelves(known, view);
  switch (button.does) {
    case 'a':
      return noteDose(found, near, view);
    case 'k':
      return keepTitration(found, near, view);
    case 'n':
      return noteWorkedOut(found, near, view);
    case 'o':
      return orderDose(found, near, view);
    case 'gb':
    case 'ga':
    case 'gd':
      return answerSampled(found, button.does, near, view);
    case 'w':
    case 's':
    case 't':
    case 'm':
    case 'nf':
    case 'red':
    case 'white':
    case 'c':
    case 'p':
    case 'l':
    case 'y':
    case 'f':
    case 'fy':
      return pressed(button.does, button.which, found, near);
  }
}

function pressed(
  does: Exclude<Does, 'k' | 'a' | 'n' | 'o' | 'i' | 'gb' | 'ga' | 'gd'>,
  which: string,
  found: Remembered,
  here: Here,
): Handled {
  const { settings } = here;
  const again = (reading: Reading, chosenNow = false): Handled =>
    answerAgain(checkFields(withoutRule(reading)), here, chosenNow);
  switch (does) {
    case 'w':
      return saying(settings, workingOf(found.reading, here));
    case 's':
      return saying(settings, safetyLines(found.reading));
    case 'm':
      return moreOf(found, here);
    case 'nf':
      return again(complete(statedOf(found), { fields: { stage: 'malolactic' } }, settings));
    case 'red':
    case 'white':
      return again(complete(found.reading, { fields: { style: does } }, settings));
    case 'p': {
      const { marks, fields } = found.reading;
      const add_mg_L = marks.fruitState && mustFigures(marks.fruitState, fields.style)[Number(which)];
      if (add_mg_L === undefined) return saying(settings, [line('first', 'old-button')]);
      return again(complete(found.reading, { fields: { target: { add_mg_L } } }, settings), true);
    }
    case 'y':
      return claimDose(found, here);
    case 'f':
      return askFullDose(found, here);
    case 'fy': {
      const over_rule = ruleAgreedTo(found, here);
      if (over_rule === undefined) return again(found.reading);
      return answerAgain(checkFields({ ...found.reading, over_rule }), here, false);
    }
    case 't':
      return askTarget(found, here);
    case 'c': {
      const choice = chosen(found.reading, Number(which), here);
      if (choice === undefined) return saying(settings, [line('first', 'old-button')]);
      if ('lines' in choice) return saying(settings, choice.lines);
      return again(complete(found.reading, { fields: { target: choice.target } }, settings), true);
    }
    case 'l': {
      const field = waitsFor(found.reading);
      const choices = field === undefined ? [] : choicesFor(field, found.reading, settings);
      const fields = choices.find((_, at) => letterAt(at) === which);
      if (fields === undefined) return saying(settings, [line('first', 'old-button')]);
      return again(complete(found.reading, { fields }, settings));
    }
  }
}

/** That a rule may be passed was said of one dose, and of no other that is made of its reading. */
function withoutRule(reading: Reading): Reading {
  const { over_rule: _rule, ...fresh } = reading;
  return fresh;
}

/** The reading as the person stated it: without a target that was the bot's own offer. */
function statedOf({ reading, chosen: isOffer }: Remembered): Reading {
  return isOffer ? withoutTarget(reading) : reading;
}

function withoutTarget(reading: Reading): Reading {
  const { target: _target, ...fields } = reading.fields;
  return { ...reading, fields };
}

function markOf(memory: Memory): DecimalMark {
  return memory.decimalMark ?? '.';
}

function saying(settings: Settings, lines: readonly Line[]): Handled {
  return { writes: [], replies: [{ language: settings.language, lines, buttons: [] }] };
}

/** The reply to a reading that a button has changed; it is a new one, with buttons of its own. */
function answerAgain(reading: Reading, here: Here, isOffer: boolean): Handled {
  const { memory, settings } = here;
  const { writes, replies } = answerSingle(
    { readings: [reading], shared: {}, language: settings.language, decimalMark: markOf(memory) },
    here,
    { chosen: isOffer },
  );
  return { writes, replies };
}

function moreOf(found: Remembered, here: Here): Handled {
  const { memory, settings } = here;
  const { lines, buttons } = moreLines(found, here);
  const next: Memory = { ...memory, lastButtons: buttons.map(({ key }) => key) };
  return { writes: keeping(here, next), replies: [{ language: settings.language, lines, buttons }] };
}

/** Another target for a reading: it is asked for and waits, without the one before. */
function askTarget({ ref, reading }: Remembered, here: Here): Handled {
  const { memory, settings, message } = here;
  const { assumed: _assumed, asks: _asks, ...draft } = withoutTarget(withoutRule(reading));
  const without = finishReading(draft, settings);
  const { waiting: _before, ...others } = memory;
  // At a stage without a usual target nothing may wait: there it is to be written whole.
  const next: Memory = mayWaitFor('target', without)
    ? { ...others, waiting: waitFor('target', { ref, reading: asSaid(without), at: message.at }, settings) }
    : { ...others, askedTarget: { at: message.at, reading: without }, lastButtons: [] };
  const manner = mannerOf(without, markOf(memory), here);
  const question = questionLine('target', without, manner, settings, 'first');
  const ofWhich = line('first', 'target-of', { vessel: vesselText(reading) });
  return { ...saying(settings, [ofWhich, question]), writes: keeping(here, next) };
}
