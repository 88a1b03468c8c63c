import { Api } from 'grammy';

import { createLeanFetch } from './lean-fetch.ts';

/** How the platform is reached. */
export interface PlatformOptions {
  readonly token: string;
  /** Where the Bot API is, without a slash at the end. */
  readonly root: string;
  /** A call without an answer is given up after this many seconds; longer than a long poll takes. */
  readonly callTimeout_s: number;
  /** The same for what is sent. */
  readonly sendTimeout_s: number;
}

/** The two ways in which we speak with the platform; each makes one try a call. */
export interface Platform {
  /** For polling and whatever is no message. */
  readonly calls: Api;
  /** For what people get. */
  readonly sends: Api;
  /** Closes the connections. */
  close(): void;
}

/** The type that the client asks for in place of the AbortSignal that every runtime has; it uses what both have. */
type ClientSignal = NonNullable<Parameters<Api['getMe']>[0]>;

/** Hands an AbortSignal to a call of the client. */
export const clientSignal = (signal: AbortSignal): ClientSignal => signal as unknown as ClientSignal;

/** Opens the way to the Bot API; no call is made yet. */
export function openPlatform({ token, root, callTimeout_s, sendTimeout_s }: PlatformOptions): Platform {
  // Connections of their own for each, so that replies that hang never keep a poll from being made.
  const open = (timeoutSeconds: number) => {
    const fetch = createLeanFetch();
    return { api: new Api(token, { apiRoot: root, timeoutSeconds, fetch }), close: () => fetch.close() };
  };
  const [calls, sends] = [open(callTimeout_s), open(sendTimeout_s)];
  return {
    calls: calls.api,
    sends: sends.api,
    close: () => {
      calls.close();
      sends.close();
    },
  };
}
