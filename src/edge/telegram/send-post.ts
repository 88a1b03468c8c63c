import type { Api } from 'grammy';

import { readBody } from './body.ts';
import { failureOf, type Failure } from './failure.ts';
import { clientSignal } from './platform.ts';
import type { Receipts } from './receipts.ts';

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

/** What sending needs. */
export interface SendingOptions {
  readonly api: Api;
  readonly receipts: Receipts;
  readonly signal: AbortSignal;
}

/** Sends what a post holds, once. Never rejects. */
export async function sendPost(
  { chat, body }: { readonly chat: string; readonly body: string },
  { api, receipts, signal }: SendingOptions,
): Promise<Sent> {
  const { method, params, answers, isCorrection } = readBody(body);
  const call = async (name: string, given: object): Promise<unknown> => {
    const one = (api.raw as unknown as Record<string, Call>)[name];
    if (one === undefined) throw new TypeError(`no method of the platform: ${name}`);
    return one({ chat_id: Number(chat), ...given }, clientSignal(signal));
  };
  const known = isCorrection && answers !== undefined ? receipts.find(chat, answers) : undefined;
  if (known !== undefined) {
    try {
      const { text, link_preview_options, reply_markup } = params;
      await call('editMessageText', { message_id: known, text, link_preview_options, reply_markup });
      return { kind: 'sent' };
    } catch (error) {
      const edited = judgeSending(failureOf(error));
      // What cannot be edited any more, as somebody has deleted it, is said anew.
      if (edited.kind !== 'refused') return edited;
    }
  }
  try {
    const receipt = await call(method, params);
    if (answers !== undefined) receipts.note(chat, answers, messageIdOf(receipt));
    return { kind: 'sent' };
  } catch (error) {
    return judgeSending(failureOf(error));
  }
}

const messageIdOf = (receipt: unknown): number | undefined =>
  (receipt as { readonly message_id?: number } | undefined)?.message_id;

/** What a failure means for what was to be sent. */
export function judgeSending(failure: Failure): Sent {
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
