import fc from 'fast-check';
import { handle } from '../../src/chat/conversation/conversation.ts';
import { memoryKey } from '../../src/chat/conversation/keys.ts';
import type { Memory } from '../../src/chat/conversation/memory.ts';
import type { Content, Handled, IncomingMessage } from '../../src/chat/conversation/ports.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import type { Language } from '../../src/chat/reader/understood.ts';
import { createMemoryCellars } from '../../src/edge/store/memory-cellars.ts';
import { anyText } from './any-text.ts';

/** What one person sends, one thing after the other: texts, and now and then a press on a button just seen. */
export interface Talk {
  readonly language: Language;
  readonly turns: readonly { readonly text: string; readonly press?: number; readonly minutes: number }[];
}

/** A turn with all that is needed to judge it. */
export interface Turn {
  readonly message: IncomingMessage;
  readonly handled: Handled;
  /** The same message handled once more in the same cellar, before anything was written. */
  readonly again: Handled;
  readonly milliseconds: number;
}

const WHO = { cellar: 'c', chat: 'c', person: 'p', name: 'Ana' } as const;
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

/** Plays a talk turn by turn; what each writes is what the next one finds in the cellar. */
export async function* play(talk: Talk): AsyncGenerator<Turn> {
  let at = BEGIN;
  const store = createMemoryCellars({ now: () => at });
  for (const [number, turn] of talk.turns.entries()) {
    at += turn.minutes * 60_000;
    yield await store.turn(WHO.cellar, async (view) => {
      const kept = await view.kept(memoryKey(WHO));
      const lastButtons = kept === undefined ? [] : (JSON.parse(kept) as Memory).lastButtons;
      const message = messageOf(turnContent(turn, lastButtons), { talk, number, at });
      const begun = performance.now();
      const handled = await handle(message, view, DEFAULT_SETTINGS);
      const milliseconds = performance.now() - begun;
      const again = await handle(message, view, DEFAULT_SETTINGS);
      return { writes: handled.writes, result: { message, handled, again, milliseconds } };
    });
  }
}

function turnContent(turn: Talk['turns'][number], lastButtons: readonly string[]): Content {
  const key = turn.press === undefined ? undefined : lastButtons[turn.press];
  return key === undefined ? { kind: 'text', text: turn.text } : { kind: 'press', key };
}

function messageOf(
  content: Content,
  { talk, number, at }: { readonly talk: Talk; readonly number: number; readonly at: number },
): IncomingMessage {
  return { ...WHO, id: String(number), at, language: talk.language, content };
}
