import type { Language } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { line } from './lines/line.ts';

/** What somebody gets who sends more than anybody can read: their messages are passed over for a while. */
export function tooFastReply(language: Language): Reply {
  return { language, lines: [line('first', 'too-fast')], buttons: [] };
}
