import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { OperatorError } from '../operator-error.ts';
import { failureOf, isAboutWebhook, type Failure } from './failure.ts';

/** What a back-off needs. */
export interface BackOffOptions {
  readonly root: string;
  readonly clock: Clock;
  readonly log: Log;
  /** Shows the operator a sentence. */
  readonly tell: (sentence: string) => void;
  readonly signal: AbortSignal;
}

/** Waits longer and longer while the same thing fails, and tells the operator why. */
export interface BackOff {
  /** Resolves when it is time to try again. Throws an OperatorError where trying again cannot help. */
  failed(error: unknown): Promise<void>;
  succeeded(): void;
}

const WAITS_S = [1, 2, 4, 8, 15, 30] as const;

/** Makes a back-off for the calls that must not give up: the first one, and the long poll. */
export function createBackOff({ root, clock, log, tell, signal }: BackOffOptions): BackOff {
  // Without what may stand before the host: it can be a password.
  const place = new URL(root).origin;
  let failures = 0;
  return {
    failed: async (error) => {
      const failure = failureOf(error);
      log.warn({ failure }, 'a call to the Bot API failed');
      if (failure.kind === 'refused' && (failure.code === 401 || failure.code === 404)) {
        throw new OperatorError(
          `The Bot API at ${place} does not accept BOT_TOKEN (${failure.code}): ` +
            'check that it is copied whole, and that it was not replaced by a newer one.',
        );
      }
      const ladder_s = WAITS_S[Math.min(failures, WAITS_S.length - 1)] ?? 30;
      const wait_s = Math.max(ladder_s, failure.kind === 'refused' ? (failure.retryAfter_s ?? 0) : 0);
      // Once the wait has stopped growing there is nothing new to say.
      if (failures < WAITS_S.length) tell(`${sentenceOf(failure, place)} Trying again in ${wait_s} s.`);
      failures += 1;
      await clock.wait(1000 * wait_s, signal);
    },
    succeeded: () => {
      if (failures > 0) tell('The Bot API answers again.');
      failures = 0;
    },
  };
}

const sentenceOf = (failure: Failure, place: string): string => {
  if (failure.kind === 'unreached') {
    return `The Bot API at ${place} cannot be reached (${failure.reason}): check the network and BOT_API_ROOT.`;
  }
  if (failure.kind === 'fault') return `Reading messages failed (${failure.reason}).`;
  if (failure.code === 409 && isAboutWebhook(failure)) {
    return 'A webhook was set for this bot (409): it is taken away, as messages are polled now.';
  }
  if (failure.code === 409) {
    return 'Another program is reading the messages of this bot with the same BOT_TOKEN (409): stop one of the two.';
  }
  if (failure.code === 429) return 'The Bot API asks us to slow down (429).';
  return `The Bot API at ${place} refused (${failure.code}: ${failure.reason}).`;
};
