import type { Content, IncomingMessage } from '../../chat/conversation/ports.ts';
import { languageOf } from './language-of.ts';
import { plainWords } from './plain-words.ts';
import type { TelegramMessage, TelegramUpdate } from './update.ts';
import { isServed, whoOf } from './who-of.ts';

/** An update that somebody wrote to us and that is to be answered. */
export interface Arrival {
  readonly updateId: number;
  readonly chatId: number;
  /** Milliseconds since 1970. */
  readonly received_at: number;
  readonly message: IncomingMessage;
  /** The tap that the platform waits to hear about; only with a press. */
  readonly tapId?: string;
}

type Unreadable = Extract<Content, { kind: 'unreadable' }>['what'];

/** What a message can carry instead of text. What is not in it (a pinned message, a new title) is no message. */
const UNREADABLE: readonly (readonly [field: string, what: Unreadable])[] = [
  ['photo', 'photo'],
  ['live_photo', 'photo'],
  ['sticker', 'sticker'],
  ['voice', 'voice'],
  ['audio', 'voice'],
  ['video_note', 'voice'],
  // An animation comes with a document as well.
  ['animation', 'other'],
  ['document', 'file'],
  ['video', 'other'],
  ['location', 'other'],
  ['venue', 'other'],
  ['contact', 'other'],
  ['poll', 'other'],
  ['checklist', 'other'],
  ['dice', 'other'],
  ['game', 'other'],
  ['story', 'other'],
  ['paid_media', 'other'],
];

const contentOf = (message: TelegramMessage): Content | undefined => {
  if (message.text !== undefined) return { kind: 'text', text: plainWords(message.text) };
  const what = UNREADABLE.find(([field]) => message[field] !== undefined)?.[1];
  return what === undefined ? undefined : { kind: 'unreadable', what };
};

const fromMessage = (
  { updateId, received_at }: Pick<Arrival, 'updateId' | 'received_at'>,
  message: TelegramMessage,
  options: { readonly edited: boolean },
): Arrival | undefined => {
  const { chat, from } = message;
  if (from === undefined || from.is_bot === true || !isServed(chat)) return undefined;
  // A live location is edited every few seconds by itself.
  if (options.edited && message.text === undefined && message['caption'] === undefined) return undefined;
  const content: Content | undefined = options.edited
    ? { kind: 'unreadable', what: 'edited' }
    : contentOf(message);
  if (content === undefined) return undefined;
  const edit = options.edited ? ` edited ${message.edit_date ?? message.date}` : '';
  return {
    updateId,
    received_at,
    chatId: chat.id,
    message: {
      ...whoOf(chat, from),
      // By the message and not by the update, whose numbers begin anew after a quiet week.
      id: `message ${message.message_id}${edit}`,
      at: 1000 * ((options.edited ? message.edit_date : undefined) ?? message.date),
      language: languageOf(from.language_code),
      content,
    },
  };
};

/**
 * Makes of an update the message that the conversation handles, or nothing where there is nothing to answer.
 *
 * @param received_at milliseconds since 1970: also the time of a tap, for which the platform gives none.
 */
export function toMessage(update: TelegramUpdate, received_at: number): Arrival | undefined {
  const { update_id: updateId, message, edited_message: edited, callback_query: tap } = update;
  if (message !== undefined) return fromMessage({ updateId, received_at }, message, { edited: false });
  if (edited !== undefined) return fromMessage({ updateId, received_at }, edited, { edited: true });
  if (tap?.data === undefined || tap.message === undefined || !isServed(tap.message.chat)) return undefined;
  return {
    updateId,
    received_at,
    chatId: tap.message.chat.id,
    tapId: tap.id,
    message: {
      ...whoOf(tap.message.chat, tap.from),
      id: `tap ${tap.id}`,
      at: received_at,
      language: languageOf(tap.from.language_code),
      content: { kind: 'press', key: tap.data },
    },
  };
}
