import type { FoldedText } from './fold-text.ts';
import { phrasesOf } from './spellings.ts';
import { tellLanguages } from './tell-languages.ts';
import type { Language } from './understood.ts';
import { ALL_WORDS } from './words/all.ts';
import { EVERYWHERE } from './words/everywhere.ts';
import type { OwnWordId, Tag, Words } from './words/words.ts';

/** What is known of a word or phrase: its tags. */
export interface Entry {
  readonly tags: readonly Tag[];
}

/** A phrase of the bot's own words. */
export interface OwnPhrase {
  readonly words: readonly string[];
  readonly ids: OwnWordId[];
}

/** The words with which a message is read, ready to be looked up. */
export interface Lexicon {
  /** The language of the message. */
  readonly language: Language;
  /** Whether its words told it; else it is the chat's. */
  readonly isTold: boolean;
  /** Whether an article may be drawn together with the word behind it. */
  readonly elides: boolean;
  /** By phrase, its words joined with one blank. */
  readonly phrases: ReadonlyMap<string, Entry>;
  /** By first word, how many words the longest phrase has that begins with it. */
  readonly longest: ReadonlyMap<string, number>;
  /** Words that hold digits (`so2`, `k2s2o5`), by first letter, longest first. */
  readonly formulas: ReadonlyMap<string, readonly string[]>;
  /** Long words that a slip of one letter may be mended to, by first letter. */
  readonly mendable: ReadonlyMap<string, readonly string[]>;
  /** Words that are never taken for a slip of another. */
  readonly neverMended: ReadonlySet<string>;
  /** The bot's own words by the first word of each, the longest phrase first. */
  readonly own: ReadonlyMap<string, readonly OwnPhrase[]>;
  /** Months by their names, January is 1. */
  readonly months: ReadonlyMap<string, number>;
  /** Days of the week by their names, Monday is 1. */
  readonly weekdays: ReadonlyMap<string, number>;
  /** Languages by their names, in whatever language those are. */
  readonly languages: ReadonlyMap<string, Language>;
}

const MENDABLE =
  /^(label|cue:target|cue:molecular|cue:binding|additive|unit:gal|unit:L|vessel|category|organic)/;

/** What is read in every language: names of things. The small words of a language are read only in a message of it. */
const NAMES =
  /^(unit:(?!none-of-ours|degree|quintal|ton|C$|F$)|label:(?!aside|volume)|additive|vessel:|style:|category:|product:|stage:|organic|cue:molecular)/;

/** Shorter names of another language are taken for no name. */
const SHORTEST_NAME = 4;

/** How a lexicon is made. */
export interface Making {
  /** Languages of which only the names of things are read. */
  readonly names?: readonly Words[];
  readonly isTold?: boolean;
}

function numbered(names: readonly Words['months'][]): ReadonlyMap<string, number> {
  const map = new Map<string, number>();
  for (const list of names)
    for (const [i, same] of (list ?? []).entries())
      for (const name of same) if (!map.has(name)) map.set(name, i + 1);
  return map;
}

function ownOf(lists: readonly Words[]): Map<string, OwnPhrase[]> {
  const index = new Map<string, OwnPhrase[]>();
  const known = new Map<string, { readonly phrase: OwnPhrase; readonly language: Language }>();
  for (const list of lists) {
    const { language, own = {} } = list;
    for (const [id, entries] of Object.entries(own) as [OwnWordId, readonly string[]][]) {
      for (const text of entries.flatMap((entry) => phrasesOf(entry, list))) {
        const before = known.get(text);
        if (before) {
          if (before.language === language && !before.phrase.ids.includes(id)) before.phrase.ids.push(id);
          continue;
        }
        const words = text.split(' ');
        const phrase = { words, ids: [id] };
        known.set(text, { phrase, language });
        const same = index.get(words[0] ?? '');
        if (same) same.push(phrase);
        else index.set(words[0] ?? '', [phrase]);
      }
    }
  }
  for (const phrases of index.values()) phrases.sort((a, b) => b.words.length - a.words.length);
  return index;
}

/**
 * Builds a lexicon from word lists. A word of an earlier list means what it means there, and nothing of a later one.
 *
 * @param lists The languages of a message, its own first.
 * @example
 * ```ts
 * buildLexicon([]).phrases.size // => 0
 * ```
 */
