import type { Board } from './board.ts';
import { decimalAt, termAt } from './board.ts';

/** A bare decimal from 2.7 to 4.5 is the pH (as the trade writes it; common practice, no source). */
export const isPhValue = (value: number): boolean => value >= 2.7 && value <= 4.5;

/** Whether the numeral at term `i` looks like a pH: a decimal, and in the range of one. */
export const isPhLike = (board: Board, i: number): boolean =>
  /^\d[.,']\d+$/.test(termAt(board, i).text) && isPhValue(decimalAt(board, i).value);
