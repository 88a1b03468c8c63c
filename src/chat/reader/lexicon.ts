import type { Language } from './understood.ts';
import type { Tag, Words } from './words/words.ts';
import { READ_IN_FULL } from './words/read-in-full.ts';

/** What is known of a word or phrase: its tags, and in which languages it is one. */
export interface Entry {
  readonly tags: readonly Tag[];
  readonly languages: readonly Language[];
}

/** All words of all languages, ready to be looked up. */
export interface Lexicon {
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
}

const MENDABLE =
  /^(label|cue:target|cue:molecular|cue:binding|additive|unit:gal|unit:L|vessel|category|organic)/;

/**
 * Builds the lexicon from word lists; done once, when the module loads.
 *
 * @param lists One list a language; data only.
 * @example
 * ```ts
 * buildLexicon([]).phrases.size // => 0
 * ```
 */
export function buildLexicon(lists: readonly Words[]): Lexicon {
  const phrases = new Map<string, { tags: Tag[]; languages: Language[] }>();
  const longest = new Map<string, number>();
  for (const { language, says } of lists) {
    for (const [tag, entries] of Object.entries(says) as [Tag, readonly string[]][]) {
      for (const phrase of entries) {
        const entry = phrases.get(phrase) ?? { tags: [], languages: [] };
        if (!entry.tags.includes(tag)) entry.tags.push(tag);
        if (!entry.languages.includes(language)) entry.languages.push(language);
        phrases.set(phrase, entry);
        const words = phrase.split(' ');
        const first = words[0] ?? '';
        longest.set(first, Math.max(longest.get(first) ?? 0, words.length));
      }
    }
  }
  const formulas = new Map<string, string[]>();
  const mendable = new Map<string, string[]>();
  for (const [phrase, { tags }] of phrases) {
    if (!phrase.includes(' ') && /\d/.test(phrase)) {
      const same = formulas.get(phrase[0] ?? '') ?? [];
      formulas.set(
        phrase[0] ?? '',
        [...same, phrase].toSorted((a, b) => b.length - a.length),
      );
    }
    if (/^[a-z]{4,}$/.test(phrase) && tags.some((tag) => MENDABLE.test(tag))) {
      mendable.set(phrase[0] ?? '', [...(mendable.get(phrase[0] ?? '') ?? []), phrase]);
    }
  }
  return {
    phrases,
    longest,
    formulas,
    mendable,
    neverMended: new Set(lists.flatMap(({ neverMended = [] }) => neverMended)),
  };
}

/** The words of every language that is read in full. */
export const LEXICON: Lexicon = buildLexicon(READ_IN_FULL);
