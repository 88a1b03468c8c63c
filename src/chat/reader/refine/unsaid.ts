import type { Board } from '../board.ts';
import { isCue, isFound, placeOf, termAt } from '../board.ts';
import { isStranger } from '../stranger.ts';

/** Words that say that something was or is to be added: then a figure that nothing names is no reading. */
export const speaksOfAdding = (board: Board): boolean =>
  board.lexicon.language !== 'en' &&
  board.terms.some(
    (_, i) =>
      (['past', 'past-if-accented', 'add', 'add-behind', 'raise'] as const).some((cue) =>
        isCue(board, i, cue),
      ) ||
      ((isCue(board, i, 'target') || isCue(board, i, 'bring')) && !isFound(board, 'target')),
  );

/** A word in small letters that no list knows: in a language that is not read in full it may be the verb. */
export const holdsUnknownVerb = (board: Board): boolean =>
  (board.lexicon.language !== 'en' || !board.lexicon.isTold) &&
  board.terms.some(
    (_, i) =>
      isStranger(board, i) && termAt(board, i).text.length > 3 && /^\p{Ll}/u.test(placeOf(board, i, i).text),
  );

/** `1 livre de méta`: the word behind a figure, in a language whose every unit nobody has listed. */
export const isOfUnknown = (board: Board, i: number | undefined): boolean =>
  i !== undefined && board.lexicon.language !== 'en' && isStranger(board, i + 1);

/** Whether the message says that something was not added. */
export const isNegated = ({ notes }: Board): boolean => notes.some(({ id }) => id === 'negated');
