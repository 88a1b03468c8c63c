import type { Board } from '../board.ts';
import { isCue, isFree, termAt } from '../board.ts';
import { isOther, kindAt } from './aim.ts';
import { concentrationAt } from '../units.ts';

/** A level so near above a vessel's number may as well be the last of a row; own threshold. */
const LONGEST_ROW = 12;

/** `barrel 12 to 14`: a row of vessels, or barrel 12 up to 14 mg/L? Gives the term of the second figure. */
export function rowOrLevel(board: Board, number: number, to: number): number | undefined {
  const at = to + 2;
  if (!isCue(board, to + 1, 'joined') || !isFree(board, at) || !/^\d{1,3}$/.test(termAt(board, at).text))
    return undefined;
  const kind = isFree(board, at + 2) ? undefined : kindAt(board, at + 1);
  if (isOther(board, at + 1) || concentrationAt(board, at + 1) || kind !== undefined) return undefined;
  const last = Number(termAt(board, at).text);
  return last > number && last - number <= LONGEST_ROW ? at : undefined;
}
