import type { Api } from 'grammy';

import type { Language } from '../../chat/reader/understood.ts';
import type { SentenceKey } from '../../chat/replies/sentence-keys.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { Clock } from '../clock.ts';
import type { Spot } from './arrival.ts';
import type { Passed } from './pace.ts';
import { clientSignal } from './platform.ts';
import { whereOf } from './to-posts.ts';

/** Work that may take long, and who waits for it. */
export interface LongWork<T> {
  readonly spot: Spot;
  readonly language: Language;
  readonly work: Promise<T>;
  /** The sentence for what became of it, where that is not simply done. */
  readonly failureOf: (result: T) => SentenceKey | undefined;
}

/** What telling of it needs. */
export interface ProgressOptions {
  readonly api: Api;
  readonly say: Say;
  readonly clock: Clock;
  /** Resolves when something may be sent to a chat. */
  readonly pass: (chat: string) => Promise<Passed>;
  readonly signal: AbortSignal;
  /** Nobody is told of what takes less. */
  readonly progress_s: number;
}

/** What work gave, and whether its line in the chat says what became of it. */
export interface Told<T> {
  readonly result: T;
  readonly isTold: boolean;
}

/**
 * Tells of work that takes long in one line, which in the end says what became of it. That it cannot be told harms
 * nothing: it is tried once.
 */
export async function withProgress<T>(
  { spot, language, work, failureOf }: LongWork<T>,
  { api, say, clock, pass, signal, progress_s }: ProgressOptions,
): Promise<Told<T>> {
  const ended = new AbortController();
  const chat = spot.chatId;
  const textOf = (key: SentenceKey): string =>
    say({ language, lines: [{ room: 'first', key, values: {} }], buttons: [] }).text;
  const call = async <R>(one: () => Promise<R>): Promise<R | undefined> => {
    const passed = await pass(String(chat));
    try {
      return signal.aborted ? undefined : await one();
    } catch {
      return undefined;
    } finally {
      passed.arrived();
    }
  };
  const begin = async (): Promise<number | undefined> => {
    await clock.wait(1000 * progress_s, ended.signal);
    if (ended.signal.aborted || signal.aborted) return undefined;
    const sent = await call(() =>
      api.sendMessage(chat, textOf('progress-working'), whereOf(spot, false), clientSignal(signal)),
    );
    return sent?.message_id;
  };
  const line = begin();
  const end = async (key: SentenceKey): Promise<boolean> => {
    ended.abort();
    const id = await line;
    if (id === undefined) return false;
    const edited = await call(() => api.editMessageText(chat, id, textOf(key), {}, clientSignal(signal)));
    return edited !== undefined;
  };
  try {
    const result = await work;
    return { result, isTold: await end(failureOf(result) ?? 'progress-done') };
  } catch (error) {
    await end('errand-failed');
    throw error;
  }
}
