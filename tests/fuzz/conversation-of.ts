import fc from 'fast-check';
import { handle } from '../../src/chat/conversation/conversation.ts';
import { FRESH_MEMORY } from '../../src/chat/conversation/memory.ts';
import type { Memory } from '../../src/chat/conversation/memory.ts';
import type { Content, Handled, IncomingMessage } from '../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import type { Language } from '../../src/chat/reader/understood.ts';
import { anyText } from './any-text.ts';

/** What one person sends, one thing after the other: texts, and now and then a press on a button just seen. */
export interface Talk {
  readonly language: Language;
  readonly turns: readonly { readonly text: string; readonly press?: number; readonly minutes: number }[];
}

/** A turn with all that is needed to judge it. */
export interface Turn {
  readonly message: IncomingMessage;
  readonly memory: Memory;
  readonly handled: Handled;
  readonly milliseconds: number;
}

const BEGIN = Date.UTC(2026, 8, 14, 6);

/** Short talks: mostly one message, so that memory does not hide what a message alone does. */
export const anyTalk: fc.Arbitrary<Talk> = fc.record({
  language: fc.constantFrom<Language>('en', 'en', 'en', 'en', 'en', 'es', 'fr', 'it', 'de', 'pt'),
  turns: fc.array(
    fc.record(
      { text: anyText, press: fc.nat(4), minutes: fc.constantFrom(0, 1, 20, 40, 2000) },
      { requiredKeys: ['text', 'minutes'] },
    ),
    { minLength: 1, maxLength: 3 },
  ),
});

/** Plays a talk turn by turn; what each writes is what the next one remembers. */
export function* play(talk: Talk): Generator<Turn> {
  let memory: Memory = FRESH_MEMORY;
  let at = BEGIN;
  for (const [number, turn] of talk.turns.entries()) {
    at += turn.minutes * 60_000;
    const message = messageOf(turnContent(turn, memory), { talk, number, at });
    const begun = performance.now();
    const handled = handle(message, memory, DEFAULT_SETTINGS);
    yield { message, memory, handled, milliseconds: performance.now() - begun };
    memory = handled.writes.findLast((write) => write.kind === 'memory')?.memory ?? memory;
  }
}

function turnContent(turn: Talk['turns'][number], memory: Memory): Content {
  const key = turn.press === undefined ? undefined : memory.lastButtons[turn.press];
  return key === undefined ? { kind: 'text', text: turn.text } : { kind: 'press', key };
}

function messageOf(
  content: Content,
  { talk, number, at }: { readonly talk: Talk; readonly number: number; readonly at: number },
): IncomingMessage {
  const who = { cellar: 'c', chat: 'c', person: 'p' };
  return { ...who, id: String(number), at, language: talk.language, content };
}
