import type { Who } from '../../chat/conversation/ports.ts';
import { shownName } from '../shown-name.ts';
import type { TelegramChat, TelegramUser } from './update.ts';

/** Whether the bot speaks in this chat at all: in private chats only, it stays silent elsewhere. */
export const isServed = (chat: TelegramChat): boolean => chat.type === 'private';

/** The cellar that a chat belongs to: for now each chat is a cellar of its own. */
export const cellarOf = (chatId: number): string => `telegram:${chatId}`;

const CHAT = /^telegram:(-?\d+)$/;

/** The platform's own number of a chat, out of the name by which the conversation knows it; none of another platform. */
export function chatIdOf(chat: string): number | undefined {
  const digits = CHAT.exec(chat)?.[1];
  return digits === undefined ? undefined : Number(digits);
}

/** The names by which the conversation knows a chat and a person, unlike those of any other platform. */
export function whoOf(chat: TelegramChat, from: TelegramUser): Who {
  const name = shownName(from.first_name);
  return {
    cellar: cellarOf(chat.id),
    chat: `telegram:${chat.id}`,
    person: `telegram:${from.id}`,
    ...(name !== undefined && { name }),
  };
}
