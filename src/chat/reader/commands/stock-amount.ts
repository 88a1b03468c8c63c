import type { Board } from '../board.ts';
import { figureAt, find, findingOf, isCue, isFree, isMark, refuse, termAt } from '../board.ts';
import { litresOf } from '../finders/barrels.ts';
import { gramsOf, isThreeDigits } from '../finders/mass.ts';
import { unitAt } from '../units.ts';
import type { UnitId } from '../words/words.ts';

const MASSES: readonly UnitId[] = ['g', 'kg', 'lb', 'oz'];
const VOLUMES: readonly UnitId[] = ['L', 'mL', 'cL', 'hL', 'galUS', 'galUK', 'gal', 'floz'];

/** `2 x 25 kg`, `2 bags of 25 kg`: how many of them, and where that begins. */
function timesBefore(board: Board, i: number): { readonly count: number; readonly from: number } {
  const isTimesAt = (k: number): boolean =>
    isMark(board, k, '×') || isMark(board, k, '*') || isCue(board, k, 'times') || isCue(board, k, 'bag');
  const k = isTimesAt(i - 1) ? i - 1 : i - 2;
  const isTimes = isTimesAt(k) && (k === i - 1 || isCue(board, i - 1, 'of'));
  const { value } = figureAt(board, k - 1);
  return isTimes && isFree(board, k - 1) && Number.isInteger(value) && value > 0
    ? { count: value, from: k - 1 }
    : { count: 1, from: i };
}

/** Whether an amount of something stands at term `i`: `25 kg`, `10 L`. */
export const isStockAmountAt = (board: Board, i: number): boolean =>
  isFree(board, i) && unitAt(board, i + 1, [...MASSES, ...VOLUMES]) !== undefined;

/** Finds how much of an additive is told of the store: a mass, or the volume of what is dissolved. */
export function findStockAmount(board: Board): void {
  const isDissolved = findingOf(board, 'additive')?.value.endsWith('-solution') === true;
  for (let i = 0; i < board.terms.length; i++) {
    if (!isFree(board, i)) continue;
    const mass = unitAt(board, i + 1, MASSES);
    const volume = isDissolved ? unitAt(board, i + 1, VOLUMES) : undefined;
    const unit = mass ?? volume;
    if (unit === undefined) continue;
    const { value, unsure, from } = figureAt(board, i);
    const times = timesBefore(board, i);
    const start = Math.min(from, times.from);
    if (unsure || isThreeDigits(termAt(board, i).text)) refuse(board, 'ambiguous-number', start, unit.to);
    else if (value < 0) refuse(board, 'negative-value', start, unit.to);
    else if (mass) find(board, 'mass_g', times.count * value * gramsOf(mass.id), 'unit', start, unit.to);
    else
      find(
        board,
        'additive_volume_mL',
        times.count * value * litresOf(board, unit.id) * 1000,
        'unit',
        start,
        unit.to,
      );
  }
}
