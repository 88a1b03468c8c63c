import { foldText } from './fold-text.ts';
import { LEXICON } from './lexicon.ts';
import { isOwn, ownPieces } from './own-pieces.ts';
import { splitTerms } from './split-terms.ts';

/**
 * Whether a text says yes and nothing else.
 *
 * @example
 * ```ts
 * saysYes('yes, all the same') // => true
 * saysYes('yes, at 30') // => false
 * ```
 */
export function saysYes(text: string): boolean {
  const pieces = ownPieces(splitTerms(foldText(text), LEXICON), LEXICON);
  const said = pieces.filter(({ kind }) => kind === 'word' || kind === 'number');
  return said.some((_, i) => isOwn(said, i, 'yes')) && said.every((_, i) => isOwn(said, i, 'yes', 'filler'));
}
