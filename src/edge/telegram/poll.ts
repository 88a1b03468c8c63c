import type { Api } from 'grammy';

import type { Clock } from '../clock.ts';
import type { BackOff } from './back-off.ts';
import { failureOf, isAboutWebhook } from './failure.ts';
import type { Inbox } from './inbox.ts';
import { clientSignal } from './platform.ts';
import { ALLOWED_UPDATES, readUpdates } from './update.ts';

/** What polling needs. */
export interface PollOptions {
  readonly api: Api;
  readonly inbox: Pick<Inbox, 'receive'>;
  /** Whether so much is in hand that more has to stay with the platform. */
  readonly isFull: () => boolean;
  readonly backOff: BackOff;
  readonly clock: Clock;
  /** How long the platform holds a poll open when there is nothing, in seconds. */
  readonly longPoll_s: number;
  /** A poll that has not ended by then is left behind, whatever the client does, in seconds. */
  readonly watchdog_s: number;
  readonly signal: AbortSignal;
}

/** So soon it is looked whether there is room again, in milliseconds. */
const FULL_WAIT_MS = 20;

/**
 * Reads updates until the signal is aborted: a batch is received into the inbox, and only when it is durable does
 * the next poll confirm it. Gives back the offset that is to be confirmed next.
 *
 * @throws OperatorError when the token is no longer accepted.
 */
export async function poll(options: PollOptions): Promise<number> {
  const { api, inbox, isFull, backOff, clock, signal } = options;
  let offset = 0;
  while (!signal.aborted) {
    try {
      const updates = readUpdates(await askForUpdates(offset, options));
      await inbox.receive(updates);
      for (const { update_id } of updates) offset = Math.max(offset, update_id + 1);
      backOff.succeeded();
      while (isFull() && !signal.aborted) await clock.wait(FULL_WAIT_MS, signal);
    } catch (error) {
      if (signal.aborted) break;
      // The operator asked for polling, so a webhook that stands in the way goes.
      if (isAboutWebhook(failureOf(error))) await api.deleteWebhook().catch(() => undefined);
      await backOff.failed(error);
    }
  }
  return offset;
}

const askForUpdates = async (offset: number, options: PollOptions): Promise<unknown> => {
  const { api, clock, longPoll_s, watchdog_s, signal } = options;
  const ended = new AbortController();
  const watchdog = clock.wait(1000 * watchdog_s, ended.signal).then(() => {
    if (!ended.signal.aborted) throw new Error(`a poll did not end within ${watchdog_s} s`);
    return [];
  });
  const params = { offset, timeout: longPoll_s, allowed_updates: ALLOWED_UPDATES };
  try {
    const updates = api.getUpdates(params, clientSignal(signal));
    return await Promise.race([updates, watchdog]);
  } finally {
    ended.abort();
  }
};
