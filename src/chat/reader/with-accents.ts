import type { FoldedText } from './fold-text.ts';
import type { Term } from './split-terms.ts';

/**
 * The terms of a message, those that say "is" only with an accent (`è`, beside `e` for "and"), or "if" (`würde`, beside
 * `wurde` for "was"), tagged by how they are written.
 */
export function withAccents(message: string, { at }: FoldedText, terms: readonly Term[]): readonly Term[] {
  const isOfBoth = (tag: string): boolean => tag === 'cue:is-if-accented' || tag === 'cue:if-if-accented';
  if (!terms.some(({ tags }) => tags.some(isOfBoth))) return terms;
  return terms.map((term) => {
    if (!term.tags.some(isOfBoth) || !/\P{ASCII}/u.test(message.slice(at[term.start], at[term.end]))) return term;
    return term.tags.includes('cue:if-if-accented')
      ? { ...term, tags: [...term.tags.filter((tag) => tag !== 'cue:question'), 'cue:if'] }
      : { ...term, tags: [...term.tags.filter((tag) => tag !== 'cue:and'), 'cue:is', 'cue:states'] };
  });
}
