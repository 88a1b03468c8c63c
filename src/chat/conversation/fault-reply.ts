import type { Language } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { line } from './lines/line.ts';

/**
 * What a person gets when answering failed by a fault of ours, or because nothing could be written: never silence, and
 * never half an answer. The cause is for the log alone.
 *
 * @param isUnwritten whether the store failed, so that nothing is noted
 */
export function faultReply(language: Language, isUnwritten = false): Reply {
  return { language, lines: [line('first', isUnwritten ? 'fault-unwritten' : 'fault')], buttons: [] };
}

/** What a person gets when their message failed again and again and is put aside, so that what comes after it goes on. */
export function asideReply(language: Language): Reply {
  return { language, lines: [line('first', 'fault-aside')], buttons: [] };
}
