import type { Board } from '../board.ts';
import { claim, figureAt, hasTag, isCue, isFound, isFree, isMark, refuse, termAt } from '../board.ts';
import type { UnitId } from '../words/words.ts';
import type { UnitAt } from '../units.ts';
import { VOLUME_UNITS, concentrationAt, unitAt } from '../units.ts';
import { USUAL_BARREL_L, litresOf } from './barrels.ts';
import { gramsOf } from './mass.ts';

const MASSES: readonly UnitId[] = ['g', 'kg', 'lb', 'oz', 'mg'];

const isPer = (board: Board, i: number): boolean => isMark(board, i, '/') || isCue(board, i, 'per');

/** Where "per" stands after a mass, past the additive's name (`1 g kmbs per 10 L`). */
function perAfter(board: Board, i: number): number | undefined {
  let k = i;
  while (
    k < i + 3 &&
    (isCue(board, k, 'of') ||
      hasTag(board, k, 'label:so2') ||
      board.terms[k]?.tags.some((tag) => tag.startsWith('additive')) === true)
  )
    k++;
  return isPer(board, k) ? k : undefined;
}

/** What the rate is per: litres, or fruit by weight. */
function baseAt(
  board: Board,
  i: number,
): { volume_L?: number; fruit?: true; unsure?: true; gallon?: true; to: number } | undefined {
  const figure = isFree(board, i) ? figureAt(board, i) : undefined;
  const at = figure ? i + 1 : i;
  if (hasTag(board, at, 'vessel:barrel')) return { volume_L: (figure?.value ?? 1) * USUAL_BARREL_L, to: at };
  const term = board.terms[at];
  if (figure && term?.text === 'g' && term.capital && [60, 1000].includes(figure.value))
    return { unsure: true, to: at };
  const mass = unitAt(board, at, ['kg', 'ton', 'quintal', 'lb']);
  if (mass) return { fruit: true, to: mass.to };
  const volume = unitAt(board, at, VOLUME_UNITS);
  if (!volume || (figure && (figure.unsure || !(figure.value > 0)))) return undefined;
  const volume_L = (figure?.value ?? 1) * litresOf(board, volume.id);
  return { volume_L, to: volume.to, ...(volume.id === 'gal' && { gallon: true as const }) };
}

/** `40 g per barrel`: a mass for a usual barrel; with a volume beside it, nobody knows of which barrel. */
function findPerBarrel(board: Board, i: number, unit: UnitAt): void {
  if (board.cues.has('unit:L') || board.cues.has('unit:gal'))
    return refuse(board, 'ambiguous-number', i, unit.to + 1);
  const areCounted = board.terms.some((_, k) => isFree(board, k) && hasTag(board, k + 1, 'vessel:barrel'));
  // Beside several of them it stands for all.
  if (areCounted || isFound(board, 'vessels')) return;
  board.marks.barrelsAssumed_L = USUAL_BARREL_L;
  board.marks.volumeUnit ??= 'barrel';
  claim(board, unit.to + 1, unit.to + 1);
}

function findRateAt(board: Board, i: number): void {
  const unit = unitAt(board, i + 1, MASSES);
  if (!unit || concentrationAt(board, i + 1)) return;
  if (isCue(board, unit.to + 1, 'per-barrel')) return findPerBarrel(board, i, unit);
  const per = perAfter(board, unit.to + 1);
  const base = per === undefined ? undefined : baseAt(board, per + 1);
  if (per === undefined || base === undefined) return;
  const { value, unsure } = figureAt(board, i);
  // `2 g SO2 per hl` is no mass of an additive: to add, or what is in it?
  const isOfSO2 = board.terms
    .slice(unit.to + 1, per)
    .some((_, k) => hasTag(board, unit.to + 1 + k, 'label:so2'));
  if (unsure || base.unsure || isOfSO2) return refuse(board, 'ambiguous-number', i, base.to);
  const between = (from: number, to: number): void => {
    for (let k = from; k <= to; k++)
      if (!termAt(board, k).tags.some((tag) => tag.startsWith('additive'))) claim(board, k, k);
  };
  if (base.fruit) {
    board.marks.fruitByWeight = true;
    board.marks.fruitRate = true;
    return between(i, base.to);
  }
  const rate = (value * gramsOf(unit.id) * 1000) / (base.volume_L ?? Number.NaN);
  const single = per + 1 === base.to && unit.id === 'g' && unitAt(board, per + 1, ['L', 'hL']) !== undefined;
  if (single) return refuse(board, 'ambiguous-number', i, base.to);
  between(unit.to + 1, base.to);
  board.findings.push({ field: 'rate_mg_L', value: rate, said: 'unit', from: i, to: base.to });
  claim(board, i, unit.to);
  if (base.gallon) board.marks.gallonRead = true;
}

/** Finds a rate of additive: `1 g per 10 L`, `1 lb/1000 gal`. `g/hL`, `mg/L` and `ppm` are none. */
export function findRate(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) if (isFree(board, i)) findRateAt(board, i);
}
