import { isWithinBounds } from '../../../core/bounds.ts';
import type { Board, Figure } from '../board.ts';
import { decimalAt, figureAt, hasTag, isCue, isFree, isMark, termAt } from '../board.ts';
import type { LabelId } from '../words/words.ts';
import { isPhValue } from '../ph-like.ts';
import { MASS_UNITS, VOLUME_UNITS, concentrationAt, unitAt } from '../units.ts';

const LABELS: readonly LabelId[] = [
  'ph',
  'free',
  'total',
  'temperature',
  'alcohol',
  'sugar',
  'aside',
  'so2',
  'volume',
];

/** The label at term `i`, when nothing has claimed it. */
export const labelAt = (board: Board, i: number): LabelId | undefined =>
  board.terms[i]?.kind === 'word' && board.taken[i] !== true
    ? LABELS.find((one) => hasTag(board, i, `label:${one}`))
    : undefined;

/** A figure beside a label, with the terms between them that only join. */
export interface Beside {
  readonly at: number;
  readonly to: number;
}

/** Marks that people put between a label and its figure. */
const GLYPHS = new Set(['~', '≈', '_', '•', '·', '|', '…', '*']);

/** `ges.`, `SO2 tot.`: a word that a point may cut short. */
const isShort = (text: string): boolean => (text.split(' ').at(-1) ?? '').length <= 4;

const isJoin = (board: Board, i: number): boolean => {
  const term = board.terms[i];
  if (term === undefined) return false;
  if (term.kind === 'mark')
    return (
      term.text === ':' ||
      term.text === '=' ||
      GLYPHS.has(term.text) ||
      (term.text === '.' && !term.gap && isShort(termAt(board, i - 1).text)) ||
      (term.text === ')' && (isMark(board, i - 2, '(') || isMark(board, i - 3, '('))) ||
      (term.text === '/' && !term.gap && !termAt(board, i + 1).gap) ||
      (term.text === '→' && hasTag(board, i - 1, 'label:ph')) ||
      (term.text === '-' && !(term.gap && board.terms[i + 1]?.gap === false))
    );
  if (isCue(board, i, 'also-at') && hasTag(board, i - 1, 'label:ph')) return true;
  return isCue(board, i, 'is') && labelAt(board, i) === undefined;
};

/** `free (ppm) 18`: the unit in brackets before the figure. */
function skipBracket(board: Board, i: number): number {
  if (!isMark(board, i, '(')) return i;
  const unit = concentrationAt(board, i + 1);
  return unit && isMark(board, unit.to + 1, ')') ? unit.to + 2 : i;
}

/** The end of the unit that belongs to the figure at `i`, as far as this label takes one. */
function unitEnd(board: Board, i: number): number {
  const conc = concentrationAt(board, i + 1);
  if (conc) return conc.to;
  let k = i + 1;
  if (isMark(board, k, '%') || isMark(board, k, '°')) k++;
  while (
    k <= i + 3 &&
    board.terms[k]?.gap !== true &&
    (hasTag(board, k, 'unit:C') || hasTag(board, k, 'unit:F') || hasTag(board, k, 'unit:degree'))
  )
    k++;
  if (
    k === i + 1 &&
    (hasTag(board, k, 'unit:C') || hasTag(board, k, 'unit:F') || hasTag(board, k, 'unit:degree'))
  )
    k++;
  if (k > i + 1 && hasTag(board, k, 'label:volume') && isMark(board, k - 1, '%')) k++;
  return k - 1;
}

/** The figure after a label, past a colon, "is", a unit in brackets. */
export function figureAfter(board: Board, i: number): Beside | undefined {
  let k = skipBracket(board, i + 1);
  for (let joins = 0; joins < 3 && isJoin(board, k); joins++) k = skipBracket(board, k + 1);
  if (isMark(board, k, '-') && isFree(board, k + 1) && !termAt(board, k + 1).gap) k++;
  return isFree(board, k) ? { at: k, to: unitEnd(board, k) } : undefined;
}

/** `TA tank 3: 6`, `température de la cuve 3 : 14`: the figure behind the vessel that was measured. */
function figurePastVessel(board: Board, i: number): Beside | undefined {
  let k = i + 1;
  while (isCue(board, k, 'of') || isCue(board, k, 'article') || isCue(board, k, 'in')) k++;
  const vessel = board.findings.find(({ field, from }) => field === 'vessel' && from === k);
  return vessel && figureAfter(board, vessel.to);
}

