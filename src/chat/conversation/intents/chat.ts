import { isQuestion } from '../../reader/question-topic.ts';
import type { Reading } from '../../reader/understood.ts';
import type { QuestionId } from '../../reader/words/words.ts';
import { HELP_KEYS } from '../../replies/help-keys.ts';
import type { Line } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { line, listLine, part } from '../lines/line.ts';
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
] as const;

/** The sentences about one topic; none where nothing is written on it. */
function topicLines(topic: string | undefined): Line[] {
  const [, named = ''] = /^help-(.+)$/.exec(topic ?? '') ?? [];
  return (HELP_KEYS[named] ?? []).map((key) => line('first', key));
}

/** How to begin, and the topics on which there is more. */
function helpLines(): Line[] {
  const topics = Object.keys(HELP_KEYS).map((topic) => part('help-topic', { topic }));
  return [
    ...HELP.map((key) => line('first', key)),
    ...listLine('first', 'chat-help-topics', topics),
    line('first', 'chat-help-care'),
  ];
}

/** The sentences for a matter of the chat; the readers of other words get how to begin. */
function keysFor(reading: Reading): readonly SentenceKey[] {
  if (noteText(reading, 'negated') !== undefined) return ['chat-negated'];
  if (reading.intent !== 'chat') return ['send-alone'];
  if (reading.topic === 'greeting') return ['chat-greeting'];
  return reading.topic === 'thanks' ? ['chat-thanks'] : ['chat-other'];
}

/** The answer to a plain question, a figure with its source, and the message that goes on from there. */
const questionLines = (topic: QuestionId): Line[] => [
  line('first', `question-${topic}`),
  line('first', `question-${topic}-why`),
  line('first', `question-${topic}-next`),
];

/** What has to be known of sulfur that is burnt, wherever it comes up. */
export const BURNING_SULFUR = [
  'burning-sulfur-never',
  'burning-sulfur-danger',
  'burning-sulfur-rather',
] as const;

function linesFor(reading: Reading): Line[] {
  if (reading.topic === 'burning-sulfur') return BURNING_SULFUR.map((key) => line('first', key));
  if (isQuestion(reading.topic)) return questionLines(reading.topic);
  const isHelp = reading.intent === 'chat' && reading.topic?.startsWith('help') === true;
  if (!isHelp) return keysFor(reading).map((key) => line('first', key));
  const ofTopic = topicLines(reading.topic);
  return ofTopic.length > 0 ? ofTopic : helpLines();
}

/** Greetings, thanks, help, other talk: a line or two, never a figure about anyone's wine. */
export function answerChat(reading: Reading): Outcome {
  const lines = linesFor(reading);
  return { answer: null, inRound: lines.slice(0, 1), lines, buttons: [] };
}
