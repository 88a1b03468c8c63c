import { HttpError, type Transformer } from 'grammy';

import type { Clock } from '../clock.ts';

/** Waits between the tries, in milliseconds: two minutes in all. */
const WAITS_MS = [1_000, 2_000, 4_000, 8_000, 15_000, 30_000, 30_000, 30_000] as const;

/**
 * Makes a call again when the platform was not reached or failed by itself (5xx), a bounded number of times. What
 * was sent and lost its receipt is sent a second time: better twice than never.
 */
export function retryUnreached(clock: Clock): Transformer {
  return async (call, method, payload, signal) => {
    for (const wait_ms of WAITS_MS) {
      try {
        const answer = await call(method, payload, signal);
        if (answer.ok || !(answer.error_code >= 500)) return answer;
      } catch (error) {
        if (!(error instanceof HttpError) || signal?.aborted === true) throw error;
      }
      await clock.wait(wait_ms, signal as AbortSignal | undefined);
    }
    return call(method, payload, signal);
  };
}
