import type { Board } from '../board.ts';
import {
  claim,
  decimalAt,
  figureAt,
  find,
  hasTag,
  isCue,
  isFree,
  isMark,
  refuse,
  setAside,
} from '../board.ts';
import type { Figure, Said } from '../board.ts';
import { celsiusFrom } from '../../../core/units/temperature.ts';
import type { LabelId } from '../words/words.ts';
import { MASS_UNITS, VOLUME_UNITS, concentrationAt, mg_L_IN, unitAt } from '../units.ts';

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

const labelAt = (board: Board, i: number): LabelId | undefined =>
  board.terms[i]?.kind === 'word' && board.taken[i] !== true
    ? LABELS.find((one) => hasTag(board, i, `label:${one}`))
    : undefined;

/** A figure beside a label, with the terms between them that only join. */
interface Beside {
  readonly at: number;
  readonly to: number;
}

const isJoin = (board: Board, i: number): boolean => {
  const term = board.terms[i];
  if (term === undefined) return false;
  if (term.kind === 'mark')
    return (
      term.text === ':' ||
      term.text === '=' ||
      term.text === '~' ||
      (term.text === '-' && !(term.gap && board.terms[i + 1]?.gap === false))
    );
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

function figureAfter(board: Board, i: number): Beside | undefined {
  let k = skipBracket(board, i + 1);
  for (let joins = 0; joins < 3 && isJoin(board, k); joins++) k = skipBracket(board, k + 1);
  if (isMark(board, k, '-') && isFree(board, k + 1) && !board.terms[k + 1]!.gap) k++;
  return isFree(board, k) ? { at: k, to: unitEnd(board, k) } : undefined;
}

function figureBefore(board: Board, i: number): Beside | undefined {
  let k = i - 1;
  while (k > i - 3 && (isCue(board, k, 'of') || isCue(board, k, 'article'))) k--;
  for (let at = k; at >= k - 4 && at >= 0; at--)
    if (isFree(board, at)) return unitEnd(board, at) === k || at === k ? { at, to: k } : undefined;
  return undefined;
}

const hasForeignUnit = (board: Board, at: number): boolean =>
  unitAt(board, at + 1, VOLUME_UNITS) !== undefined ||
  (unitAt(board, at + 1, MASS_UNITS) !== undefined && concentrationAt(board, at + 1) === undefined);

/** Whether a figure may be what the label says, so that its neighbour's figure is not taken for it. */
function fits(label: LabelId, { value }: Figure): boolean {
  if (label === 'ph') return value >= 2.5 && value <= 4.8;
  if (label === 'alcohol') return value >= 0 && value <= 25;
  const isPhLike = value >= 2.7 && value <= 4.5 && !Number.isInteger(value);
  return !isPhLike && (label !== 'free' || value < 400);
}

/** Figures and labels in turn, with nothing between: `18 free 60 total 3.5 pH`. */
function reads(board: Board, i: number, label: LabelId): Beside | undefined {
  const [after, before] = [figureAfter(board, i), figureBefore(board, i)];
  if (!after || hasForeignUnit(board, after.at)) return before ?? after;
  if (!before || hasForeignUnit(board, before.at)) return after;
  const figure = (one: Beside): Figure =>
    label === 'ph' ? decimalAt(board, one.at) : figureAt(board, one.at);
  if (fits(label, figure(after)) !== fits(label, figure(before)))
    return fits(label, figure(after)) ? after : before;
  const next = labelAt(board, after.to + 1);
  if (next === undefined)
    return board.terms[after.to + 1]?.kind === 'number' || !board.terms[before.at]?.gap
      ? after
      : isPrefixed(board, i)
        ? after
        : before;
  return endsWithLabel(board, after.to + 1) ? before : after;
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

function isRangeAt(board: Board, { at, to }: Beside): number | undefined {
  const joins =
    isMark(board, to + 1, '-') &&
    !(board.terms[to + 1]!.gap && board.terms[to + 2]?.gap === true) &&
    board.terms[to + 2]?.gap !== true;
  return joins && isFree(board, to + 2) && !hasForeignUnit(board, to + 2) && isMark(board, at + 1, '-')
    ? to + 2
    : undefined;
}

/** `18 no 20`: a correction inside the message. */
function correctionAt(board: Board, to: number): number | undefined {
  let k = to + 1;
  if (isMark(board, k, ',') || isMark(board, k, '.') || isMark(board, k, '-')) k++;
  if (!isCue(board, k, 'correction')) return undefined;
  while (isCue(board, k, 'correction') || isMark(board, k, ',')) k++;
  return isFree(board, k) && !hasForeignUnit(board, k) ? k : undefined;
}

function keepFigure(board: Board, label: LabelId, beside: Beside, from: number, to: number): void {
  const said: Said = 'labelled';
  const figure = label === 'ph' ? decimalAt(board, beside.at) : figureAt(board, beside.at);
  const conc = concentrationAt(board, beside.at + 1);
  if (Number.isNaN(figure.value) || figure.unsure)
    return refuse(board, 'ambiguous-number', beside.at, beside.to);
  const isSO2 = label === 'free' || label === 'total' || label === 'so2';
  if (conc && (label === 'ph' || label === 'temperature' || label === 'alcohol'))
    return refuse(board, 'unit-mismatch', from, to);
  if (isSO2 && (isMark(board, beside.at + 1, '%') || isMark(board, beside.at + 1, '°') || conc?.id === 'g/L'))
    return refuse(board, 'unit-mismatch', from, to);
  if (conc?.id === 'ppm' || conc?.id === 'mg/L' || conc?.id === 'g/hL')
    board.marks.concentrationUnit ??= conc.id;
  if (figure.value < 0 && label !== 'temperature') return refuse(board, 'negative-value', from, to);
  const value = figure.value * (isSO2 && conc ? mg_L_IN[conc.id]! : 1);
  if (label === 'ph') find(board, 'ph', value, said, from, to);
  else if (label === 'free') find(board, 'free_mg_L', value, said, from, to);
  else if (label === 'total') find(board, 'total_mg_L', value, said, from, to);
  else if (label === 'alcohol') find(board, 'alcohol_percent', value, said, from, to);
  else if (label === 'sugar')
    find(
      board,
      'sugar_g_L',
      isMark(board, beside.at + 1, '%')
        ? value * 10
        : conc && conc.id !== 'g/L'
          ? (value * mg_L_IN[conc.id]!) / 1000
          : value,
      said,
      from,
      to,
    );
  else if (label === 'temperature') {
    const unit = [beside.at + 1, beside.at + 2, beside.at + 3]
      .map((k) =>
        k > beside.to
          ? undefined
          : hasTag(board, k, 'unit:F')
            ? 'F'
            : hasTag(board, k, 'unit:C')
              ? 'C'
              : undefined,
      )
      .find(Boolean);
    find(
      board,
      'temperature_C',
      celsiusFrom(figure.value, unit ?? board.settings.temperatureUnit),
      said,
      from,
      to,
    );
  } else if (label === 'so2') keepBareSO2(board, value, from, to);
  else if (label === 'volume') refuse(board, 'ambiguous-number', from, to);
}

/** `SO2 18` is free SO2 up to 60 and said; above it may be total: ask. */
function keepBareSO2(board: Board, value: number, from: number, to: number): void {
  if (value > 60) return refuse(board, 'ambiguous-number', from, to);
  board.notes.push({
    id: 'free-unlabelled',
    text: board.message.slice(
      board.folded.at[board.terms[from]!.start],
      (board.folded.at[board.terms[to]!.end - 1] ?? 0) + 1,
    ),
  });
  find(board, 'free_mg_L', value, 'bare', from, to);
}

function asideEnd(board: Board, to: number): number {
  const conc = concentrationAt(board, to + 1);
  if (conc) return conc.to;
  return isMark(board, to + 1, '%') || hasTag(board, to + 1, 'unit:none-of-ours') ? to + 1 : to;
}

function findLabel(board: Board, i: number, label: LabelId): void {
  const after = figureAfter(board, i);
  const volumeTaken = isForeignAfter(board, i);
  const beside = reads(board, i, label);
  if (label === 'aside') {
    const own = after && !hasForeignUnit(board, after.at) ? after : beside;
    if (own) setAside(board, Math.min(i, own.at), Math.max(i, asideEnd(board, own.to)));
    return;
  }
  if (!beside) {
    if (volumeTaken !== undefined && label !== 'so2' && label !== 'volume' && label !== 'sugar')
      mismatch(board, i, volumeTaken);
    return;
  }
  const [from, to] = [Math.min(i, figureAt(board, beside.at).from), Math.max(i, beside.to)];
  if (hasForeignUnit(board, beside.at)) {
    if (label !== 'volume' && label !== 'so2') refuse(board, 'unit-mismatch', from, to + 1);
    return;
  }
  if (
    isMark(board, beside.at + 1, '/') &&
    isFree(board, beside.at + 2) &&
    (label === 'so2' || label === 'free' || label === 'total' || label === 'ph')
  )
    return claimPairLabel(board, i);
  const range = isRangeAt(board, beside);
  if (range !== undefined && label !== 'volume') return refuse(board, 'ambiguous-number', from, range);
  const corrected = correctionAt(board, beside.to);
  if (corrected !== undefined && figureAt(board, corrected).value !== figureAt(board, beside.at).value)
    return refuse(board, 'conflicting-values', from, corrected);
  keepFigure(board, label, beside, from, to);
}

/** A pair after its label (`SO2 18/60`) is read by the finder of pairs; the label only says that it is one. */
function claimPairLabel(board: Board, i: number): void {
  claim(board, i, i);
}

/** `free 20 hl`: the figure after the label was read as a volume or a mass. */
function isForeignAfter(board: Board, i: number): number | undefined {
  let k = i + 1;
  while (
    isMark(board, k, ':') ||
    isMark(board, k, '=') ||
    (isCue(board, k, 'is') && board.terms[k]?.kind === 'word')
  )
    k++;
  const index = board.findings.findIndex(
    ({ field, from }) => (field === 'volume_L' || field === 'mass_g') && from === k,
  );
  return board.terms[k]?.kind === 'number' && index >= 0 ? index : undefined;
}

function mismatch(board: Board, i: number, index: number): void {
  const finding = board.findings[index]!;
  if (figureBefore(board, i)) return;
  board.findings.splice(index, 1);
  refuse(board, 'unit-mismatch', i, finding.to);
}

/** Finds the figures that a label before or after them names. */
export function findLabelled(board: Board): void {
  for (const weak of [false, true]) {
    for (let i = 0; i < board.terms.length; i++) {
      const label = labelAt(board, i);
      if (label !== undefined && (label === 'so2' || label === 'volume') === weak) findLabel(board, i, label);
    }
  }
}
