import type { Language } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { line } from './lines/line.ts';

/** What a chat gets when messages in it were left unread, as they came long before anybody could answer them. */
export function leftReply(language: Language, count: number): Reply {
  const values = { count: count === 1 ? 'one' : String(count) };
  return { language, lines: [line('first', 'left-unread', values)], buttons: [] };
}
