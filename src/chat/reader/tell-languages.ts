import { phrasesOf } from './spellings.ts';
import type { Language } from './understood.ts';
import { ALL_WORDS } from './words/all.ts';
import { EVERYWHERE } from './words/everywhere.ts';
import { LISTED_COMMANDS } from './words/listed-commands.ts';
import type { Tag, Words } from './words/words.ts';

/** In which languages a message is written. */
export interface ToldLanguages {
  /** The one that most of its words are of; the chat's where they tell none. */
  readonly first: Language;
  /** Others, of which it holds words that the first has not. */
  readonly others: readonly Language[];
  /** Whether any word told it. */
  readonly isTold: boolean;
  /** Whether its words are clearly of that language and not of the chat's. */
  readonly isClear: boolean;
}

/** Names that are the same everywhere tell no language, nor does what is written alike in all. */
const TELLS_NONE = /^cue:variety$/;

/**
 * The languages of every word, a bit each: those that have it at all, and above `TALK` those in whose talk it is, without
 * the names of things, which wander: a `rosso` makes no Italian.
 */
function languagesOfWords(lists: readonly Words[]): ReadonlyMap<string, number> {
  const known = new Map<string, number>();
  for (const [n, list] of lists.entries()) {
    const { says, own = {}, neverMended = [] } = list;
    const add = (entries: readonly string[], bits: number): void => {
      for (const entry of entries)
        for (const phrase of phrasesOf(entry, list)) {
          if (!/[ ']/.test(phrase)) known.set(phrase, (known.get(phrase) ?? 0) | bits);
          else for (const word of phrase.split(/[ ']+/)) known.set(word, (known.get(word) ?? 0) | bits);
        }
    };
    const [name, talk] = [1 << n, (1 << n) | (1 << (n + TALK))];
    for (const [tag, entries] of Object.entries(says) as [Tag, readonly string[]][])
      if (!TELLS_NONE.test(tag)) add(entries, tag.startsWith('cue:') ? talk : name);
    for (const entries of Object.values(own)) add(entries, talk);
    add(neverMended, name);
  }
  for (const entries of Object.values(EVERYWHERE)) for (const entry of entries) known.delete(entry);
  return known;
}

/** The bits of talk stand so far above those of names; so many languages there can be. */
const TALK = 15;
const NAMES = (1 << TALK) - 1;

let known: ReadonlyMap<string, number> | undefined;

/** Built when the first message comes. */
const knownWords = (): ReadonlyMap<string, number> => (known ??= languagesOfWords(ALL_WORDS));

let grapes: RegExp | undefined;

/** `sauv blanc`: the names of several words, none of which tells a language. */
const namesOfGrapes = (): RegExp => {
  if (grapes !== undefined) return grapes;
  const names = ALL_WORDS.flatMap(({ says }) => says['cue:variety'] ?? []).filter((name) =>
    name.includes(' '),
  );
  grapes = new RegExp(`\\b(?:${[...new Set(names)].join('|')})\\b`, 'g');
  return grapes;
};

/** From this length one word alone tells a second language; own threshold. */
const CLEAR_LENGTH = 6;

/** So much talk of a language makes it clear, where the chat's has none of it; and so much where it has less than half; own thresholds. */
const CLEAR_TALK = 0.8;
const CLEAR_MIXED_TALK = 1.5;

const WORD = /\p{L}+/gu;

const LISTED = new RegExp(`^\\s*/(?:${LISTED_COMMANDS.join('|')})\\b`);

const countOf = (mask: number): number => {
  let n = 0;
  for (let rest = mask; rest > 0; rest &= rest - 1) n++;
  return n;
};

/**
 * Tells a message's languages by its words: one that fewer languages share tells more. In a draw it is the chat's.
 *
 * @param text A folded message.
 * @example
 * ```ts
 * tellLanguages('cuve 4 45hl libre 18', 'en').first // => 'fr'
 * tellLanguages('t4 18 3.5', 'de').first // => 'de'
 * ```
 */
export function tellLanguages(text: string, chat: Language): ToldLanguages {
  // Its words are English, and nobody has chosen them.
  if (LISTED.test(text)) return { first: 'en', others: [], isTold: true, isClear: false };
  const words = text.replaceAll(namesOfGrapes(), ' ').match(WORD) ?? [];
  const masks = words.flatMap((word) => (word.length > 1 ? (knownWords().get(word) ?? []) : []));
  const scoreOf = (n: number, shift: number): number => {
    let score = 0;
    for (const mask of masks) {
      const having = (mask >> shift) & NAMES;
      if (having & (1 << n)) score += 1 / countOf(having);
    }
    return score;
  };
  const scores = ALL_WORDS.map(({ language }, n) => ({ language, n, score: scoreOf(n, 0) }));
  const own = scores.find(({ language }) => language === chat);
  let best = own ?? { language: chat, n: 0, score: 0 };
  for (const one of scores) if (one.score > best.score + 1e-9) best = one;
  // One short word may be anything: a name, a slip.
  const isMissing = (n: number): boolean => {
    const only = new Set(
      words.filter((word) => word.length > 2 && ((knownWords().get(word) ?? 0) & NAMES) === 1 << n),
    );
    return only.size > 1 || [...only].some(({ length }) => length >= CLEAR_LENGTH);
  };
  const others = scores.filter(({ n }) => n !== best.n && isMissing(n)).map(({ language }) => language);
  const [talk, ownTalk] = [scoreOf(best.n, TALK), own === undefined ? 0 : scoreOf(own.n, TALK)];
  const isClear =
    best !== own && (ownTalk === 0 ? talk >= CLEAR_TALK : talk >= CLEAR_MIXED_TALK && ownTalk <= talk / 2);
  return { first: best.language, others, isTold: best.score > 0, isClear };
}
