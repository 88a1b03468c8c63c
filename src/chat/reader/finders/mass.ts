import { GRAMS_IN } from '../../../core/units/mass.ts';
import type { Board } from '../board.ts';
import { figureAt, find, hasTag, isCue, isFree, isMark, refuse, termAt } from '../board.ts';
import { takeFruit, tonIn_kg } from './fruit.ts';
import type { UnitId } from '../words/words.ts';
import { MASS_UNITS, concentrationAt, unitAt } from '../units.ts';

/** Grams in one of a unit; tons and quintals are of fruit and never weigh an additive. */
export const gramsOf = (unit: UnitId): number =>
  unit === 'ton' ? 1_000_000 : unit === 'quintal' ? 100_000 : GRAMS_IN[unit as 'g'];

/** `1.250 kg`, `1,250 kg`: a kilogram and a quarter, or more than a ton? Asked in every language. */
export const isThreeDigits = (text: string): boolean => /^[1-9]\d{0,2}[.,]\d{3}$/.test(text);

/** Where the thing stands that a weight is of: `2 t of the white grapes`. */
function skipsTo(board: Board, i: number): number {
  let at = i;
  while (
    at < i + 3 &&
    (isCue(board, at, 'of') ||
      isCue(board, at, 'article') ||
      ADJECTIVES.some((tag) => hasTag(board, at, tag)))
  )
    at++;
  return at;
}

const ADJECTIVES = ['style:red', 'style:white', 'style:rosé', 'organic'] as const;

/** A `G` with "of must", "of wine", "of juice" may mean gallons; grams of wine nobody weighs. */
export const mayBeGallons = (board: Board, i: number): boolean => {
  const term = board.terms[i];
  return term?.text === 'g' && isCue(board, i + 1, 'of') && isCue(board, i + 2, 'wine');
};

/** Whether a weight is of fruit: fruit, a grape or must stands behind it, or fruit before it. */
function isOfFruit(board: Board, from: number, to: number, unit: UnitId): boolean {
  const next = skipsTo(board, to + 1);
  if (unit === 'ton' || unit === 'quintal' || isCue(board, next, 'fruit') || isCue(board, from - 1, 'fruit'))
    return true;
  return unit !== 'g' && (isCue(board, next, 'variety') || hasTag(board, next, 'stage:must'));
}

/** `2 t grapes`: the t of a ton, which elsewhere is a tank's. */
function findTons(board: Board, i: number): boolean {
  const next = board.terms[i + 1];
  const behind = skipsTo(board, i + 2);
  const isTon =
    next?.text === 't' &&
    (isCue(board, behind, 'fruit') || isCue(board, behind, 'variety') || hasTag(board, behind, 'stage:must'));
  if (!isTon) return false;
  takeFruit(board, figureAt(board, i).value * 1000, i, i + 1);
  return true;
}

/** `1 lb 4 oz` is one mass. */
function ouncesAfter(board: Board, i: number): { mass_g: number; to: number } | undefined {
  const unit = isFree(board, i) ? unitAt(board, i + 1, ['oz']) : undefined;
  return unit && { mass_g: figureAt(board, i).value * gramsOf('oz'), to: unit.to };
}

function findMassAt(board: Board, i: number): void {
  if (findTons(board, i)) return;
  const unit = unitAt(board, i + 1, MASS_UNITS);
  if (!unit || concentrationAt(board, i + 1)) return;
  const { value, from } = figureAt(board, i);
  if (unit.id === 'mg' && !board.terms[unit.to + 1]?.tags.some((tag) => tag.startsWith('additive'))) return;
  if (mayBeGallons(board, unit.to) || isThreeDigits(termAt(board, i).text) || Number.isNaN(value))
    return refuse(board, 'ambiguous-number', i, unit.to);
  if (isOfFruit(board, from, unit.to, unit.id)) {
    const grams = unit.id === 'ton' ? tonIn_kg(board, termAt(board, i + 1).text) * 1000 : gramsOf(unit.id);
    return takeFruit(board, (value * grams) / 1000, from, unit.to);
  }
  if (value < 0) return refuse(board, 'negative-value', from, unit.to);
  const more =
    unit.id === 'lb'
      ? ouncesAfter(board, isCue(board, unit.to + 1, 'and') ? unit.to + 2 : unit.to + 1)
      : undefined;
  const range = isMark(board, i - 1, '-') && isFree(board, i - 2) && from === i;
  if (range) return refuse(board, 'ambiguous-number', i - 2, unit.to);
  find(board, 'mass_g', value * gramsOf(unit.id) + (more?.mass_g ?? 0), 'unit', from, more?.to ?? unit.to);
}

/** Finds a mass of additive. Fruit by weight is no mass: it asks for the volume. */
export function findMass(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) if (isFree(board, i)) findMassAt(board, i);
}
