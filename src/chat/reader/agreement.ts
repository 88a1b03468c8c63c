import { foldText } from './fold-text.ts';
import { lexiconOf } from './lexicon.ts';
import { isOwn, ownPieces } from './own-pieces.ts';
import { splitTerms } from './split-terms.ts';
import type { Language } from './understood.ts';
import { LANGUAGES } from './words/languages.ts';

/** Whether it does as it is read in a chat of that language. */
function agreementIn(text: string, language: Language): 'yes' | 'no' | undefined {
  const folded = foldText(text);
  const lexicon = lexiconOf(folded, language);
  const pieces = ownPieces(splitTerms(folded, lexicon), lexicon);
  const said = pieces.filter(({ kind }) => kind === 'word' || kind === 'number');
  const saysOnly = (id: 'yes' | 'no'): boolean =>
    said.some((_, i) => isOwn(said, i, id)) && said.every((_, i) => isOwn(said, i, id, 'filler', 'courtesy'));
  return saysOnly('yes') ? 'yes' : saysOnly('no') ? 'no' : undefined;
}

/**
 * Whether a text says yes or no to a question, in any language, and nothing else; undefined for all that says more.
 *
 * @example
 * ```ts
 * agreement('yes, all the same') // => 'yes'
 * agreement('no thanks') // => 'no'
 * agreement('sim, na mesma') // => 'yes'
 * agreement('yes, at 30') // => undefined
 * ```
 */
export function agreement(text: string): 'yes' | 'no' | undefined {
  for (const language of LANGUAGES) {
    const said = agreementIn(text, language);
    if (said !== undefined) return said;
  }
  return undefined;
}
