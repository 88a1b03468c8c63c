import type { Language } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { line } from './lines/line.ts';

/**
 * What a person gets when answering failed by a fault of ours: never silence, and never half an answer.
 * The cause is for the log alone.
 */
export function faultReply(language: Language): Reply {
  return { language, lines: [line('first', 'fault')], buttons: [] };
}
