import type { Understood } from '../reader/understood.ts';
import type { Button, Reply } from '../replies/reply.ts';
import { answerReading } from './answer-reading.ts';
import { buttonsFor } from './buttons.ts';
import { roundFoot } from './lines/round-foot.ts';
import { mannerOf } from './manner.ts';
import type { Memory } from './memory.ts';
import { cautionedToday, keeping, nextMemory, type Said } from './next-memory.ts';
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
  const said: Said[] = understood.readings.map((one, place) => {
    const reading = withShared(one, understood.shared);
    const manner = mannerOf(reading, understood.decimalMark, settings);
    const turn = { settings, manner, number: memory.nextNumber + place, cautioned };
    return { reading, outcome: answerReading(reading, understood.language, turn) };
  });
  const buttons = safetyButton(said, cautioned, memory.nextNumber);
  const foot = roundFoot(said, cautioned, understood.decimalMark, settings);
  const replies = chunks(said, VESSELS_A_MESSAGE).map((chunk, at): Reply => {
    const lines = chunk.flatMap(({ outcome }) => outcome.inRound);
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
