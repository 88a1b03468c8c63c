import type { IncomingMessage } from '../../chat/conversation/ports.ts';
import { newNonce } from '../cellars/new-nonce.ts';
import { shownName } from '../shown-name.ts';
import { addressedOf } from './addressed-of.ts';
import type { Arrival, Spot } from './arrival.ts';
import { contentOf, editedContentOf, messageName } from './content-of.ts';
import { languageOf } from './language-of.ts';
import type { Me } from './me.ts';
import { sheetOf } from './sheet-of.ts';
import type {
  TelegramChat,
  TelegramMemberChange,
  TelegramMessage,
  TelegramUpdate,
  TelegramUser,
} from './update.ts';
import { isServed, whoOf } from './who-of.ts';

/** What an update is read with. */
export interface ReadingOptions {
  /** Milliseconds since 1970: also the time of a tap, for which the platform gives none. */
  readonly received_at: number;
  readonly me: Me;
}

/** Makes of an update what is to be answered, or nothing where there is nothing to answer. */
export function toMessage(update: TelegramUpdate, options: ReadingOptions): Arrival | undefined {
  const read = readUpdate(update, options);
  const { received_at } = options;
  return read && { updateId: update.update_id, received_at, ...read };
}

type Read = Omit<Arrival, 'updateId' | 'received_at'>;

function readUpdate(update: TelegramUpdate, options: ReadingOptions): Read | undefined {
  const { message, edited_message: edited, callback_query: tap, my_chat_member: change } = update;
  const { me, received_at } = options;
  if (message !== undefined) return fromMessage(message, me, { edited: false });
  if (edited !== undefined) return fromMessage(edited, me, { edited: true });
  if (change !== undefined) return fromChange(change, me);
  if (tap?.data === undefined || tap.message === undefined || !isServed(tap.message.chat)) return undefined;
  const { chat } = tap.message;
  return {
    ...spotOf(tap.message),
    tapId: tap.id,
    message: {
      ...commonOf(chat, tap.from, me),
      id: `tap ${tap.id}`,
      at: received_at,
      content: { kind: 'press', key: tap.data },
      addressed: chat.type === 'private' ? 'direct' : 'called',
    },
  };
}

function fromMessage(
  message: TelegramMessage,
  me: Me,
  { edited }: { readonly edited: boolean },
): Read | undefined {
  const { chat, from, date, edit_date = date } = message;
  if (from === undefined || from.is_bot === true || !isServed(chat)) return undefined;
  const content = edited ? editedContentOf(message) : contentOf(message);
  if (content === undefined) return undefined;
  const addressed = addressedOf(message, me);
  const name = messageName(message.message_id);
  const file = edited || addressed === 'overheard' ? undefined : sheetOf(message);
  return {
    ...spotOf(message),
    ...(file !== undefined && { file }),
    message: {
      ...commonOf(chat, from, me),
      id: edited ? `${name} edited ${edit_date}` : name,
      at: 1000 * (edited ? edit_date : date),
      content,
      addressed,
    },
  };
}

const AWAY: readonly string[] = ['left', 'kicked'];

/** Being brought into a group is answered, all other changes are not: whoever removes us wants to hear nothing. */
function fromChange(change: TelegramMemberChange, me: Me): Read | undefined {
  const { chat, from, date, old_chat_member: before, new_chat_member: after } = change;
  const isIn = ({ status, is_member }: typeof before): boolean =>
    !AWAY.includes(status) && is_member !== false;
  if (chat.type === 'private' || !isServed(chat) || isIn(before) || !isIn(after)) return undefined;
  return {
    chatId: chat.id,
    isJoin: true,
    message: {
      ...commonOf(chat, from, me),
      id: `joined ${date}`,
      at: 1000 * date,
      content: { kind: 'unreadable', what: 'other' },
      addressed: 'called',
    },
  };
}

/** Where the answer goes. */
function spotOf({
  chat,
  message_id: replyTo,
  message_thread_id: threadId,
  is_topic_message: isTopic,
}: {
  readonly chat: TelegramChat;
  readonly message_id?: number | undefined;
  readonly message_thread_id?: number | undefined;
  readonly is_topic_message?: boolean | undefined;
}): Spot {
  return {
    chatId: chat.id,
    // Replies have a thread as well; only that of a topic is a place.
    ...(isTopic === true && threadId !== undefined && { threadId }),
    ...(chat.type !== 'private' && replyTo !== undefined && { replyTo }),
  };
}

type Common = Pick<
  IncomingMessage,
  'cellar' | 'chat' | 'person' | 'name' | 'language' | 'nonce' | 'title' | 'linkBegin'
>;

function commonOf(chat: TelegramChat, from: TelegramUser, me: Me): Common {
  const title = shownName(chat.title);
  return {
    ...whoOf(chat, from),
    language: languageOf(from.language_code),
    nonce: newNonce(),
    ...(title !== undefined && { title }),
    linkBegin: `https://t.me/${me.username}?start=`,
  };
}
