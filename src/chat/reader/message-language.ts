import { ALL_WORDS } from './words/all.ts';
import type { Grouping } from './numbers.ts';
import type { Term } from './split-terms.ts';
import type { Language } from './understood.ts';

const GROUPS = new Map<Language, string>(ALL_WORDS.map(({ language, groups }) => [language, groups]));

/** Words that are the same in most languages and tell none. */
const INTERNATIONAL = new Set(['so2l', 'so2t', 'libre', 'livre', 'libera', 'libero', 'frei', 'freie', 'freies', 'totale', 'gesamt', 'ppm', 'kmbs', 'so2', 'tank', 'total', 'bio', 'organic', 'merlot', 'mol', 'lot', 'vol', 'alc', 'dep', 'cuve', 'vasca', 'cuba', 'deposito', 'barrique', 'barrica']); // prettier-ignore

const tellsEnglish = ({ kind, text, tags }: Term): boolean =>
  kind === 'word' &&
  text.length >= 3 &&
  tags.length > 0 &&
  !INTERNATIONAL.has(text) &&
  !tags.some((tag) => tag === 'cue:variety' || tag.startsWith('additive'));

const isForeign = ({ kind, text, tags }: Term): boolean =>
  kind === 'word' && text.length >= 3 && tags.length === 0;

/** Whether the words of a message are of a language that is not read yet, so that something may be passed over. */
export const isForeignTalk = (terms: readonly Term[], chat: Language): boolean =>
  terms.some(isForeign) && (chat !== 'en' || !terms.some(tellsEnglish));

/**
 * Which separators group thousands: only those that the chat's and the message's language agree on.
 * A message without words has the chat's language; one of unknown words has none.
 */
export function groupingOf(terms: readonly Term[], chat: Language): Grouping {
  const english = terms.some(tellsEnglish);
  const foreign = !english && terms.some(isForeign);
  const own = GROUPS.get(chat) ?? '';
  const agrees = english ? own === ',' : !foreign;
  return { point: agrees && own === '.', comma: agrees && own === ',' };
}
