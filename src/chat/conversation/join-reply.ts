import type { Language } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { line } from './lines/line.ts';

/** What a group gets when the bot was brought into it: what it does, and how to begin. */
export function joinReply(language: Language): Reply {
  return { language, lines: [line('first', 'group-joined'), line('first', 'group-how')], buttons: [] };
}
