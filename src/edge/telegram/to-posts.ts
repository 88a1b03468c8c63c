import type { Post } from '../../core/cellar/mailbox.ts';
import type { Said } from '../../chat/replies/say.ts';
import type { Body } from './body.ts';
import { CHANNEL } from './channel.ts';
import { toSendings } from './from-reply.ts';

/** What posts are made for. */
export interface PostOptions {
  readonly chatId: number;
  /** What they answer; the same answer has the same names, however often it is made. */
  readonly to: string;
  /** Milliseconds since 1970. */
  readonly now: number;
}

/** The posts that bring what is said to a chat, one for each message that a person gets. */
export function toPosts(said: readonly Said[], { chatId, to, now }: PostOptions): Post[] {
  const sendings = said.flatMap(toSendings);
  return sendings.map((params, index) => {
    const body: Body = { method: 'sendMessage', params: { ...params } };
    return {
      id: `${chatId} ${to} ${index}`,
      channel: CHANNEL,
      chat: String(chatId),
      body: JSON.stringify(body),
      at: now,
    };
  });
}
