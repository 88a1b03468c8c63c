import type { Post } from '../../core/cellar/mailbox.ts';
import type { Said } from '../../chat/replies/say.ts';
import type { Spot } from './arrival.ts';
import type { Body } from './body.ts';
import { CHANNEL } from './channel.ts';
import { toSendings } from './from-reply.ts';

/** What posts are made for. */
export interface PostOptions {
  readonly spot: Spot;
  /** What they answer; the same answer has the same names, however often it is made. */
  readonly to: string;
  /** Milliseconds since 1970. */
  readonly now: number;
}

/** The posts that bring what is said to a chat, one for each message that a person gets. */
export function toPosts(said: readonly Said[], { spot, to, now }: PostOptions): Post[] {
  const { chatId } = spot;
  const bodies = said.flatMap((one, at) => {
    const sendings = toSendings(one);
    const isWhole = sendings.length === 1;
    return sendings.map((params, piece): Body => ({
      method: 'sendMessage',
      params: { ...params, ...whereOf(spot, at + piece === 0) },
      // A message stands for an answer, and is put in the place of another, where it is the whole of it.
      ...(isWhole && at === 0 && { answers: one.replaces ?? to }),
      ...(isWhole && one.replaces !== undefined && { isCorrection: true as const }),
    }));
  });
  return bodies.map((body, index) => ({
    id: `${chatId} ${to} ${index}`,
    channel: CHANNEL,
    chat: String(chatId),
    body: JSON.stringify(body),
    at: now,
  }));
}

/** The parameters that say where in a chat something stands; only the first message shows what it answers. */
export function whereOf({ threadId, replyTo }: Spot, isFirst: boolean): object {
  return {
    ...(threadId !== undefined && { message_thread_id: threadId }),
    ...(isFirst &&
      replyTo !== undefined && {
        reply_parameters: { message_id: replyTo, allow_sending_without_reply: true },
      }),
  };
}
