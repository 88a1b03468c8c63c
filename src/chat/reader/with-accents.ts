import type { FoldedText } from './fold-text.ts';
import type { Term } from './split-terms.ts';

/**
 * The terms of a message, those that say "is" only with an accent (`è`, beside `e` for "and"), "if" (`würde`, beside
 * `wurde` for "was"), or "half" (`metà`, beside `meta` for the powder), or what was done (`sulfité`, beside `sulfite`), tagged by how they are written.
 */
export function withAccents(message: string, { at }: FoldedText, terms: readonly Term[]): readonly Term[] {
  const isOfBoth = (tag: string): boolean => /^cue:(is|if|half|past)-if-accented$/.test(tag);
  if (!terms.some(({ tags }) => tags.some(isOfBoth))) return terms;
  return terms.map((term) => {
    if (!term.tags.some(isOfBoth) || !/\P{ASCII}/u.test(message.slice(at[term.start], at[term.end])))
      return term;
    // `sulfité` is what was done, and `sulfite` what goes in.
    if (term.tags.includes('cue:past-if-accented'))
      return { ...term, tags: term.tags.filter((tag) => !tag.startsWith('additive:')) };
    if (term.tags.includes('cue:half-if-accented')) return { ...term, tags: ['cue:half'] };
    return term.tags.includes('cue:if-if-accented')
      ? { ...term, tags: [...term.tags.filter((tag) => tag !== 'cue:question'), 'cue:if'] }
      : { ...term, tags: [...term.tags.filter((tag) => tag !== 'cue:and'), 'cue:is', 'cue:states'] };
  });
}
