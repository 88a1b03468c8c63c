import { sizeOfBottles } from './size-of-bottles.ts';
import type { Board } from '../board.ts';
import { claim, hasTag, isCue, isFree, isMark, setAside, termAt, isLabelled } from '../board.ts';
import { isStranger } from '../stranger.ts';
import { VOLUME_UNITS, concentrationAt, unitAt } from '../units.ts';

const CURRENCY = new Set(['$', '€', '£', '¥', '±']);

/** `$3.60/gal`, `€18 each`, `± 0.02`: money, or the width of a figure. */
function moneyEnd(board: Board, i: number): number | undefined {
  const before = board.terms[i - 1];
  if (before?.kind !== 'mark' || !CURRENCY.has(before.text)) return undefined;
  const per = isMark(board, i + 1, '/') || isCue(board, i + 1, 'article') || isCue(board, i + 1, 'per');
  if (per && board.terms[i + 2]?.kind === 'word') return i + 2;
  return isCue(board, i + 1, 'each') ? i + 1 : i;
}

/** `1 of 3`, `555-0134`, `24-118`: a count of pages, a telephone, a number of a lot. */
function countEnd(board: Board, i: number): number | undefined {
  if (isCue(board, i + 1, 'of') && isFree(board, i + 2) && termAt(board, i + 1).text === 'of') {
    return unitAt(board, i + 3, VOLUME_UNITS) ? undefined : i + 2;
  }
  const glued = isMark(board, i + 1, '-') && !termAt(board, i + 1).gap && !termAt(board, i + 2).gap;
  const phone = glued && /^\d{3}$/.test(termAt(board, i).text) && /^\d{4}$/.test(termAt(board, i + 2).text);
  return phone ? i + 2 : undefined;
}

/** `2.8 t of fruit`, `3.2 t/ha`, `18 in thick`, `30 bottles`, `4 bags`: a crop, a length, a count. */
function countedEnd(board: Board, i: number): number | undefined {
  const next = board.terms[i + 1];
  if (next?.kind !== 'word') return undefined;
  if (next.text === 't' && isMark(board, i + 2, '/')) return i + 3;
  // `300 bottles of 750 mL` is a volume.
  if (isCue(board, i + 1, 'bottle-unit') && sizeOfBottles(board, i + 2) !== undefined) return undefined;
  if (isCue(board, i + 1, 'bottle-unit') || isCue(board, i + 1, 'bag')) return i + 1;
  return isCue(board, i + 1, 'in') && next.text === 'in' && isStranger(board, i + 2) ? i + 2 : undefined;
}

/** `DO 0.3 ppm`, `K: 1100 mg/L`: capitals that are an analysis, and words in small letters. */
function symbolStart(board: Board, i: number): number | undefined {
  const joined = isMark(board, i - 1, ':') || isMark(board, i - 1, '=') || isCue(board, i - 1, 'of');
  const at = joined ? i - 2 : i - 1;
  const symbol = board.terms[at];
  if (symbol?.kind !== 'word' || !symbol.capital) return undefined;
  // Total acidity, in French, Spanish, Italian and Portuguese cellars.
  const isAcidity = symbol.text === 'at' && board.settings.language !== 'en';
  const isOxygen = symbol.text === 'do' || isAcidity;
  const isMetal =
    /^(k|na|ca|mg|fe|cu)$/.test(symbol.text) && (at < i - 1 || concentrationAt(board, i + 1) !== undefined);
  return isOxygen || isMetal ? at : undefined;
}

/** `20 mL sample`, `750 mL bottles`, `titrated 20 mL`: what went into a glass, and no addition. */
function isOfSample(board: Board, i: number, to: number): boolean {
  return isCue(board, to + 1, 'sample-word') || isCue(board, i - 1, 'sample-word');
}

function findQuantity(board: Board, i: number): void {
  const money = moneyEnd(board, i);
  if (money !== undefined) return setAside(board, i - 1, money);
  const count = countEnd(board, i);
  if (count !== undefined) return setAside(board, i, count);
  const counted = isLabelled(board, i) ? undefined : countedEnd(board, i);
  if (counted !== undefined) return setAside(board, i, counted);
  const unitTo = concentrationAt(board, i + 1)?.to;
  const behind = unitTo === undefined ? undefined : board.terms[unitTo + 1];
  if (unitTo !== undefined && behind?.capital && behind.text === 'do') return setAside(board, i, unitTo + 1);
  const symbol = symbolStart(board, i);
  if (symbol !== undefined) return setAside(board, symbol, concentrationAt(board, i + 1)?.to ?? i);
  const small = unitAt(board, i + 1, ['mL', 'cL', 'floz']);
  if (small && isOfSample(board, i, small.to)) return setAside(board, i, small.to);
  const unit = unitAt(board, i + 1, VOLUME_UNITS);
  const water = unit && (isCue(board, unit.to + 1, 'of') ? unit.to + 2 : unit.to + 1);
  if (unit && water !== undefined && isCue(board, water, 'water') && board.marks.solutionUse === undefined)
    return setAside(board, i, water);
  // `pH 3.S`: a point and no figure after it.
  if (
    isMark(board, i + 1, '.') &&
    !termAt(board, i + 1).gap &&
    board.terms[i + 2]?.kind === 'word' &&
    !termAt(board, i + 2).gap &&
    hasTag(board, i - 1, 'label:ph')
  ) {
    board.problems.push({ code: 'ambiguous-number', about: board.message.trim().slice(0, 60) });
    claim(board, i - 1, i + 2);
  }
}

/** Sets aside money, counts, oxygen and metals, samples and water: figures that are none of the wine's SO2. */
export function findOtherQuantities(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) if (isFree(board, i)) findQuantity(board, i);
}
