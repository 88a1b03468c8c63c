import { readMessage } from '../reader/read-message.ts';
import type { Language } from '../reader/understood.ts';
import type { Reply } from '../replies/reply.ts';
import { answerRound } from './answer-round.ts';
import { answerSingle } from './answer-single.ts';
import { checkFields } from './check-fields.ts';
import { NO_FACTS, type Here } from './here.ts';
import { FRESH_MEMORY } from './memory.ts';
import { readRoster } from './cellar/roster.ts';
import type { Settings } from './settings.ts';

/**
 * A dose to insert into any chat: reckoned of the text alone, with no cellar’s data in it, and nothing is kept. Undefined
 * where there is no dose: something is missing or wrong, or it is a choice.
 */
export function answerInline(text: string, language: Language, settings: Settings): Reply | undefined {
  const here: Here = { ...NOBODY, settings: { ...settings, language }, message: messageOf(text, language) };
  const read = readMessage(text, here.settings);
  const { readings, shared } = read;
  if (readings.length === 0 || readings.some(({ intent }) => intent !== 'dose')) return undefined;
  const understood = { ...read, readings: readings.map((one) => checkFields(one, shared)) };
  const answer = readings.length === 1 ? answerSingle : answerRound;
  const { answers = [], replies } = answer(understood, here);
  const isDosed = answers.every((one) => one !== null && 'measure' in one && !('choices' in one));
  const [reply, another] = replies;
  if (!isDosed || reply === undefined || another !== undefined) return undefined;
  // Buttons press what is kept, and nothing is.
  const lines = reply.lines.map((one) =>
    one.key === 'read-kept' ? { ...one, key: 'read', values: {} } : one,
  );
  return { ...reply, lines, buttons: [] };
}

const NOBODY: Omit<Here, 'settings' | 'message'> = {
  ...NO_FACTS,
  memory: FRESH_MEMORY,
  me: 0,
  isNewPerson: false,
  roster: readRoster(undefined),
  role: 'guest',
  nextEntry: 1,
  isZoneAsked: true,
  chatLanguage: 'en',
  done: new Set(),
};

function messageOf(text: string, language: Language): Here['message'] {
  const content = { kind: 'text', text } as const;
  return { cellar: '', chat: '', person: '', id: '', at: 0, language, content };
}
