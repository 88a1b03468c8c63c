import type { Api } from 'grammy';

import { readBody } from './body.ts';
import { failureOf, type Failure } from './failure.ts';
import { clientSignal } from './platform.ts';

/** How a sending ended. */
export type Sent =
  | { readonly kind: 'sent' }
  /** Not before so many seconds have passed. */
  | { readonly kind: 'slow down'; readonly wait_s: number }
  /** It may have arrived or not: it is tried again. */
  | { readonly kind: 'failed'; readonly failure: Failure }
  /** Nobody gets anything in this chat any more. */
  | { readonly kind: 'closed'; readonly failure: Failure }
  | { readonly kind: 'moved'; readonly chat: string }
  /** The platform does not take this message, now or later. */
  | { readonly kind: 'refused'; readonly failure: Failure };

/** Calls the platform. A method is known by its name, as a post may wait longer than a version of this program lives. */
type Call = (params: object, signal: ReturnType<typeof clientSignal>) => Promise<unknown>;

/** Refusals that say there is nothing left to do. */
const IS_DONE = /message is not modified|query is too old|query ID is invalid/i;

/** Sends what a post holds, once. Never rejects. */
export async function sendPost(
  { chat, body }: { readonly chat: string; readonly body: string },
  { api, signal }: { readonly api: Api; readonly signal: AbortSignal },
): Promise<Sent> {
  try {
    const { method, params } = readBody(body);
    const call = (api.raw as unknown as Record<string, Call>)[method];
    if (call === undefined) throw new TypeError(`no method of the platform: ${method}`);
    await call({ chat_id: Number(chat), ...params }, clientSignal(signal));
    return { kind: 'sent' };
  } catch (error) {
    return judge(failureOf(error));
  }
}

function judge(failure: Failure): Sent {
  if (failure.kind === 'unreached') return { kind: 'failed', failure };
  if (failure.kind === 'fault') return { kind: 'refused', failure };
  const { code, reason, retryAfter_s, movedTo } = failure;
  if (movedTo !== undefined) return { kind: 'moved', chat: String(movedTo) };
  if (code === 429) return { kind: 'slow down', wait_s: retryAfter_s ?? 1 };
  if (code === 403) return { kind: 'closed', failure };
  if (IS_DONE.test(reason)) return { kind: 'sent' };
  // A token that is not accepted ends the program by another way; what waits is sent by the next one.
  if (code >= 500 || code === 401 || code === 404) return { kind: 'failed', failure };
  return { kind: 'refused', failure };
}
