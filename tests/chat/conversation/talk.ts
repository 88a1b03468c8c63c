import type { CellarStore, CellarView } from '../../../src/core/cellar/cellar-store.ts';
import { handle } from '../../../src/chat/conversation/conversation.ts';
import { memoryKey } from '../../../src/chat/conversation/keys.ts';
import { FRESH_MEMORY, type Memory } from '../../../src/chat/conversation/memory.ts';
import type { Content, Handled, IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS, type Settings } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';

/** A morning in harvest, in milliseconds since 1970. */
export const MORNING = Date.parse('2026-10-05T08:00:00Z');

export const say = makeSay(loadLocales());

/** Who talks. */
const ANA = { cellar: 'harbour cellar', chat: 'one', person: 'Ana', name: 'Ana' } as const;

/** One that writes, in a cellar of their own that keeps what the conversation gave back to keep. */
export interface Talk {
  at: number;
  readonly store: CellarStore;
  readonly send: (content: Content) => Promise<Handled>;
  readonly write: (text: string) => Promise<Handled>;
  readonly press: (key: string) => Promise<Handled>;
  /** What is kept of the conversation by now. */
  readonly memory: () => Promise<Memory>;
  readonly look: <T>(work: (view: CellarView) => Promise<T>) => Promise<T>;
}

/** Starts a conversation with somebody who never wrote. */
export function startTalk(
  settings: Settings = DEFAULT_SETTINGS,
  language: IncomingMessage['language'] = 'en',
): Talk {
  let count = 0;
  const store = createMemoryCellars({ now: () => talk.at });
  const talk: Talk = {
    at: MORNING,
    store,
    send(content) {
      count += 1;
      const message = { ...ANA, id: String(count), at: talk.at, language, content };
      return store.turn(ANA.cellar, async (view) => {
        const handled = await handle(message, view, settings);
        return { writes: handled.writes, result: handled };
      });
    },
    write: (text) => talk.send({ kind: 'text', text }),
    press: (key) => talk.send({ kind: 'press', key }),
    memory: async () => {
      const kept = await talk.look((view) => view.kept(memoryKey(ANA)));
      return kept === undefined ? FRESH_MEMORY : (JSON.parse(kept) as Memory);
    },
    look: (work) => store.look(ANA.cellar, work),
  };
  return talk;
}

/** The text of all replies, thin spaces as plain ones. */
export function textOf({ replies }: Handled): string {
  return replies
    .map((reply) => say(reply).text)
    .join('\n')
    .replaceAll('\u202f', ' ');
}

/** What the last of some messages comes to, said one after the other in a talk of their own. */
export async function lastOf(messages: readonly string[], talk: Talk = startTalk()): Promise<Handled> {
  let handled: Handled = { writes: [], replies: [] };
  for (const text of messages) handled = await talk.write(text);
  return handled;
}
