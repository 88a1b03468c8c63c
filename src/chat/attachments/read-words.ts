import { placeOf } from '../reader/board.ts';
import { foldText } from '../reader/fold-text.ts';
import { joinNumbers } from '../reader/join-numbers.ts';
import { lexiconOf } from '../reader/lexicon.ts';
import { readDraft } from '../reader/read-draft.ts';
import { setBoard } from '../reader/read-message.ts';
import { splitTerms } from '../reader/split-terms.ts';
import { isStranger } from '../reader/stranger.ts';
import type { Draft, ReaderSettings } from '../reader/understood.ts';

/** What words say, and those of them that the reader does not know. */
export interface WordsRead extends Draft {
  readonly strangers: readonly string[];
}

/** Longer than any cell or line that names one vessel; own threshold, in UTF-16 units. */
const LONGEST = 300;

/** What a cell or line of a list says, read as a message is; undefined for what is too long to be one. */
export function readWords(text: string, settings: ReaderSettings): WordsRead | undefined {
  if (text.length > LONGEST) return undefined;
  const folded = foldText(text);
  const board = setBoard(
    text,
    folded,
    joinNumbers(splitTerms(folded, lexiconOf(folded, settings.language))),
    settings,
  );
  const draft = readDraft(board);
  const strangers = board.terms.flatMap((_, i) => (isStranger(board, i) ? [placeOf(board, i, i).text] : []));
  return { ...draft, strangers };
}
