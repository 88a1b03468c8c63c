import { foldText } from './fold-text.ts';
import { LEXICON } from './lexicon.ts';
import { isOwn, ownPieces } from './own-pieces.ts';
import { splitTerms } from './split-terms.ts';

/**
 * Whether a text says yes or no to a question, and nothing else; undefined for all that says more.
 *
 * @example
 * ```ts
 * agreement('yes, all the same') // => 'yes'
 * agreement('no thanks') // => 'no'
 * agreement('yes, at 30') // => undefined
 * ```
 */
export function agreement(text: string): 'yes' | 'no' | undefined {
  const pieces = ownPieces(splitTerms(foldText(text), LEXICON), LEXICON);
  const said = pieces.filter(({ kind }) => kind === 'word' || kind === 'number');
  const saysOnly = (id: 'yes' | 'no'): boolean =>
    said.some((_, i) => isOwn(said, i, id)) && said.every((_, i) => isOwn(said, i, id, 'filler', 'courtesy'));
  return saysOnly('yes') ? 'yes' : saysOnly('no') ? 'no' : undefined;
}
