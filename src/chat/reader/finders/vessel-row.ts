import type { Board } from '../board.ts';
import { isCue, saysMany, termAt } from '../board.ts';
import type { Named } from './vessel-word.ts';
import { hasOwnUnit, isWholeAt, kindOf } from './vessel-word.ts';

/** Between the word and its first number: `from 3`, `dalla 3`, `del 3`. */
const LEADS = ['from', 'from-too', 'of', 'article'] as const;

/** A barrel's size and no number: `barrels from 225 to 228`. */
const LARGEST_ROW_NUMBER = 200;

/** `tanks from 3 to 6`, `vasche dalla 3 alla 6`: a row, unless a verb of raising takes both figures for levels. */
export function rowFrom(
  board: Board,
  i: number,
): { first: Named; last: { number: number; to: number } } | undefined {
  const kind = kindOf(board, i);
  if ((kind !== 'tank' && kind !== 'barrel') || !saysMany(termAt(board, i))) return undefined;
  // `6 barricas de 16 a 28`: counted, they have no numbers.
  if (board.terms[i - 1]?.kind === 'number') return undefined;
  const leads = (k: number): boolean => LEADS.some((cue) => isCue(board, k, cue));
  let at = i + 1;
  while (leads(at) && at < i + 3) at += 1;
  let end = at + 1;
  if (at === i + 1 || !isWholeAt(board, at) || hasOwnUnit(board, at)) return undefined;
  if (!isCue(board, end, 'to') && !isCue(board, end, 'joined')) return undefined;
  end += isCue(board, end + 1, 'article') ? 2 : 1;
  if (!isWholeAt(board, end) || hasOwnUnit(board, end)) return undefined;
  const [number, last] = [Number(termAt(board, at).text), Number(termAt(board, end).text)];
  const isLevel = board.terms.some(
    (_, k) => k < i && (isCue(board, k, 'raise') || isCue(board, k, 'target')),
  );
  if (isLevel || last > LARGEST_ROW_NUMBER) return undefined;
  return {
    first: { name: `${kind} ${number}`, kind, number, from: i, to: at },
    last: { number: last, to: end },
  };
}
