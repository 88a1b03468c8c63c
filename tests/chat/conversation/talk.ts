import { handle } from '../../../src/chat/conversation/conversation.ts';
import { FRESH_MEMORY, type Memory } from '../../../src/chat/conversation/memory.ts';
import type { Content, Handled, IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS, type Settings } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { loadLocales } from '../../../src/edge/locales.ts';

/** A morning in harvest, in milliseconds since 1970. */
export const MORNING = Date.parse('2026-10-05T08:00:00Z');

export const say = makeSay(loadLocales());

/** One that writes: remembers what the conversation gave back to keep. */
export interface Talk {
  memory: Memory;
  at: number;
  readonly send: (content: Content) => Handled;
  readonly write: (text: string) => Handled;
  readonly press: (key: string) => Handled;
}

/** Starts a conversation with somebody who never wrote. */
export function startTalk(
  settings: Settings = DEFAULT_SETTINGS,
  language: IncomingMessage['language'] = 'en',
): Talk {
  let count = 0;
  const talk: Talk = {
    memory: FRESH_MEMORY,
    at: MORNING,
    send(content) {
      count += 1;
      const who = { cellar: 'harbour cellar', chat: 'one', person: 'Ana' };
      const message = { ...who, id: String(count), at: talk.at, language, content };
      const handled = handle(message, talk.memory, settings);
      const last = handled.writes.at(-1);
      // Through text, as every store keeps it.
      if (last) talk.memory = JSON.parse(JSON.stringify(last.memory)) as Memory;
      return handled;
    },
    write: (text) => talk.send({ kind: 'text', text }),
    press: (key) => talk.send({ kind: 'press', key }),
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