/** The figure before a label, past its unit and "of". */
export function figureBefore(board: Board, i: number): Beside | undefined {
  let k = i - 1;
  while (k > i - 3 && (isCue(board, k, 'of') || isCue(board, k, 'article'))) k--;
  for (let at = k; at >= k - 4 && at >= 0; at--)
    if (isFree(board, at)) return unitEnd(board, at) === k || at === k ? { at, to: k } : undefined;
  return undefined;
}

/** Whether a figure is a volume or a mass, so that no label of SO2 or pH may take it. */
export const hasForeignUnit = (board: Board, at: number): boolean =>
  (hasTag(board, at + 1, 'vessel:barrel') && board.taken[at + 1] !== true) ||
  unitAt(board, at + 1, VOLUME_UNITS) !== undefined ||
  (unitAt(board, at + 1, MASS_UNITS) !== undefined && concentrationAt(board, at + 1) === undefined);

/** Whether a figure may be what the label says, so that its neighbour's figure is not taken for it. */
function fits(label: LabelId, { value }: Figure): boolean {
  if (label === 'ph') return isWithinBounds('ph', value);
  if (label === 'alcohol') return value >= 0 && value <= 25;
  const isPhLike = isPhValue(value) && !Number.isInteger(value);
  return !isPhLike && (label !== 'free' || value < 400);
}

/** The figure that a label names, before or after it: `18 free 60 total 3.5 pH` reads backwards, `pH 3.5 free 18` forwards. */
export function figureBeside(board: Board, i: number, label: LabelId): Beside | undefined {
  const after = figureAfter(board, i);
  const behind = figureBefore(board, i);
  const before = behind && suits(board, label, behind.at) ? behind : undefined;
  if (after && before && (!suits(board, label, after.at) || isPastDash(board, i, after))) return before;
  if (!after && !before) return figurePastVessel(board, i);
  if (!after || hasForeignUnit(board, after.at)) return before ?? after;
  if (!before || hasForeignUnit(board, before.at)) return after;
  const figure = (one: Beside): Figure =>
    label === 'ph' ? decimalAt(board, one.at) : figureAt(board, one.at);
  if (fits(label, figure(after)) !== fits(label, figure(before)))
    return fits(label, figure(after)) ? after : before;
  const next = labelAt(board, after.to + 1);
  // `SO2 18 total 60`: the figure before has a label of its own.
  const isOfSO2 = label === 'total' && hasTag(board, before.at - 1, 'label:so2');
  if (next === undefined)
    return isOfSO2 || board.terms[after.to + 1]?.kind === 'number' || !board.terms[before.at]?.gap
      ? after
      : isPrefixed(board, i)
        ? after
        : before;
  return endsWithLabel(board, after.to + 1) ? before : after;
}

/** ` - ` with blanks on both sides parts fields; a figure beyond it is the label's only where none stands nearer. */
const isPastDash = (board: Board, i: number, { at }: Beside): boolean =>
  board.terms.slice(i + 1, at).some(({ kind, text, gap }) => kind === 'mark' && text === '-' && gap);

/** Whether the unit behind a figure may be this label's: degrees are of temperature, ppm of SO2, per cent of alcohol or sugar. */
function suits(board: Board, label: LabelId, at: number): boolean {
  const degrees = ['unit:C', 'unit:F', 'unit:degree'].some(
    (tag) =>
      hasTag(board, at + 1, tag as 'unit:C') ||
      (isMark(board, at + 1, '°') && hasTag(board, at + 2, tag as 'unit:C')),
  );
  if (degrees) return label === 'temperature';
  if (isMark(board, at + 1, '%')) return label === 'alcohol' || label === 'sugar' || label === 'aside';
  return concentrationAt(board, at + 1) === undefined || !['ph', 'temperature', 'alcohol'].includes(label);
}

/** Whether an earlier label of this message already stood before its figure. */
const isPrefixed = (board: Board, i: number): boolean =>
  board.findings.some(({ said, from, to }) => said === 'labelled' && to < i && labelBefore(board, from));
const labelBefore = (board: Board, from: number): boolean => board.terms[from]?.kind === 'word';

/** Follows label, figure, label, figure … and says whether a label closes it. */
function endsWithLabel(board: Board, i: number): boolean {
  for (let k = i, hops = 0; hops < 8; hops++) {
    const after = figureAfter(board, k);
    if (!after || hasForeignUnit(board, after.at)) return true;
    if (labelAt(board, after.to + 1) === undefined) return false;
    k = after.to + 1;
  }
  return false;
}
