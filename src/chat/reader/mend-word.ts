import type { Lexicon } from './lexicon.ts';

/** Whether two words are one slip apart: a letter too many, too few, another, or two changed round. */
function isOneSlip(a: string, b: string): boolean {
  if (Math.abs(a.length - b.length) > 1) return false;
  let i = 0;
  while (i < a.length && a[i] === b[i]) i++;
  const [x, y] = [a.slice(i), b.slice(i)];
  return (
    x.slice(1) === y.slice(1) ||
    x.slice(1) === y ||
    x === y.slice(1) ||
    (x.length > 1 && x[0] === y[1] && x[1] === y[0] && x.slice(2) === y.slice(2))
  );
}

/** Whether two letters beside each other changed places: the only slip mended in a short word. */
const isSwapped = (a: string, b: string): boolean =>
  a.length === b.length &&
  a !== b &&
  a.split('').toSorted().join('') === b.split('').toSorted().join('') &&
  isOneSlip(a, b);

/** A sulfate and a sulfide are one letter from a sulfite and none of it, in any language. */
const OTHER_SALT = /sul(?:f|ph)(?:at|id)/;

/**
 * Mends a misspelt word, but only where it can be one word alone, and never across a chemical border.
 *
 * @param word A folded word that is not known.
 * @param lexicon The words that are known.
 * @returns The word it must be, or undefined.
 * @example
 * ```ts
 * import { LEXICON } from './lexicon.ts';
 * mendWord('molecullar', LEXICON) // => 'molecular'
 * mendWord('metabisulfate', LEXICON) // => undefined
 * ```
 */
export function mendWord(word: string, lexicon: Lexicon): string | undefined {
  if (word.length < 4 || word.length > 24 || lexicon.neverMended.has(word) || lexicon.phrases.has(word))
    return undefined;
  let found: string | undefined;
  for (const candidate of lexicon.mendable.get(word[0] ?? '') ?? []) {
    if (
      word.length === 4 ? candidate.length !== 4 || !isSwapped(word, candidate) : !isOneSlip(word, candidate)
    )
      continue;
    if (OTHER_SALT.test(word) !== OTHER_SALT.test(candidate)) continue;
    if (
      found !== undefined &&
      lexicon.phrases.get(found)?.tags[0] !== lexicon.phrases.get(candidate)?.tags[0]
    )
      return undefined;
    found ??= candidate;
  }
  return found;
}
