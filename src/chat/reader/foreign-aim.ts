import type { Board } from './board.ts';
import { termAt } from './board.ts';
import { isStranger } from './stranger.ts';
import { ALL_WORDS } from './words/all.ts';

/** The words of all languages that lead to a level or an addition. */
const AIMS: ReadonlySet<string> = new Set(
  ALL_WORDS.flatMap(({ says }) =>
    (['cue:target', 'cue:to', 'cue:by', 'cue:add', 'cue:raise'] as const).flatMap((tag) => says[tag] ?? []),
  ),
);

/** `free 18 Ziel 35` in an English message: the word is strange here, but elsewhere it says what is wanted. */
export const isForeignAim = (board: Board, i: number): boolean =>
  isStranger(board, i) && AIMS.has(termAt(board, i).text);
