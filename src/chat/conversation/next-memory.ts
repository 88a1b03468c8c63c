import type { Write } from '../../core/cellar/cellar-store.ts';
import type { AskedField, Reading, Understood } from '../reader/understood.ts';
import type { Button } from '../replies/reply.ts';
import type { Here } from './here.ts';
import { memoryKey, readingKey } from './keys.ts';
import type { Memory, Remembered, Waiting } from './memory.ts';
import type { Outcome } from './outcome.ts';
import { BUTTONS_ms } from './plan.ts';
import type { Settings } from './settings.ts';
import { choicesFor, lettersOf } from './waiting.ts';

/** One reading and what was said to it. */
export interface Said {
  readonly reading: Reading;
  readonly outcome: Outcome;
  /** What the reading is remembered under. */
  readonly ref: string;
}

/** The day of a moment (UTC). */
export function dayOf(at: number): string {
  return new Date(at).toISOString().slice(0, 10);
}

/** The additives whose cautions this person has had in full today. */
export function cautionedToday(memory: Memory, at: number): ReadonlySet<string> {
  const today = dayOf(at);
  return new Set(Object.entries(memory.cautionedOn).flatMap(([id, day]) => (day === today ? [id] : [])));
}

/** What the next reading of this person is remembered under, or one after it. */
export function refAt({ me, memory }: Here, place = 0): string {
  return `${me}.${memory.nextNumber + place}`;
}

/** The write that keeps a conversation's memory. */
export function keeping({ message }: Here, memory: Memory): Write[] {
  return [{ kind: 'keep', key: memoryKey(message), text: JSON.stringify(memory) }];
}

/** The question for a field, which waits from this moment on. */
export function waitFor(
  field: AskedField,
  { ref, reading, at }: Pick<Remembered, 'ref' | 'reading' | 'at'>,
  settings: Settings,
): Waiting {
  return { field, reading, ref, askedAt: at, letters: lettersOf(choicesFor(field, reading, settings)) };
}

function concentrationOf(said: readonly Said[], memory: Memory): Pick<Memory, 'concentrationUnit'> {
  const unit =
    said.flatMap(({ reading }) => reading.concentrationUnit ?? []).at(-1) ?? memory.concentrationUnit;
  return unit === undefined ? {} : { concentrationUnit: unit };
}

/** Only what has a number of its own can be meant by a later button. */
function isRemembered({ reading }: Said): boolean {
  return reading.problems.length === 0 && reading.intent !== 'chat' && reading.intent !== 'emergency';
}

/** The writes that keep the readings which buttons may refer to. */
export function remembering({ message }: Here, said: readonly Said[], chosen = false): Write[] {
  const until = message.at + BUTTONS_ms;
  return said.filter(isRemembered).map(({ reading, ref }) => {
    const remembered: Remembered = {
      ref,
      chat: message.chat,
      reading,
      at: message.at,
      ...(chosen && { chosen }),
    };
    return { kind: 'keep', key: readingKey(message.chat, ref), text: JSON.stringify(remembered), until };
  });
}

/**
 * What is kept after a message: the buttons, the question that waits from now on (or that goes on waiting), and whose
 * cautions were said in full.
 */
export function nextMemory(
  { memory, message: { at } }: Here,
  understood: Pick<Understood, 'decimalMark'>,
  said: readonly Said[],
  next: {
    readonly buttons: readonly Button[];
    readonly waiting?: Waiting | undefined;
    readonly chosen?: boolean;
  },
): Memory {
  const { buttons, waiting, chosen = false } = next;
  const today = dayOf(at);
  const cautioned = said.flatMap(({ outcome }) => outcome.cautioned ?? []);
  const asked = said.find(({ outcome }) => outcome.askedTarget)?.reading;
  const isTalk = said.every(({ reading }) => reading.intent === 'chat');
  const askedTarget = asked ? { at, reading: asked } : isTalk ? memory.askedTarget : undefined;
  const stillToday = Object.entries(memory.cautionedOn).filter(([, day]) => day === today);
  const wasChosen = chosen || (memory.lastWasChosen === true && !said.some(isRemembered));
  return {
    nextNumber: memory.nextNumber + said.length,
    lastButtons: buttons.filter(({ mark }) => /^\d+$/.test(mark)).map(({ key }) => key),
    cautionedOn: Object.fromEntries([...stillToday, ...cautioned.map((id) => [id, today] as const)]),
    decimalMark: understood.decimalMark,
    ...(waiting && { waiting }),
    ...concentrationOf(said, memory),
    ...(askedTarget && { askedTarget }),
    ...(wasChosen && { lastWasChosen: true as const }),
  };
}
