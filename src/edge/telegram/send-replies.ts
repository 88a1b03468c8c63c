import type { Api } from 'grammy';

import type { Said } from '../../chat/replies/say.ts';
import type { Log } from '../logging.ts';
import { failureOf } from './failure.ts';
import { toSendings } from './from-reply.ts';
import { clientSignal } from './platform.ts';

/** What sending needs. */
export interface SendOptions {
  readonly api: Api;
  readonly log: Log;
  /** Aborted when there is no time left to try again. */
  readonly signal: AbortSignal;
}

/**
 * Sends replies to a chat in order. A reply that fails for good is logged, and the next one is tried; where the
 * person has blocked the bot (403) nothing more is sent. Gives back `given up` when there was no time left.
 */
export async function sendReplies(
  chatId: number,
  replies: readonly Said[],
  { api, log, signal }: SendOptions,
): Promise<'ended' | 'given up'> {
  for (const reply of replies) {
    try {
      for (const { chat_id, text, ...more } of toSendings(chatId, reply)) {
        await api.sendMessage(chat_id, text, more, clientSignal(signal));
      }
    } catch (error) {
      if (signal.aborted) return 'given up';
      const failure = failureOf(error);
      if (failure.kind === 'refused' && failure.code === 403) {
        log.info({ failure }, 'a person has blocked the bot');
        return 'ended';
      }
      log.error({ failure }, 'a reply could not be sent');
    }
  }
  return 'ended';
}
