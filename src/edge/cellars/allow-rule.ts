import type { IncomingMessage } from '../../chat/conversation/ports.ts';
import type { CellarsOfChat } from './registry.ts';

/**
 * Who may use the bot: everybody; or those with an invitation, and these people and chats (by the names that the
 * conversation knows them by), who may begin cellars.
 */
export type AllowRule = { readonly is: 'open' } | { readonly is: 'invited'; readonly ids: readonly string[] };

/** Whether a person or chat is named by the rule itself. */
export function isListed(
  rule: AllowRule,
  { person, chat }: Pick<IncomingMessage, 'person' | 'chat'>,
): boolean {
  return rule.is === 'open' || rule.ids.includes(person) || rule.ids.includes(chat);
}

/** Whether somebody may use the bot in a chat with those cellars. */
export function mayUse(
  rule: AllowRule,
  message: Pick<IncomingMessage, 'person' | 'chat' | 'addressed'>,
  { isKept, cellars }: CellarsOfChat,
): boolean {
  if (isListed(rule, message)) return true;
  const isGroup = (message.addressed ?? 'direct') !== 'direct';
  // A group that one of those has begun is open to all who are in it.
  return isKept && (isGroup || cellars.some((cellar) => cellar !== message.chat));
}
