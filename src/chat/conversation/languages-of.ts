import { foldText } from '../reader/fold-text.ts';
import { tellLanguages } from '../reader/tell-languages.ts';
import type { Language } from '../reader/understood.ts';
import { SPOKEN } from '../replies/spoken.ts';
import { chatLanguageKey, languageKey } from './keys.ts';
import type { IncomingMessage } from './ports.ts';

/** In which language somebody is answered in a chat; plain JSON. */
export interface KeptLanguage {
  readonly language: Language;
  /** They want it so, whatever they write in. */
  readonly stays?: true;
}

/** The languages of a message: what the person is answered in, and what the chat is told in. */
export interface Languages {
  readonly language: Language;
  readonly chatLanguage: Language;
  /** The language before, where the message is the first that is clearly in another one. */
  readonly changedFrom?: Language;
}

const isGroup = ({ addressed = 'direct' }: IncomingMessage): boolean => addressed !== 'direct';

/** The text of a message, if it has one that tells a language. */
const textOf = ({ content }: IncomingMessage): string | undefined =>
  content.kind === 'text' || content.kind === 'edited' ? content.text : undefined;

/** The language that a text is clearly in; undefined where its words leave that open. */
function clearLanguage(text: string, chat: Language): Language | undefined {
  const told = tellLanguages(foldText(text).text, chat);
  return told.isClear && told.first !== chat && SPOKEN.includes(told.first) ? told.first : undefined;
}

/**
 * In which language a message is answered: what is kept of the person, else of the chat, else what the platform tells;
 * then the message itself, where it is clearly in another one.
 */
export function languagesOf(message: IncomingMessage, kept: ReadonlyMap<string, string>): Languages {
  const ofPerson = kept.get(languageKey(message));
  const ofChat = kept.get(chatLanguageKey(message.chat)) as Language | undefined;
  const own = ofPerson === undefined ? undefined : (JSON.parse(ofPerson) as KeptLanguage);
  const before = own?.language ?? ofChat ?? message.language;
  const text = textOf(message);
  const next = own?.stays || text === undefined ? undefined : clearLanguage(text, before);
  const language = next ?? before;
  return {
    language,
    chatLanguage: isGroup(message) ? (ofChat ?? message.language) : language,
    ...(next !== undefined && { changedFrom: before }),
  };
}
