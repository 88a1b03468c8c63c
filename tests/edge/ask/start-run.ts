import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import type { Handle } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { makeAnswerLine } from '../../../src/edge/ask/answer-line.ts';
import { placeInFile } from '../../../src/edge/ask/place-in-file.ts';
import { placeInMemory } from '../../../src/edge/ask/place-in-memory.ts';
import { sayDue } from '../../../src/edge/ask/say-due.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';

/** A line of output. */
export interface Output {
  readonly id: unknown;
  readonly error?: string;
  readonly understood: { intent: string; topic?: string; fields: object; assumed: object; asks: string[] }[];
  readonly answers: ({ measure?: object } | null)[];
  readonly reply: string;
  readonly buttons: { key: string; label: string }[];
  readonly sends?: { chat: string; reply: string; buttons: object[] }[];
}

const say = makeSay(loadLocales());
/** The time of a line that tells none. */
export const NOON = Date.parse('2026-10-05T12:00:00Z');

interface Run {
  readonly store?: CellarStore;
  readonly handle?: Handle;
}

/** A run that keeps nothing, as `ask` without a file; with a store, as on a file. */
export const startRun = ({ store, handle: handled = handle }: Run = {}) => {
  const clock = { at: NOON };
  const held = { now: () => clock.at };
  const memory = createMemoryCellars(held);
  const answer = makeAnswerLine({
    handle: handled,
    say,
    settings: DEFAULT_SETTINGS,
    placeOf: store ? placeInFile(store, 'run') : placeInMemory(memory, held),
    sayDue: (at) => sayDue(at, { store: store ?? memory, say, settings: DEFAULT_SETTINGS }),
    language: 'en',
    run: 'run',
    now: () => NOON,
    setClock: (at) => (clock.at = at),
  });
  return async (input: object | string): Promise<Output> =>
    JSON.parse(
      JSON.stringify(await answer(typeof input === 'string' ? input : JSON.stringify(input))),
    ) as Output;
};
