import { z } from 'zod';

const User = z.looseObject({
  id: z.int(),
  is_bot: z.boolean().optional(),
  first_name: z.string().optional(),
  language_code: z.string().optional(),
});

const Chat = z.looseObject({ id: z.int(), type: z.string(), title: z.string().optional() });

/** A name in a text that calls somebody who has no `@name`. */
const Entity = z.looseObject({ type: z.string(), user: User.optional() });

/** A file; what it is called is what somebody says it is. */
const Document = z.looseObject({
  file_id: z.string(),
  file_name: z.string().optional(),
  mime_type: z.string().optional(),
  file_size: z.int().optional(),
});

const Message = z.looseObject({
  message_id: z.int(),
  /** Seconds since 1970. */
  date: z.int(),
  edit_date: z.int().optional(),
  chat: Chat,
  from: User.optional(),
  text: z.string().optional(),
  entities: z.array(Entity).optional(),
  caption: z.string().optional(),
  caption_entities: z.array(Entity).optional(),
  document: z.unknown().optional(),
  reply_to_message: z.looseObject({ from: User.optional() }).optional(),
  message_thread_id: z.int().optional(),
  is_topic_message: z.boolean().optional(),
  /** The name that this group gets, or had. */
  migrate_to_chat_id: z.int().optional(),
  migrate_from_chat_id: z.int().optional(),
});

/** A tap on a button. Its message may be too old to be shown, so that only where it stands is asked for. */
const CallbackQuery = z.looseObject({
  id: z.string(),
  from: User,
  message: z
    .looseObject({
      chat: Chat,
      message_id: z.int().optional(),
      message_thread_id: z.int().optional(),
      is_topic_message: z.boolean().optional(),
    })
    .optional(),
  data: z.string().optional(),
});

const Member = z.looseObject({ status: z.string(), is_member: z.boolean().optional() });

/** Somebody brought us into a chat, or out of it. */
const MemberChange = z.looseObject({
  chat: Chat,
  from: User,
  date: z.int(),
  old_chat_member: Member,
  new_chat_member: Member,
});

/** Something that is typed behind our name in any chat. */
const InlineQuery = z.looseObject({ id: z.string(), from: User, query: z.string() });

const Update = z.looseObject({
  update_id: z.int(),
  message: Message.optional(),
  edited_message: Message.optional(),
  callback_query: CallbackQuery.optional(),
  my_chat_member: MemberChange.optional(),
  inline_query: InlineQuery.optional(),
});

/** The kinds of update that are asked for; the platform keeps the others to itself. */
export const ALLOWED_UPDATES = [
  'message',
  'edited_message',
  'callback_query',
  'my_chat_member',
  'inline_query',
] as const;

/** What is used of a message. */
export type TelegramMessage = z.infer<typeof Message>;
/** What is used of a person. */
export type TelegramUser = z.infer<typeof User>;
/** What is used of a chat. */
export type TelegramChat = z.infer<typeof Chat>;
/** What is used of a change of our place in a chat. */
export type TelegramMemberChange = z.infer<typeof MemberChange>;
/** What is used of what is typed behind our name. */
export type TelegramInlineQuery = z.infer<typeof InlineQuery>;
/** What is used of a file. */
export type TelegramDocument = z.infer<typeof Document>;
/** What is used of an update; without any of its parts it is of a kind that is passed over. */
export type TelegramUpdate = z.infer<typeof Update>;

const Batch = z.array(z.looseObject({ update_id: z.int() }));

/**
 * Reads an answer of `getUpdates`. An update whose inside is not as published keeps its number and nothing else:
 * it is passed over, and the ones after it are served.
 *
 * @throws ZodError when it is no list of numbered things.
 */
export function readUpdates(answer: unknown): TelegramUpdate[] {
  return Batch.parse(answer).map((one) => Update.safeParse(one).data ?? { update_id: one.update_id });
}

/** Reads what a message carries as a file; undefined where it is none, or not as published. */
export const readDocument = (given: unknown): TelegramDocument | undefined => Document.safeParse(given).data;
