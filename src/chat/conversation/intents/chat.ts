import type { Reading } from '../../reader/understood.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { line } from '../lines/line.ts';
import { noteText } from '../lines/notes.ts';
import type { Outcome } from '../outcome.ts';

const HELP = [
  'chat-help-what',
  'chat-help-dose',
  'chat-help-dose-means',
  'chat-help-effect',
  'chat-help-effect-means',
  'chat-help-solution',
  'chat-help-solution-means',
  'chat-help-fields',
  'chat-help-care',
] as const;

/** The sentences for a matter of the chat; the readers of other words get how to begin. */
function keysFor(reading: Reading): readonly SentenceKey[] {
  if (noteText(reading, 'negated') !== undefined) return ['chat-negated'];
  if (reading.intent !== 'chat') return ['send-alone'];
  if (reading.topic === 'help') return HELP;
  if (reading.topic === 'greeting') return ['chat-greeting'];
  return reading.topic === 'thanks' ? ['chat-thanks'] : ['chat-other'];
}

/** Greetings, thanks, help, other talk: a line or two, never a figure about anyone's wine. */
export function answerChat(reading: Reading): Outcome {
  const lines = keysFor(reading).map((key) => line('first', key));
  return { answer: null, inRound: lines.slice(0, 1), lines, buttons: [] };
}
