import type { Api } from 'grammy';

import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { failureOf } from './failure.ts';
import { clientSignal } from './platform.ts';
import { ALLOWED_UPDATES } from './update.ts';

/** What confirming needs. */
export interface ConfirmOptions {
  readonly api: Api;
  readonly clock: Clock;
  readonly log: Log;
  /** It is given up after so many seconds: then the platform delivers a few things again. */
  readonly within_s: number;
}

/**
 * Tells the platform what has been received, as no further poll will: everything below `offset`. What the call
 * brings back is not used, and so comes again to whoever polls next. 0 means that nothing was received. Never
 * rejects.
 */
export async function confirmOffset(
  offset: number,
  { api, clock, log, within_s }: ConfirmOptions,
): Promise<void> {
  if (offset === 0) return;
  const ended = new AbortController();
  const late = new AbortController();
  void clock.wait(1000 * within_s, ended.signal).then(() => late.abort());
  try {
    const params = { offset, limit: 1, timeout: 0, allowed_updates: ALLOWED_UPDATES };
    await api.getUpdates(params, clientSignal(late.signal));
  } catch (error) {
    log.warn({ failure: failureOf(error) }, 'the last offset could not be confirmed');
  } finally {
    ended.abort();
  }
}
