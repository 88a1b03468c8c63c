import type { Words } from './words/words.ts';

const UMLAUTS: Readonly<Record<string, string>> = { ä: 'ae', ö: 'oe', ü: 'ue' };

/** What is drawn together with the word behind it (`l'acide`, `dell'acido`), as a word of its own. */
const ELIDED =
  /(^|[^\p{L}'])(l|d|j|n|m|t|s|c|qu|un|all|dell|dall|nell|sull|quell|quest|jusqu|lorsqu|puisqu)'(?=\p{L})/gu;

/** A folded text with a blank behind each elided word, so that it is looked up by itself. */
export const partElided = (text: string): string =>
  text.includes("'") ? text.replace(ELIDED, "$1$2' ") : text;

/**
 * The spellings under which an entry of a word list is looked up: without accents, in German also with `ae` for `ä`.
 *
 * @param entry As it stands in the list; accents may be written or left out.
 * @param how How the language spells.
 * @example
 * ```ts
 * phrasesOf('fässer', { umlauts: true }) // => ['fasser', 'faesser']
 * phrasesOf("pas d'eau", { elides: true }) // => ["pas d' eau"]
 * ```
 */
export function phrasesOf(
  entry: string,
  { elides, umlauts }: Pick<Words, 'elides' | 'umlauts'>,
): readonly string[] {
  if (!/[^ -&(-~]/.test(entry)) return [entry];
  const isPlain = !/[^ -~]/.test(entry);
  const plain = isPlain ? entry : foldEntry(entry);
  const whole = elides ? partElided(plain) : plain;
  if (!umlauts || isPlain || !/[äöü]/.test(entry)) return [whole];
  return [whole, foldEntry(entry.replace(/[äöü]/g, (letter) => UMLAUTS[letter] ?? letter))];
}

const foldEntry = (entry: string): string =>
  entry
    .replaceAll('ß', 'ss')
    .replaceAll('œ', 'oe')
    .replaceAll('æ', 'ae')
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '');
