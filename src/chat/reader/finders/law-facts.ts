import type { Board } from '../board.ts';
import {
  decimalAt,
  figureAt,
  find,
  hasTag,
  isCue,
  isFree,
  isFound,
  isMark,
  refuse,
  termAt,
} from '../board.ts';
import { concentrationAt, mg_L_IN } from '../units.ts';

/** The density of a wine lies between these, kg/L; what is outside is of must, or another scale (own thresholds). */
const DENSITY = { min: 0.97, max: 1.13 } as const;

/** The figure behind term `i`, past a colon, an equals sign, "is" and "of". */
function figureBehind(board: Board, i: number): number | undefined {
  let k = i + 1;
  while (isMark(board, k, ':') || isMark(board, k, '=') || isCue(board, k, 'is') || isCue(board, k, 'of'))
    k++;
  return isFree(board, k) ? k : undefined;
}

/** The term at which a concentration behind figure `at` ends, and the figure in mg/L. */
function concentrationOf(board: Board, at: number): { readonly to: number; readonly mg_L: number } {
  const unit = concentrationAt(board, at + 1);
  return { to: unit?.to ?? at, mg_L: figureAt(board, at).value * ((unit && mg_L_IN[unit.id]) ?? 1) };
}

/** `designated 300`: the step of the law that somebody says a wine of a designation has. */
function findDesignated(board: Board, i: number): void {
  const at = figureBehind(board, i);
  if (at === undefined) return;
  const { to, mg_L } = concentrationOf(board, at);
  find(board, 'designated_mg_L', mg_L, 'labelled', i, to);
}

/** Where the unit of a density ends: `kg/L`, `g/mL`, `g/cm3`. */
function densityUnitEnd(board: Board, at: number): number {
  const isMass = hasTag(board, at + 1, 'unit:kg') || hasTag(board, at + 1, 'unit:g');
  const isVolume = hasTag(board, at + 3, 'unit:L') || hasTag(board, at + 3, 'unit:mL');
  if (isMass && isMark(board, at + 2, '/') && (isVolume || termAt(board, at + 3).text === 'cm3'))
    return at + 3;
  return isCue(board, at + 1, 'density-unit') ? at + 1 : at;
}

/** `density 0.992`: of a wine, with its decimals; any other figure is none of ours. */
function findDensity(board: Board, i: number): void {
  const at = figureBehind(board, i);
  if (at === undefined) return;
  const { value } = decimalAt(board, at);
  const hasDecimals = /[.,']/.test(termAt(board, at).text);
  if (!hasDecimals || value < DENSITY.min || value > DENSITY.max) return;
  find(board, 'density_kg_L', value, 'labelled', i, densityUnitEnd(board, at));
}

/** Whether `for bottling`, `at bottling` stands behind term `i`; where it ends. */
function bottlingEnd(board: Board, i: number): number | undefined {
  const isFor =
    isCue(board, i + 1, 'into') || isCue(board, i + 1, 'in') || isCue(board, i + 1, 'clock-before');
  const at = isCue(board, i + 2, 'article') ? i + 3 : i + 2;
  return isFor && isCue(board, at, 'bottling') ? at : undefined;
}

/** `keep 30 for bottling`: room below the limit that is kept. */
function findReserve(board: Board, i: number): void {
  const at = figureBehind(board, i);
  if (at === undefined) return;
  const { to, mg_L } = concentrationOf(board, at);
  const end = isCue(board, i, 'bottling-reserve') ? to : bottlingEnd(board, to);
  if (end === undefined) return;
  if (mg_L < 0 || Number.isNaN(mg_L)) return refuse(board, 'negative-value', i, end);
  find(board, 'reserve_mg_L', mg_L, 'labelled', i, end);
}

/** `bulk red`, `T9 bulk`: one word alone is of the wine, and not of a tank or a price. */
function isOfWine(board: Board, i: number): boolean {
  const next = board.terms[i + 1];
  const isPhrase = /[ -]/.test(termAt(board, i).text);
  return isPhrase || next?.kind !== 'word' || next.tags.some((tag) => tag.startsWith('style:'));
}

/** Finds what only the law asks about a wine: a designation, a declared year, its density, what is kept for bottling. */
export function findLawFacts(board: Board): void {
  const isOfMust = ['must', 'fermenting'].some((stage) =>
    board.findings.some(({ field, value }) => field === 'stage' && value === stage),
  );
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true) continue;
    if (isCue(board, i, 'designated')) findDesignated(board, i);
    else if (isCue(board, i, 'declared-year')) find(board, 'uplift', true, 'labelled', i, i);
    else if (isCue(board, i, 'undeclared-year')) find(board, 'uplift', false, 'labelled', i, i);
    else if (isCue(board, i, 'pdo')) find(board, 'pdo', true, 'labelled', i, i);
    else if (isCue(board, i, 'bulk') && isOfWine(board, i)) find(board, 'bulk', true, 'labelled', i, i);
    else if (isCue(board, i, 'density') && !isOfMust && !isFound(board, 'density_kg_L'))
      findDensity(board, i);
    else if (isCue(board, i, 'keep') || isCue(board, i, 'bottling-reserve')) findReserve(board, i);
  }
}
