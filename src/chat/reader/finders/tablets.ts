import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { Board } from '../board.ts';
import {
  claim,
  figureAt,
  find,
  hasTag,
  isCue,
  isFree,
  isMark,
  refuse,
  isLabelled,
  claimsNext,
} from '../board.ts';
import { unitAt } from '../units.ts';

/** Grams of salt above which a plain tablet is no plain tablet. */
const LARGEST_PLAIN_TABLET_g = 2;

const isCampden = (board: Board, i: number): boolean =>
  hasTag(board, i, 'additive:campden') ||
  hasTag(board, i, 'additive:campden-potassium') ||
  hasTag(board, i, 'additive:campden-sodium');

/** The salt that stands beside a plain tablet. */
function saltNear(board: Board, i: number): AdditiveId | undefined {
  if (hasTag(board, i, 'additive:campden-potassium')) return 'potassium-metabisulfite';
  if (hasTag(board, i, 'additive:campden-sodium')) return 'sodium-metabisulfite';
  for (let k = i - 4; k <= i + 6; k++) {
    const salt =
      isCue(board, k, 'potassium') || hasTag(board, k, 'additive:potassium-metabisulfite')
        ? 'potassium-metabisulfite'
        : isCue(board, k, 'sodium') || hasTag(board, k, 'additive:sodium-metabisulfite')
          ? 'sodium-metabisulfite'
          : undefined;
    if (salt && board.taken[k] !== true) {
      claim(board, k, k);
      return salt;
    }
  }
  return undefined;
}

/** A size in grams within a few terms of the tablet word. */
function sizeNear(board: Board, i: number): { mass_g: number; from: number; to: number } | undefined {
  for (const k of [i - 2, i - 3, i + 1, i + 2, i + 3, i + 4, i - 4]) {
    if (board.terms[k]?.kind === 'break') continue;
    const unit = isFree(board, k) && !isLabelled(board, k) ? unitAt(board, k + 1, ['g']) : undefined;
    if (unit) return { mass_g: figureAt(board, k).value, from: k, to: unit.to };
  }
  return undefined;
}

const skipTimes = (board: Board, i: number): number =>
  isMark(board, i, '×') ||
  isMark(board, i, '*') ||
  isCue(board, i, 'times') ||
  isCue(board, i, 'effervescent') ||
  hasTag(board, i, 'label:so2')
    ? i - 1
    : i;

/** The number of tablets that ends at term `i`, if one does. */
function countBefore(board: Board, i: number): number | undefined {
  const k = skipTimes(board, i);
  return isFree(board, k) && !isMark(board, k - 1, '/') && !isLabelled(board, k) && !claimsNext(board, k - 1)
    ? k
    : undefined;
}

function findCampden(board: Board, i: number): void {
  board.marks.campden = true;
  const size = sizeNear(board, i);
  const count =
    countBefore(board, i - 1) ?? (size && size.from < i ? countBefore(board, size.from - 1) : undefined);
  const after = isFree(board, i + 2) && isCue(board, i + 1, 'times') ? i + 2 : undefined;
  const salt = saltNear(board, i);
  if (salt) find(board, 'additive', salt, 'labelled', i, i);
  claim(board, i, i);
  if (size && size.mass_g > 0 && size.mass_g <= LARGEST_PLAIN_TABLET_g)
    find(board, 'tablet_salt_g', size.mass_g, 'unit', size.from, size.to);
  else if (size) refuse(board, 'ambiguous-number', size.from, size.to);
  const apart = board.terms.findIndex(
    (_, k) => isCue(board, k, 'tablet') && countBefore(board, k - 1) !== undefined,
  );
  const counted = count ?? after ?? (apart < 0 ? undefined : countBefore(board, apart - 1));
  // `campden 3 in 15 L`: three tablets, or free SO2?
  if (counted === undefined && isFree(board, i + 1) && isCue(board, i + 2, 'in'))
    return refuse(board, 'ambiguous-number', i, i + 1);
  if (counted !== undefined) find(board, 'tablets', figureAt(board, counted).value, 'unit', counted, counted);
}

function findEffervescent(board: Board, i: number): void {
  const size = sizeNear(board, i);
  const count =
    countBefore(board, i - 1) ?? (size && size.from < i ? countBefore(board, size.from - 1) : undefined);
  find(board, 'additive', 'tablet', 'labelled', i, i);
  for (const k of [i - 1, i + 1])
    if (isCue(board, k, 'effervescent') || hasTag(board, k, 'label:so2')) claim(board, k, k);
  if (size) find(board, 'tablet_SO2_g', size.mass_g, 'unit', size.from, size.to);
  if (count === undefined) return;
  const tablets = figureAt(board, count).value;
  if (size) find(board, 'mass_g', tablets * size.mass_g, 'unit', count, count);
  else find(board, 'tablets', tablets, 'unit', count, count);
}

/** `5 g sachet`: grams of SO2 or of product? Nobody can tell. */
function findSachet(board: Board, i: number): void {
  const size = sizeNear(board, i);
  const count = countBefore(board, i - 1);
  if (size) refuse(board, 'ambiguous-number', Math.min(size.from, i), Math.max(size.to, i));
  else if (count !== undefined) refuse(board, 'ambiguous-number', count, i);
}

/** Finds tablets: plain ones of salt (Campden) and effervescent ones, whose size is grams of SO2. */
export function findTablets(board: Board): void {
  const campden = board.terms.findIndex((_, i) => board.taken[i] !== true && isCampden(board, i));
  if (campden >= 0) {
    findCampden(board, campden);
    for (let i = 0; i < board.terms.length; i++)
      if (isCue(board, i, 'tablet') || isCampden(board, i)) claim(board, i, i);
    return;
  }
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true) continue;
    if (isCue(board, i, 'sachet')) findSachet(board, i);
    else if (isCue(board, i, 'tablet')) {
      const ofSalt = [i - 1, i + 1].some(
        (k) =>
          hasTag(board, k, 'additive:potassium-metabisulfite') ||
          hasTag(board, k, 'additive:sodium-metabisulfite'),
      );
      if (ofSalt) findCampden(board, i);
      else findEffervescent(board, i);
      return;
    } else if (isCue(board, i, 'effervescent') && !board.terms.some((_, k) => isCue(board, k, 'tablet')))
      findEffervescent(board, i);
  }
}
