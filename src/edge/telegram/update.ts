import { z } from 'zod';

const User = z.looseObject({
  id: z.int(),
  is_bot: z.boolean().optional(),
  first_name: z.string().optional(),
  language_code: z.string().optional(),
});

const Chat = z.looseObject({ id: z.int(), type: z.string() });

const Message = z.looseObject({
  message_id: z.int(),
  /** Seconds since 1970. */
  date: z.int(),
  edit_date: z.int().optional(),
  chat: Chat,
  from: User.optional(),
  text: z.string().optional(),
});

/** A tap on a button. Its message may be too old to be shown, so that only the chat of it is asked for. */
const CallbackQuery = z.looseObject({
  id: z.string(),
  from: User,
  message: z.looseObject({ chat: Chat }).optional(),
  data: z.string().optional(),
});

const Update = z.looseObject({
  update_id: z.int(),
  message: Message.optional(),
  edited_message: Message.optional(),
  callback_query: CallbackQuery.optional(),
});

/** The kinds of update that are asked for; the platform keeps the others to itself. */
export const ALLOWED_UPDATES = ['message', 'edited_message', 'callback_query'] as const;

/** What is used of a message. */
export type TelegramMessage = z.infer<typeof Message>;
/** What is used of a person. */
export type TelegramUser = z.infer<typeof User>;
/** What is used of a chat. */
export type TelegramChat = z.infer<typeof Chat>;
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
