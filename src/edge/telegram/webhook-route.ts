import { createHash, timingSafeEqual } from 'node:crypto';

import type { HttpHandler } from '../http/serve-http.ts';
import type { Log } from '../logging.ts';
import type { Inbox } from './inbox.ts';
import { readUpdates } from './update.ts';

/** What the webhook needs. */
export interface WebhookOptions {
  /** What the platform sends with every call. */
  readonly secret: string;
  readonly receive: Inbox['receive'];
  /** Whether anything is taken now. */
  readonly isOpen: () => boolean;
  readonly log: Log;
}

const SECRET_HEADER = 'x-telegram-bot-api-secret-token';

/**
 * Makes what takes updates that the platform brings: it says that it has them only once they are durable. What it
 * cannot take now the platform brings again.
 */
export function makeWebhook({ secret, receive, isOpen, log }: WebhookOptions): HttpHandler {
  const right = digest(secret);
  return async ({ headers, body }) => {
    const given = headers[SECRET_HEADER];
    if (typeof given !== 'string' || !timingSafeEqual(digest(given), right)) return { status: 401 };
    if (!isOpen()) return { status: 503 };
    const text = await body();
    if (text === undefined) return { status: 413 };
    const updates = read(text);
    if (updates === undefined) return { status: 400 };
    try {
      await receive(updates);
      return { status: 200 };
    } catch (err) {
      log.error({ err }, 'an update could not be kept');
      return { status: 503 };
    }
  };
}

/** Of one length whatever was given, so that the time of the comparison tells nothing. */
const digest = (text: string): Buffer => createHash('sha256').update(text).digest();

function read(text: string): ReturnType<typeof readUpdates> | undefined {
  try {
    return readUpdates([JSON.parse(text)]);
  } catch {
    return undefined;
  }
}
