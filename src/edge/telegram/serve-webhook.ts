import { randomBytes } from 'node:crypto';

import type { HttpHandler } from '../http/serve-http.ts';
import type { BackOff } from './back-off.ts';
import { clientSignal, type Platform } from './platform.ts';
import { ALLOWED_UPDATES } from './update.ts';
import { makeWebhook, type WebhookOptions } from './webhook-route.ts';

/** Where the platform brings updates to. */
export interface WebhookAddress {
  /** As the platform sees it; its path is ours too. */
  readonly url: string;
  /** What the platform sends with every call; another one for each start where none is named. */
  readonly secret?: string;
}

/** The route of a webhook, and what asks the platform to use it. */
export interface Webhook {
  readonly routes: Readonly<Record<string, HttpHandler>>;
  /** Resolves when the platform has accepted it, or at a stop. Throws an OperatorError where the token is wrong. */
  readonly register: (
    platform: Platform,
    options: { readonly backOff: BackOff; readonly signal: AbortSignal },
  ) => Promise<void>;
}

const SECRET_BYTES = 32;

/** Makes a webhook that receives into an inbox. */
export function createWebhook(
  { url, secret = randomBytes(SECRET_BYTES).toString('hex') }: WebhookAddress,
  options: Omit<WebhookOptions, 'secret'>,
): Webhook {
  return {
    routes: { [`POST ${new URL(url).pathname}`]: makeWebhook({ ...options, secret }) },
    register: async (platform, { backOff, signal }) => {
      while (!signal.aborted) {
        try {
          const asked = { secret_token: secret, allowed_updates: ALLOWED_UPDATES };
          await platform.calls.setWebhook(url, asked, clientSignal(signal));
          return backOff.succeeded();
        } catch (error) {
          if (!signal.aborted) await backOff.failed(error);
        }
      }
    },
  };
}
