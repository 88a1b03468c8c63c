import { YIELD_BOUNDS } from '../../../core/dose/fruit.ts';
import type { FruitState } from '../../../core/dose/must-ranges.ts';
import type { Board } from '../board.ts';
import { claim, figureAt, hasTag, isCue, isFound, isFree, isMark, refuse, termAt } from '../board.ts';
import type { UnitAt } from '../units.ts';
import { VOLUME_UNITS, unitAt } from '../units.ts';
import { litresOf } from './barrels.ts';
import { isNegatedBefore } from './negated-before.ts';

/** Kilograms of a short ton, in which fruit is weighed where wine is measured in US gallons (NIST Handbook 44; from memory). */
const SHORT_TON_kg = 907.18474;

/** Kilograms in a ton as somebody writes it: a short one where they count in US gallons, else a tonne. */
export function tonIn_kg({ settings, marks }: Board, word: string): number {
  const mayBeShort = word === 'ton' || word === 'tons';
  const isShort = mayBeShort && (marks.shortTon === true || settings.volumeUnit === 'galUS');
  return isShort ? SHORT_TON_kg : 1000;
}

/** Takes a weight of fruit; a second one that is another contradicts it. */
export function takeFruit(board: Board, fruit_kg: number, from: number, to: number): void {
  const before = board.marks.fruit_kg;
  board.marks.fruitByWeight = true;
  if (before !== undefined && before !== fruit_kg) return refuse(board, 'conflicting-values', from, to);
  if (!(fruit_kg > 0)) return refuse(board, 'volume-not-positive', from, to);
  board.marks.fruit_kg = fruit_kg;
  claim(board, from, to);
}

const isPer = (board: Board, i: number): boolean => isMark(board, i, '/') || isCue(board, i, 'per');

/** The weight after "per": `100 kg`, `kg`, `ton`, `t`; in kg, with its last term. */
function weightAt(board: Board, i: number): { weight_kg: number; to: number } | undefined {
  const count = isFree(board, i) ? figureAt(board, i).value : 1;
  const at = isFree(board, i) ? i + 1 : i;
  const unit = unitAt(board, at, ['kg', 'ton', 'quintal', 'lb']);
  const word = termAt(board, at).text;
  // `950 L / T8` names a tank.
  if (board.taken[at] === true || (word === 't' && isFree(board, at + 1))) return undefined;
  if (unit?.id === 'kg') return { weight_kg: count, to: unit.to };
  if (unit?.id === 'quintal') return { weight_kg: count * 100, to: unit.to };
  if (unit?.id === 'ton') return { weight_kg: count * tonIn_kg(board, word), to: unit.to };
  return word === 't' ? { weight_kg: count * 1000, to: at } : undefined;
}

function takeYield(board: Board, yield_L_per_100_kg: number, from: number, to: number): void {
  const { min, max } = YIELD_BOUNDS;
  const isPossible = yield_L_per_100_kg >= min && yield_L_per_100_kg <= max;
  if (!isPossible) return refuse(board, 'value-out-of-range', from, to);
  board.marks.yield_L_per_100_kg = yield_L_per_100_kg;
  claim(board, from, to);
}

/** `65 L/100 kg`, `160 gal per ton`. */
function yieldAt(board: Board, i: number, unit: UnitAt): void {
  const per = unit.to + 1;
  if (!isPer(board, per)) return;
  const isUS = unit.id === 'galUS' || (unit.id === 'gal' && board.settings.gallon === 'US');
  if (isUS && /^tons?$/.test(termAt(board, per + 1).text)) board.marks.shortTon = true;
  const weight = weightAt(board, per + 1);
  if (weight === undefined) return;
  const from = isCue(board, i - 1, 'yield') ? i - 1 : i;
  const litres_L = figureAt(board, i).value * litresOf(board, unit.id);
  if (unit.id === 'gal') board.marks.gallonRead = true;
  takeYield(board, (litres_L * 100) / weight.weight_kg, from, weight.to);
}

/** Finds how much must comes of the fruit: `65 L/100 kg`, `160 gal/ton`, `yield 65`. */
export function findYield(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (!isFree(board, i)) continue;
    const unit = unitAt(board, i + 1, VOLUME_UNITS);
    if (unit) yieldAt(board, i, unit);
    else if (isCue(board, i - 1, 'yield') && !isMark(board, i + 1, '%'))
      takeYield(board, figureAt(board, i).value, i - 1, i);
  }
}

const STATES: readonly FruitState[] = ['rot', 'damaged', 'sound'];

/** Fruit by weight whose yield is known is must, also where nobody says the word. */
function assumeMust(board: Board): void {
  const { fruit_kg, yield_L_per_100_kg } = board.marks;
  const hasYield = (yield_L_per_100_kg ?? board.settings.yield_L_per_100_kg) !== undefined;
  if (fruit_kg !== undefined && hasYield && !isFound(board, 'stage'))
    board.findings.push({ field: 'stage', value: 'must', said: 'bare', from: 0, to: 0 });
}

/** Finds how sound the fruit of a must is; of several words the worst counts. */
export function findFruitState(board: Board): void {
  assumeMust(board);
  const isMust = isFound(board, 'stage') && board.findings.some(({ value }) => value === 'must');
  if (!isMust && !board.marks.fruitByWeight) return;
  for (let i = 0; i < board.terms.length; i++) {
    const state = STATES.find((one) => hasTag(board, i, `cue:fruit-${one}`));
    if (state === undefined || board.taken[i] === true) continue;
    claim(board, i, i);
    const before = board.marks.fruitState;
    if (isNegatedBefore(board, i)) continue;
    if (before === undefined || STATES.indexOf(state) < STATES.indexOf(before))
      board.marks.fruitState = state;
  }
}
