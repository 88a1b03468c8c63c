import type { IncomingMessage } from '../../chat/conversation/ports.ts';
import type { Me } from './me.ts';
import type { TelegramMessage } from './update.ts';

/** Whom a message is for. */
type Addressed = NonNullable<IncomingMessage['addressed']>;

/** A command, and the bot that it is for where it says so. */
const COMMAND = /^\/[a-z]\w*(?:@(\w+))?(?!\S)/i;

/**
 * Whether a message is for us: always in a private chat; in a group where it names us, answers a message of ours, or is a
 * command that is not for another bot.
 */
export function addressedOf(message: TelegramMessage, me: Me): Addressed {
  if (message.chat.type === 'private') return 'direct';
  const text = message.text ?? message.caption ?? '';
  const command = COMMAND.exec(text);
  const isOurs = (name: string): boolean => name.toLowerCase() === me.username.toLowerCase();
  if (command !== null) return command[1] === undefined || isOurs(command[1]) ? 'called' : 'overheard';
  if (message.reply_to_message?.from?.id === me.id) return 'called';
  const entities = message.entities ?? message.caption_entities ?? [];
  if (entities.some(({ user }) => user?.id === me.id)) return 'called';
  const names = text.matchAll(/(?<![\w@])@(\w+)/g);
  return [...names].some(([, name = '']) => isOurs(name)) ? 'called' : 'overheard';
}
