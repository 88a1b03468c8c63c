import type { AskedField, Reading, Understood } from '../reader/understood.ts';
import type { Button } from '../replies/reply.ts';
import type { Memory, Remembered, Waiting } from './memory.ts';
import type { Outcome } from './outcome.ts';
import type { Handled, IncomingMessage, Who } from './ports.ts';
import type { Settings } from './settings.ts';
import { choicesFor, lettersOf } from './waiting.ts';

/** How many readings are kept for the buttons under them. */
export const REMEMBERED = 20;

/** One reading and what was said to it. */
export interface Said {
  readonly reading: Reading;
  readonly outcome: Outcome;
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

/** The write that keeps a conversation's memory. */
export function keeping(message: IncomingMessage, memory: Memory): Handled['writes'] {
  const who: Who = { cellar: message.cellar, chat: message.chat, person: message.person };
  return [{ kind: 'memory', who, memory }];
}

/** The question for a field, which waits from this moment on. */
export function waitFor(field: AskedField, { number, reading, at }: Remembered, settings: Settings): Waiting {
  return { field, reading, number, askedAt: at, letters: lettersOf(choicesFor(field, reading, settings)) };
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

/**
 * What is kept after a message: its readings under their numbers, the buttons, the question that waits from now on (or
 * that goes on waiting), and whose cautions were said in full.
 */
export function nextMemory(
  memory: Memory,
  at: number,
  understood: Pick<Understood, 'decimalMark'>,
  said: readonly Said[],
  next: { readonly buttons: readonly Button[]; readonly waiting?: Waiting | undefined },
): Memory {
  const { buttons, waiting } = next;
  const fresh = said.map((one, place) => ({ one, number: memory.nextNumber + place }));
  const remembered: Remembered[] = fresh
    .filter(({ one }) => isRemembered(one))
    .map(({ one, number }) => ({ number, reading: one.reading, at }));
  const today = dayOf(at);
  const cautioned = said.flatMap(({ outcome }) => outcome.cautioned ?? []);
  const asked = said.find(({ outcome }) => outcome.askedTarget)?.reading;
  const isTalk = said.every(({ reading }) => reading.intent === 'chat');
  const askedTarget = asked ? { at, reading: asked } : isTalk ? memory.askedTarget : undefined;
  const stillToday = Object.entries(memory.cautionedOn).filter(([, day]) => day === today);
  return {
    remembered: [...memory.remembered, ...remembered].slice(-REMEMBERED),
    nextNumber: memory.nextNumber + said.length,
    lastButtons: buttons.filter(({ mark }) => /^\d+$/.test(mark)).map(({ key }) => key),
    cautionedOn: Object.fromEntries([...stillToday, ...cautioned.map((id) => [id, today] as const)]),
    decimalMark: understood.decimalMark,
    ...(waiting && { waiting }),
    ...concentrationOf(said, memory),
    ...(askedTarget && { askedTarget }),
  };
}
