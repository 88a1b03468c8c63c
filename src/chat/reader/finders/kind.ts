import type { Category, Product, Style } from '../../../core/wine.ts';
import type { Board } from '../board.ts';
import { find, hasTag, isCue, termAt, isMark } from '../board.ts';
import { isPhLike } from '../ph-like.ts';
import { isStranger } from '../stranger.ts';

const STYLES: readonly Style[] = ['red', 'white', 'rosé'];
const CATEGORIES: readonly Category[] = ['sweet', 'sparkling', 'fortified'];
const PRODUCTS: readonly Product[] = ['cider', 'mead', 'fruit-wine', 'alcohol-free'];

/** `tawny port 500 L`: right before a figure, among a pH or SO2, a category is one, whoever knows the word beside it. */
const opensFigures = (board: Board, i: number): boolean =>
  board.terms[i + 1]?.kind === 'number' &&
  (board.cues.has('label:ph') ||
    board.cues.has('label:free') ||
    board.terms.some((_, k) => isPhLike(board, k)));

/** `rose to 3.6` is a verb, `sample port` a tap. */
function isOtherwise(board: Board, i: number): boolean {
  if (isCue(board, i, 'rises-too'))
    return isCue(board, i + 1, 'to') || isCue(board, i + 1, 'by') || isCue(board, i + 1, 'from');
  return (
    isCue(board, i, 'tap-too') &&
    (isCue(board, i - 1, 'lot') ||
      isCue(board, i - 1, 'vessel-statement') ||
      (isCue(board, i - 1, 'article') && !opensFigures(board, i)))
  );
}

/** `Sweet!`, `sweet, thanks`: joy, and no wine. */
const isThanks = (board: Board, i: number): boolean =>
  i === 0 &&
  isCue(board, i, 'thanks') &&
  (isMark(board, 1, '!') || isMark(board, 1, ',') || isMark(board, 1, '.'));

/** Finds colour, category and product, and the word organic; a phrase that is of fruit too says only that the grapes were. */
export function findKind(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true || termAt(board, i).kind !== 'word' || isOtherwise(board, i)) continue;
    const style = STYLES.find((one) => hasTag(board, i, `style:${one}`));
    const category = CATEGORIES.find((one) => hasTag(board, i, `category:${one}`));
    const product = PRODUCTS.find((one) => hasTag(board, i, `product:${one}`));
    if (isCue(board, i - 1, 'not')) continue;
    if (style && isStranger(board, i + 1)) continue;
    if (product && isStranger(board, i + 1)) continue;
    const isBesideStranger = isStranger(board, i - 1) || isStranger(board, i + 1);
    if (category && ((isBesideStranger && !opensFigures(board, i)) || isThanks(board, i))) continue;
    if (style) find(board, 'style', style, 'labelled', i, i);
    else if (category) {
      find(board, 'category', category, 'labelled', i, i);
      if (isCue(board, i, 'quality')) find(board, 'quality', true, 'labelled', i, i);
      if (isCue(board, i, 'other-sparkling')) find(board, 'quality', false, 'labelled', i, i);
    } else if (product) find(board, 'product', product, 'labelled', i, i);
    else if (hasTag(board, i, 'organic')) {
      find(board, 'organic', true, 'labelled', i, i);
      if (isCue(board, i, 'fruit')) board.marks.ofOrganicFruit = true;
    }
  }
}
