import type { Api } from 'grammy';

import type { Clock } from '../clock.ts';
import type { Spot } from './arrival.ts';
import { clientSignal } from './platform.ts';

/** What showing needs. */
export interface TypingOptions {
  readonly api: Api;
  readonly clock: Clock;
  readonly signal: AbortSignal;
}

/** What the person sees us do. */
export type Doing = 'typing' | 'upload_photo' | 'upload_document';

/** The platform shows it for five seconds or less. */
const AGAIN_MS = 4500;

/** So long the last showing may be on its way. */
const LONGEST_LAST_MS = 1000;

/** Shows that something is done, for as long as it takes. That it cannot be shown harms nothing. */
export async function whileTyping<T>(
  { chatId, threadId, doing }: Spot & { readonly doing: Doing },
  work: Promise<T>,
  { api, clock, signal }: TypingOptions,
): Promise<T> {
  const ended = new AbortController();
  const show = async (): Promise<void> => {
    while (!ended.signal.aborted && !signal.aborted) {
      const thread = threadId === undefined ? {} : { message_thread_id: threadId };
      await api.sendChatAction(chatId, doing, thread, clientSignal(signal)).catch(() => undefined);
      await clock.wait(AGAIN_MS, ended.signal);
    }
  };
  const shown = show();
  try {
    return await work;
  } finally {
    ended.abort();
    // What is sent next may be refused for a while, and nothing of ours must come after that.
    await Promise.race([shown, clock.wait(LONGEST_LAST_MS, signal)]);
  }
}
