import type { AdditiveAtHand } from '../../core/additives/additive-id.ts';
import type { Reading, Understood } from '../reader/understood.ts';
import type { Button, Line, Reply } from '../replies/reply.ts';
import { answerReading } from './answer-reading.ts';
import { buttonsFor } from './buttons.ts';
import { roundFoot, type SaidInRound } from './lines/round-foot.ts';
import { roundHead } from './lines/round-head.ts';
import { roundName } from './lines/round-names.ts';
import { vesselText } from './lines/vessel.ts';
import { mannerOf } from './manner.ts';
import type { Memory } from './memory.ts';
import { cautionedToday, keeping, nextMemory, type Said } from './next-memory.ts';
import type { Turn } from './outcome.ts';
import type { Handled, IncomingMessage } from './ports.ts';
import type { Settings } from './settings.ts';
import { additiveOf } from './to-requests.ts';
import { withShared } from './with-shared.ts';

/** Vessels in one message; the others follow in a second one. */
const VESSELS_A_MESSAGE = 25;

/** A round of vessels: a line each; the stage, what was assumed and the cautions once. Nothing waits for an answer. */
export function answerRound(
  message: IncomingMessage,
  understood: Understood,
  memory: Memory,
  settings: Settings,
): Handled {
  const cautioned = cautionedToday(memory, message.at);
  const text = message.content.kind === 'text' ? message.content.text : '';
  const { decimalMark, shared } = understood;
  const additive = oneAdditive(understood);
  const said: SaidInRound[] = understood.readings.map((own, place) => {
    const reading = withShared(own, shared);
    const manner = mannerOf(reading, decimalMark, settings);
    const name = roundName(text, own);
    const round = { own: withoutVolumeIn(own, name), isOneAdditive: additive !== undefined };
    const number = memory.nextNumber + place;
    const turn: Turn = { settings, manner, number, cautioned, round };
    const outcome = answerReading(named(reading, name), understood.language, turn);
    return { reading, outcome, name: name ?? vesselText(reading) };
  });
  const buttons = safetyButton(said, cautioned, memory.nextNumber);
  const [first] = said;
  const head = first ? roundHead(additive, shared, mannerOf(first.reading, decimalMark, settings)) : [];
  const foot = roundFoot(said, cautioned, decimalMark, settings);
  const replies = chunks(said, VESSELS_A_MESSAGE).map((chunk, at): Reply => {
    const lines: Line[] = [...head, ...chunk.flatMap(({ outcome }) => warningsLast(outcome.inRound))];
    return {
      language: settings.language,
      lines: at === 0 ? [...lines, ...foot] : lines,
      buttons: at === 0 ? buttons : [],
    };
  });
  const next = nextMemory(memory, message.at, understood, said, { buttons });
  return {
    writes: keeping(message, next),
    replies,
    understood,
    answers: said.map(({ outcome }) => outcome.answer),
  };
}

/** What a warning is about stands above it. */
function warningsLast(lines: readonly Line[]): Line[] {
  const isWarning = ({ key }: Line): boolean => key.startsWith('warning-');
  return [...lines.filter((one) => !isWarning(one)), ...lines.filter(isWarning)];
}

/** The one additive that all doses of a round take, named once above them; undefined where there are several. */
function oneAdditive({ readings, shared }: Understood): AdditiveAtHand | undefined {
  const whole = readings.map((one) => withShared(one, shared));
  const doses = whole.filter(({ intent, problems }) => intent === 'dose' && problems.length === 0);
  const additives = doses.map(additiveOf).filter((one) => one !== undefined);
  const [first] = additives;
  const isOne = new Set(additives.map((one) => JSON.stringify(one))).size === 1;
  return isOne && doses.some(({ asks }) => asks.length === 0) ? first : undefined;
}

/** A wine without a vessel goes by the words of its line. */
function named(reading: Reading, name: string | undefined): Reading {
  if (name === undefined) return reading;
  return { ...reading, fields: { ...reading.fields, vessel: name } };
}

/** Words that hold the volume need not be followed by it. */
function withoutVolumeIn(own: Reading, name: string | undefined): Reading {
  const written = own.where.volume_L?.text;
  if (name === undefined || written === undefined || !name.endsWith(written)) return own;
  const { volume_L: _named, ...fields } = own.fields;
  return { ...own, fields };
}

/** The cautions in full, where they stand in one line as they were said before. */
function safetyButton(said: readonly Said[], cautioned: ReadonlySet<string>, from: number): Button[] {
  const place = said.findIndex(({ reading, outcome }) => {
    const additive = outcome.answer === null ? undefined : additiveOf(reading);
    return additive !== undefined && cautioned.has(additive.id);
  });
  return place < 0 ? [] : buttonsFor(from + place, ['s']);
}

function chunks<T>(all: readonly T[], size: number): T[][] {
  const starts = Array.from({ length: Math.ceil(all.length / size) }, (_, at) => at * size);
  return starts.map((start) => all.slice(start, start + size));
}
