import type { Board } from './board.ts';
import { placeOf } from './board.ts';
import type { Reading } from './understood.ts';

/**
 * A line with figures that nothing could read, quoted.
 *
 * @param board The line, as it was looked through.
 */
export function notUnderstood(board: Board): Reading {
  const about = placeOf(board, 0, board.terms.length - 1).text;
  return {
    intent: 'chat',
    fields: {},
    assumed: {},
    asks: [],
    problems: [{ code: 'not-understood', about }],
    setAside: [],
    notes: [],
    marks: {},
    where: {},
  };
}
