import type { Content } from '../../chat/conversation/ports.ts';
import { plainWords } from './plain-words.ts';
import type { TelegramMessage } from './update.ts';

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

/** What a message holds; nothing where it is no message of a person (a pinned message, a new title). */
export function contentOf(message: TelegramMessage): Content | undefined {
  if (message.text !== undefined) return { kind: 'text', text: plainWords(message.text) };
  const what = UNREADABLE.find(([field]) => message[field] !== undefined)?.[1];
  return what === undefined ? undefined : { kind: 'unreadable', what };
}

/** What a message holds since it was edited; nothing where nobody edited words of it. */
export function editedContentOf(message: TelegramMessage): Content | undefined {
  const { text, caption, message_id, date } = message;
  if (text !== undefined)
    return {
      kind: 'edited',
      text: plainWords(text),
      original: messageName(message_id),
      original_at: 1000 * date,
    };
  // A live location is edited every few seconds by itself.
  return caption === undefined ? undefined : { kind: 'unreadable', what: 'edited' };
}

/** The event that a message is: by the message and not by the update, whose numbers begin anew after a quiet week. */
export const messageName = (messageId: number): string => `message ${messageId}`;
