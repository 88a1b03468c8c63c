import type { Target } from '../../../core/wine.ts';
import type { Board } from '../board.ts';
import { decimalAt, find, hasTag, isCue, isFree, isMark, refuse, termAt } from '../board.ts';
import { isStranger } from '../stranger.ts';
import { MASS_UNITS, VOLUME_UNITS, concentrationAt, mg_L_IN, unitAt } from '../units.ts';

/** A bare target up to this is molecular, above it free, in mg/L. */
export const MOST_BARE_MOLECULAR_mg_L = 2;

/** A figure with its unit of concentration and the word after it that says free or molecular. */
export interface Aim {
  readonly mg_L: number;
  readonly kind?: 'free' | 'molecular' | 'total' | 'ph';
  readonly from: number;
  readonly to: number;
}

/** What the word at term `i` says a figure is. */
export const kindAt = (board: Board, i: number): Aim['kind'] => {
  if (hasTag(board, i, 'label:free')) return 'free';
  if (isCue(board, i, 'molecular')) return 'molecular';
  if (hasTag(board, i, 'label:total')) return 'total';
  return hasTag(board, i, 'label:ph') ? 'ph' : undefined;
};

/** `55F`, `4C`, `4 °C`: a temperature. */
const isDegree = (board: Board, i: number): boolean =>
  (hasTag(board, i, 'unit:C') || hasTag(board, i, 'unit:F') || hasTag(board, i, 'unit:degree')) &&
  !isFree(board, i + 1);

/** Whether what follows a figure makes it something else than a concentration: a volume, a mass, a per cent. */
export const isOther = (board: Board, i: number): boolean =>
  unitAt(board, i, VOLUME_UNITS) !== undefined ||
  (unitAt(board, i, MASS_UNITS) !== undefined && concentrationAt(board, i) === undefined) ||
  isMark(board, i, '%') ||
  isMark(board, i, '°') ||
  hasTag(board, i, 'vessel:barrel') ||
  isDegree(board, i) ||
  hasTag(board, i, 'unit:none-of-ours') ||
  (isCue(board, i, 'thousand') && termAt(board, i).gap === false) ||
  isMark(board, i, '×') ||
  isCue(board, i, 'times') ||
  (isMark(board, i, '/') && termAt(board, i).gap === false);

const noteUnit = (board: Board, i: number): void => {
  const unit = concentrationAt(board, i)?.id;
  if (unit === 'ppm' || unit === 'mg/L' || unit === 'g/hL') board.marks.concentrationUnit ??= unit;
};

/** The figure at term `i` as an aim, past its unit and its kind. */
export function aimAt(board: Board, i: number): Aim | undefined {
  if (!isFree(board, i) || isOther(board, i + 1)) return undefined;
  const unit = concentrationAt(board, i + 1);
  noteUnit(board, i + 1);
  let to = unit?.to ?? i;
  const next = isCue(board, to + 1, 'of') ? to + 2 : to + 1;
  const joined = board.terms[next]?.kind === 'word';
  const kind = joined ? kindAt(board, next) : undefined;
  const isNextLabel =
    (kind === 'free' || kind === 'total' || kind === 'ph') &&
    isFree(board, next + 1) &&
    !isOther(board, next + 2);
  if (kind !== undefined && !isNextLabel) to = next;
  else if (hasTag(board, to + 1, 'label:so2') && !isFree(board, to + 2)) to += 1;
  if (kind === 'molecular' && hasTag(board, to + 1, 'label:so2')) to += 1;
  const { value } = decimalAt(board, i);
  return {
    mg_L: value * (unit ? (mg_L_IN[unit.id] ?? 1) : 1),
    ...(kind && !isNextLabel ? { kind } : {}),
    from: i,
    to,
  };
}

function targetOf(aim: Aim): Target {
  const molecular =
    aim.kind === 'molecular' || (aim.kind === undefined && aim.mg_L <= MOST_BARE_MOLECULAR_mg_L);
  return molecular ? { molecular_mg_L: aim.mg_L } : { free_mg_L: aim.mg_L };
}

/** Writes an aim as the target, or refuses what cannot be one (a total, a pH). */
export function keepTarget(board: Board, aim: Aim, from: number, labelled?: Aim['kind']): void {
  const kind = aim.kind ?? labelled;
  if (kind === 'total' || kind === 'ph') return refuse(board, 'ambiguous-number', from, aim.to);
  if (aim.mg_L < 0) return refuse(board, 'negative-value', from, aim.to);
  find(board, 'target', targetOf(kind === undefined ? aim : { ...aim, kind }), 'labelled', from, aim.to);
}

/** Writes an aim as an addition to make; in the past tense as one that was made. */
export function keepAddition(board: Board, aim: Aim, from: number): void {
  if (aim.kind === 'molecular' || aim.kind === 'total' || aim.kind === 'ph')
    return refuse(board, 'ambiguous-number', from, aim.to);
  if (aim.mg_L < 0) return refuse(board, 'negative-value', from, aim.to);
  const other = otherMatter(board, aim);
  if (other !== undefined) return refuse(board, 'unknown-additive', from, other);
  if (board.pastTense) return find(board, 'added_mg_L', aim.mg_L, 'labelled', from, aim.to);
  find(board, 'target', { add_mg_L: aim.mg_L }, 'labelled', from, aim.to);
}

/** `add 0.5 g/L tartaric`, `add 100 ppm DAP`: a word in the place of SO2 that is another matter. */
function otherMatter(board: Board, aim: Aim): number | undefined {
  const unit = concentrationAt(board, aim.from + 1);
  const next = isCue(board, aim.to + 1, 'of') ? aim.to + 2 : aim.to + 1;
  const named =
    hasTag(board, next, 'additive:none') || (hasTag(board, next, 'label:aside') && !isFree(board, next + 1));
  const unknown = unit !== undefined && next === aim.to + 1 && isStranger(board, next);
  const isUnusual = unit?.id === 'g/L' && !hasTag(board, aim.to, 'label:so2');
  return named || (unknown && termAt(board, next).text.length > 2) || isUnusual
    ? Math.min(next, board.terms.length - 1)
    : undefined;
}

/** The term after a colon, "is", "of", "to" or an article. */
export const skipJoins = (board: Board, i: number): number => {
  let k = i;
  while (
    k < i + 4 &&
    (isMark(board, k, ':') ||
      isMark(board, k, '=') ||
      isMark(board, k, '~') ||
      isCue(board, k, 'is') ||
      isCue(board, k, 'of') ||
      isCue(board, k, 'to') ||
      isCue(board, k, 'article'))
  )
    k++;
  return k;
};

/** An arrow points at the target. */
export const isArrow = (board: Board, i: number): boolean =>
  isMark(board, i, '->') || isMark(board, i, '=>') || isMark(board, i, '→');