export function buildLexicon(lists: readonly Words[], { names = [], isTold = true }: Making = {}): Lexicon {
  const phrases = new Map<string, { readonly tags: Tag[]; readonly of: Language | 'everywhere' | 'names' }>();
  const longest = new Map<string, number>();
  const neverMended = new Set(lists.flatMap((list) => list.neverMended ?? []));
  const add = (phrase: string, tag: Tag, of: Language | 'everywhere' | 'names'): void => {
    const entry = phrases.get(phrase);
    if (entry) {
      if (entry.of === of && !entry.tags.includes(tag)) entry.tags.push(tag);
      return;
    }
    phrases.set(phrase, { tags: [tag], of });
    const cut = phrase.indexOf(' ');
    const first = cut < 0 ? phrase : phrase.slice(0, cut);
    const words = cut < 0 ? 1 : phrase.split(' ').length;
    if (words > (longest.get(first) ?? 0)) longest.set(first, words);
  };
  for (const list of lists) {
    const { language, says } = list;
    for (const [tag, entries] of Object.entries(says) as [Tag, readonly string[]][])
      for (const entry of entries) for (const phrase of phrasesOf(entry, list)) add(phrase, tag, language);
  }
  // English has all of it, with meanings of its own (`k`, `bar`).
  if (lists[0] !== undefined && lists[0].language !== 'en')
    for (const [tag, entries] of Object.entries(EVERYWHERE) as [Tag, readonly string[]][])
      for (const phrase of entries)
        if (phrases.get(phrase)?.of !== lists[0].language) add(phrase, tag, 'everywhere');
  for (const list of names) {
    const { says } = list;
    for (const [tag, entries] of Object.entries(says) as [Tag, readonly string[]][]) {
      if (!NAMES.test(tag)) continue;
      for (const entry of entries)
        for (const phrase of phrasesOf(entry, list))
          if ((phrase.length >= SHORTEST_NAME || /\d/.test(phrase)) && !neverMended.has(phrase))
            add(phrase, tag, 'names');
    }
  }
  const formulas = new Map<string, string[]>();
  const mendable = new Map<string, string[]>();
  for (const [phrase, { tags, of }] of phrases) {
    const initial = phrase[0] ?? '';
    if (!phrase.includes(' ') && /\d/.test(phrase)) {
      const same = formulas.get(initial);
      if (same) same.push(phrase);
      else formulas.set(initial, [phrase]);
    }
    if (of !== 'names' && /^[a-z]{4,}$/.test(phrase) && tags.some((tag) => MENDABLE.test(tag))) {
      const same = mendable.get(initial);
      if (same) same.push(phrase);
      else mendable.set(initial, [phrase]);
    }
  }
  for (const same of formulas.values()) same.sort((a, b) => b.length - a.length);
  return {
    language: lists[0]?.language ?? 'en',
    isTold,
    elides: lists.some((list) => list.elides === true),
    phrases,
    longest,
    formulas,
    mendable,
    neverMended,
    own: ownOf(lists),
    months: numbered(lists.map(({ months }) => months)),
    languages: LANGUAGES_BY_NAME,
    weekdays: numbered(lists.map(({ weekdays }) => weekdays)),
  };
}

/** `german`, `deutsch`, `de`, each also as another language calls it. */
const LANGUAGES_BY_NAME: ReadonlyMap<string, Language> = new Map(
  ALL_WORDS.flatMap((list) =>
    (Object.entries(list.languages ?? {}) as [Language, readonly string[]][]).flatMap(([language, names]) =>
      names.flatMap((name) => phrasesOf(name, list)).map((name): [string, Language] => [name, language]),
    ),
  ),
);

const built = new Map<string, Lexicon>();
const ofText = new WeakMap<FoldedText, { readonly chat: Language; readonly lexicon: Lexicon }>();

/** The lexicon of some languages; each is built when the first message in them comes. */
function lexiconIn(languages: readonly Language[], isTold: boolean): Lexicon {
  const named = languages.join();
  const key = `${named} ${isTold}`;
  const before = built.get(key);
  if (before) return before;
  // Built once, whether the message told its languages or the chat did.
  const other = built.get(`${named} ${!isTold}`);
  const lexicon = other === undefined ? buildOf(languages, isTold) : { ...other, isTold };
  built.set(key, lexicon);
  return lexicon;
}

function buildOf(languages: readonly Language[], isTold: boolean): Lexicon {
  const lists = languages.flatMap((one) => ALL_WORDS.filter(({ language }) => language === one));
  const names = ALL_WORDS.filter(({ language }) => !languages.includes(language));
  return buildLexicon(lists, { names, isTold });
}

/** The lexicon of a message, by the languages that its words tell. */
export function lexiconOf(folded: FoldedText, chat: Language): Lexicon {
  const before = ofText.get(folded);
  if (before?.chat === chat) return before.lexicon;
  const { first, others, isTold } = tellLanguages(folded.text, chat);
  const lexicon = lexiconIn([first, ...others], isTold);
  ofText.set(folded, { chat, lexicon });
  return lexicon;
}

/** The words of English, with the names of things in every language. */
export const LEXICON: Lexicon = lexiconIn(['en'], true);
