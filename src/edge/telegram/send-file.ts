import { InputFile, type Api } from 'grammy';

import type { BroughtFile } from '../brought.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import type { Spot } from './arrival.ts';
import { failureOf } from './failure.ts';
import type { Passed } from './pace.ts';
import { clientSignal } from './platform.ts';
import { judgeSending, type Sent } from './send-post.ts';
import { whereOf } from './to-posts.ts';

/** What sending a file needs. */
export interface FileSending {
  readonly api: Api;
  readonly clock: Clock;
  readonly log: Log;
  /** Resolves when something may be sent to a chat. */
  readonly pass: (chat: string) => Promise<Passed>;
  readonly signal: AbortSignal;
}

/** The longest text beside a picture, in UTF-16 code units. */
export const LONGEST_CAPTION = 1024;

/** Waits between the tries, in seconds; where the platform names a longer one, that counts. */
const WAITS_S = [1, 2, 4, 8, 15] as const;

/**
 * Sends a file, a picture as one: tried again while the platform is not reached. Tells whether nothing more is to be done;
 * false where the platform does not take it. Never rejects.
 */
export async function sendFile(
  { file, spot, caption }: { readonly file: BroughtFile; readonly spot: Spot; readonly caption?: string },
  { api, clock, log, pass, signal }: FileSending,
): Promise<boolean> {
  let chat = spot.chatId;
  for (const wait_s of [...WAITS_S, undefined]) {
    const upload = new InputFile(file.bytes, file.name);
    const others = {
      ...(caption !== undefined && { caption }),
      ...whereOf(spot, true),
    };
    let sent: Sent = { kind: 'sent' };
    const passed = await pass(String(chat));
    try {
      if (file.isPicture) await api.sendPhoto(chat, upload, others, clientSignal(signal));
      else await api.sendDocument(chat, upload, others, clientSignal(signal));
    } catch (error) {
      sent = judgeSending(failureOf(error));
    }
    passed.arrived();
    if (sent.kind === 'sent' || sent.kind === 'closed') return true;
    if (sent.kind === 'moved') chat = Number(sent.chat);
    else log.warn({ sent }, 'a file could not be sent yet');
    if (sent.kind === 'refused' || wait_s === undefined || signal.aborted) return false;
    if (sent.kind !== 'moved')
      await clock.wait(1000 * Math.max(wait_s, sent.kind === 'slow down' ? sent.wait_s : 0), signal);
  }
  return false;
}
