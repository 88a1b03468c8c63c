import type { Who } from '../../chat/conversation/ports.ts';
import { shownName } from '../shown-name.ts';
import type { TelegramChat, TelegramUser } from './update.ts';

const SERVED: readonly string[] = ['private', 'group', 'supergroup'];

/** Whether the bot speaks in this chat at all: in a channel nobody is spoken to. */
export const isServed = (chat: TelegramChat): boolean => SERVED.includes(chat.type);

/** The name by which the conversation knows a chat, unlike those of any other platform. */
export const chatNameOf = (chatId: number): string => `telegram:${chatId}`;

/** The name by which the conversation knows a person. */
export const personNameOf = (userId: number): string => `telegram:${userId}`;

const CHAT = /^telegram:(-?\d+)$/;

/** The platform's own number of a chat, out of the name by which the conversation knows it; none of another platform. */
export function chatIdOf(chat: string): number | undefined {
  const digits = CHAT.exec(chat)?.[1];
  return digits === undefined ? undefined : Number(digits);
}

/** The names by which the conversation knows a chat and a person in it. */
export function whoOf(chat: TelegramChat, from: TelegramUser): Who {
  const name = shownName(from.first_name);
  return {
    // A chat is a cellar of its own until somebody brings it into another.
    cellar: chatNameOf(chat.id),
    chat: chatNameOf(chat.id),
    person: personNameOf(from.id),
    ...(name !== undefined && { name }),
  };
}
