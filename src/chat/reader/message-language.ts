import { ALL_WORDS } from './words/all.ts';
import type { Lexicon } from './lexicon.ts';
import type { Grouping } from './numbers.ts';
import type { Term } from './split-terms.ts';
import type { Language } from './understood.ts';

const GROUPS = new Map<Language, string>(ALL_WORDS.map(({ language, groups }) => [language, groups]));

const isForeign = ({ kind, text, tags }: Term): boolean =>
  kind === 'word' && text.length >= 3 && tags.length === 0;

/** Whether a message is of no language that is read, so that something may be passed over. */
export const isForeignTalk = (terms: readonly Term[], { isTold, language }: Lexicon): boolean =>
  (!isTold || language !== 'en') && terms.some(isForeign);

/**
 * Which separators group thousands: only those that the chat's and the message's language agree on.
 * A message without words has the chat's language; one of unknown words has none.
 */
export function groupingOf(terms: readonly Term[], { isTold, language }: Lexicon, chat: Language): Grouping {
  const own = GROUPS.get(chat) ?? '';
  const agrees = isTold ? own === GROUPS.get(language) : !terms.some(isForeign);
  return { point: agrees && own === '.', comma: agrees && own === ',' };
}
