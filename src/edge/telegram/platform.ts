import { autoRetry } from '@grammyjs/auto-retry';
import { Api } from 'grammy';

import type { Clock } from '../clock.ts';
import { createLeanFetch } from './lean-fetch.ts';
import { retryUnreached } from './retry-unreached.ts';

/** How the platform is reached. */
export interface PlatformOptions {
  readonly token: string;
  /** Where the Bot API is, without a slash at the end. */
  readonly root: string;
  /** A call without an answer is given up after this many seconds; longer than a long poll takes. */
  readonly callTimeout_s: number;
  readonly clock: Clock;
}

/** The two ways in which we speak with the platform. */
export interface Platform {
  /** One try a call: for the loops that decide by themselves what a failure means. */
  readonly once: Api;
  /** Tries again within bounds: for what a person waits for. */
  readonly patient: Api;
  /** Closes the connections. */
  close(): void;
}

/** The type that the client asks for in place of the AbortSignal that every runtime has; it uses what both have. */
type ClientSignal = NonNullable<Parameters<Api['getMe']>[0]>;

/** Hands an AbortSignal to a call of the client. */
export const clientSignal = (signal: AbortSignal): ClientSignal => signal as unknown as ClientSignal;

/** The longest `retry_after` that a reply waits for, in seconds. */
const LONGEST_RETRY_AFTER_S = 300;

/** Opens the way to the Bot API; no call is made yet. */
export function openPlatform({ token, root, callTimeout_s, clock }: PlatformOptions): Platform {
  // Connections of their own for each, so that replies that hang never keep a poll from being made.
  const fetches = [createLeanFetch(), createLeanFetch()] as const;
  const [once, patient] = fetches.map(
    (fetch) => new Api(token, { apiRoot: root, timeoutSeconds: callTimeout_s, fetch }),
  ) as [Api, Api];
  // auto-retry obeys `retry_after` only: its waits for a lost connection have no bound.
  patient.config.use(
    retryUnreached(clock),
    autoRetry({
      maxRetryAttempts: 5,
      maxDelaySeconds: LONGEST_RETRY_AFTER_S,
      rethrowHttpErrors: true,
      rethrowInternalServerErrors: true,
    }),
  );
  return { once, patient, close: () => fetches.forEach((fetch) => fetch.close()) };
}
