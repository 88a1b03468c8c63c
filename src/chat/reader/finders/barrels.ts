import { LITRES_IN } from '../../../core/units/volume.ts';
import type { Board } from '../board.ts';
import {
  claim,
  figureAt,
  find,
  hasTag,
  isCue,
  isFound,
  isFree,
  isMark,
  refuse,
  saysMany,
  termAt,
  isLabelled,
} from '../board.ts';
import type { UnitId } from '../words/words.ts';
import { unitAt } from '../units.ts';

/** Litres in a barrel whose size nobody said; common practice, no source. */
export const USUAL_BARREL_L = 225;

/** More barrels than any cellar has in one reading; own threshold, no source. */
const MOST_BARRELS = 10_000;

const SIZE_UNITS: readonly UnitId[] = ['L', 'gal', 'galUS', 'galUK', 'hL'];

const isBarrel = (board: Board, i: number): boolean => hasTag(board, i, 'vessel:barrel');
const isTimes = (board: Board, i: number): boolean =>
  isMark(board, i, '×') || isCue(board, i, 'times') || isMark(board, i, '*');

/** Litres in one of a unit, gallons as the chat has them. */
export function litresOf(board: Board, unit: UnitId): number {
  if (unit === 'gal') return LITRES_IN[board.settings.gallon === 'US' ? 'galUS' : 'galUK'];
  if (unit === 'floz') return board.settings.gallon === 'US' ? 0.0295735295625 : 0.0284130625;
  return LITRES_IN[unit as 'L'];
}

/** Notes which unit a volume was said in, and that a gallon without its country was read. */
export function noteUnit(board: Board, unit: UnitId): void {
  if (unit === 'gal') board.marks.gallonRead = true;
  const galUS = board.settings.gallon === 'US' ? 'galUS' : 'galUK';
  const shown = unit === 'gal' ? galUS : unit === 'cL' || unit === 'floz' ? 'mL' : unit;
  board.marks.volumeUnit ??= shown as 'L';
}

/** A size in litres or gallons at term `i`; without a unit only where `bare` allows (`40 x 228`). */
function sizeAt(board: Board, i: number, bare: boolean): { volume_L: number; to: number } | undefined {
  if (!isFree(board, i)) return undefined;
  const { value } = figureAt(board, i);
  const unit = unitAt(board, i + 1, SIZE_UNITS);
  if (unit) {
    noteUnit(board, unit.id);
    return { volume_L: value * litresOf(board, unit.id), to: unit.to };
  }
  return bare && value >= 100 && value <= 700 ? { volume_L: value, to: i } : undefined;
}

/** `40 x 225 L`, `6 x 60 gal barrels`, `6 barrels of 228`, `6 barrels (228 L)`, `6 225 L barrels`. */
function findCounted(board: Board, i: number): boolean {
  const { value: count, from } = figureAt(board, i);
  if (count < 0 || !Number.isInteger(count) || isLabelled(board, i)) return false;
  const named =
    board.taken[i + 1] === true
      ? false
      : isBarrel(board, i + 1) || hasTag(board, i + 1, 'vessel:cask') || hasTag(board, i + 1, 'vessel:other');
  const times = isTimes(board, i + 1);
  if (times) {
    const size = sizeAt(board, i + 2, true);
    if (!size) return false;
    const hasWord = isBarrel(board, size.to + 1) || hasTag(board, size.to + 1, 'vessel:cask');
    return keep(board, count, size.volume_L, from, hasWord ? size.to + 1 : size.to);
  }
  if (!named) {
    const size = sizeAt(board, i + 1, false);
    const isSize =
      size !== undefined &&
      isBarrel(board, size.to + 1) &&
      count < 1000 &&
      /^\d+$/.test(termAt(board, i).text);
    return isSize && keep(board, count, size.volume_L, from, size.to + 1);
  }
  let at = i + 2;
  while (
    isCue(board, at, 'of') ||
    isCue(board, at, 'with') ||
    isMark(board, at, '(') ||
    isMark(board, at, '@') ||
    isTimes(board, at) ||
    isCue(board, at, 'is')
  )
    at++;
  const size = at <= i + 4 ? sizeAt(board, at, at > i + 2) : undefined;
  if (size && (at > i + 2 || size.volume_L <= 700)) {
    const each = isCue(board, size.to + 1, 'each') ? size.to + 1 : size.to;
    return keep(board, count, size.volume_L, from, each);
  }
  if (!isBarrel(board, i + 1)) {
    board.marks.casksWithoutSize = true;
    claim(board, from, i + 1);
    return true;
  }
  if (count > MOST_BARRELS) {
    refuse(board, 'value-out-of-range', from, i + 1);
    return true;
  }
  if (count === 0) {
    refuse(board, 'volume-not-positive', from, i + 1);
    return true;
  }
  board.marks.barrelsAssumed_L = count * USUAL_BARREL_L;
  board.marks.barrelsCounted = true;
  board.marks.containers = count;
  board.marks.volumeUnit ??= 'barrel';
  claim(board, from, i + 1);
  return true;
}

function keep(board: Board, count: number, volume_L: number, from: number, to: number): boolean {
  if (count <= MOST_BARRELS) board.marks.containers = count;
  find(board, 'volume_L', count * volume_L, 'unit', from, to);
  return true;
}

/** `2 tanks of 40 hl each`; without "each" or "in all" nobody knows. */
function findTanks(board: Board, i: number): void {
  const isTanks = hasTag(board, i + 1, 'vessel:tank') && saysMany(termAt(board, i + 1));
  const count = figureAt(board, i).value;
  if (
    !isTanks ||
    board.taken[i + 1] === true ||
    !Number.isInteger(count) ||
    count < 2 ||
    count > MOST_BARRELS
  )
    return;
  let at = i + 2;
  while (
    isCue(board, at, 'of') ||
    isCue(board, at, 'with') ||
    isMark(board, at, ',') ||
    isMark(board, at, ':')
  )
    at++;
  const size = sizeAt(board, at, false);
  if (!size) return;
  if (isCue(board, size.to + 1, 'each')) keep(board, count, size.volume_L, i, size.to + 1);
  else if (isCue(board, size.to + 1, 'altogether')) {
    board.marks.containers = count;
    find(board, 'volume_L', size.volume_L, 'unit', i, size.to + 1);
  } else refuse(board, 'ambiguous-number', i, size.to);
}

/** Finds barrels by number and size. Without a size they are 225 L, said as an assumption. */
export function findBarrels(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (isFree(board, i) && !findCounted(board, i)) findTanks(board, i);
    else if (board.taken[i] !== true && termAt(board, i).kind === 'word') {
      if (isBarrel(board, i) && !isFound(board, 'vessel') && !isFound(board, 'vessels')) {
        const size = sizeAt(board, i + 1, false);
        if (!size && board.marks.barrelsAssumed_L === undefined && !saysMany(termAt(board, i)))
          board.marks.barrelsAssumed_L = USUAL_BARREL_L;
      }
      if (hasTag(board, i, 'vessel:cask')) board.marks.casksWithoutSize = true;
    }
  }
}
