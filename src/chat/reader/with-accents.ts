import type { FoldedText } from './fold-text.ts';
import type { Term } from './split-terms.ts';

/**
 * The terms of a message, those that say "is" only with an accent (`è`, beside `e` for "and") tagged by how they are
 * written.
 */
export function withAccents(message: string, { at }: FoldedText, terms: readonly Term[]): readonly Term[] {
  if (!terms.some(({ tags }) => tags.includes('cue:is-if-accented'))) return terms;
  return terms.map((term) => {
    const isAccented = /\P{ASCII}/u.test(message.slice(at[term.start], at[term.end]));
    const saysIs = term.tags.includes('cue:is-if-accented') && isAccented;
    return saysIs
      ? { ...term, tags: [...term.tags.filter((tag) => tag !== 'cue:and'), 'cue:is', 'cue:states'] }
      : term;
  });
}
