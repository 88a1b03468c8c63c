import type { Target } from '../../../core/wine.ts';
import type { Board } from '../board.ts';
import {
  decimalAt,
  find,
  hasTag,
  holdsCue,
  isCue,
  isFound,
  isFree,
  isMark,
  refuse,
  termAt,
} from '../board.ts';
import { isCellarTalk } from '../refine/unlabelled.ts';
import { MASS_UNITS, VOLUME_UNITS, concentrationAt, mg_L_IN, unitAt } from '../units.ts';

/** A bare target up to this is molecular, above it free, in mg/L. */
const MOST_BARE_MOLECULAR_mg_L = 2;

/** A step of less than this between two figures may be a range, not a way from one to the other. */
const SMALLEST_CLEAR_STEP_mg_L = 5;

/** A figure with its unit of concentration and the word after it that says free or molecular. */
interface Aim {
  readonly mg_L: number;
  readonly kind?: 'free' | 'molecular' | 'total' | 'ph';
  readonly from: number;
  readonly to: number;
}

const kindAt = (board: Board, i: number): Aim['kind'] => {
  if (hasTag(board, i, 'label:free')) return 'free';
  if (isCue(board, i, 'molecular')) return 'molecular';
  if (hasTag(board, i, 'label:total')) return 'total';
  return hasTag(board, i, 'label:ph') ? 'ph' : undefined;
};

const isOther = (board: Board, i: number): boolean =>
  unitAt(board, i, VOLUME_UNITS) !== undefined ||
  (unitAt(board, i, MASS_UNITS) !== undefined && concentrationAt(board, i) === undefined) ||
  isMark(board, i, '%') ||
  isMark(board, i, '°') ||
  hasTag(board, i, 'vessel:barrel') ||
  hasTag(board, i, 'unit:none-of-ours') ||
  (isCue(board, i, 'thousand') && termAt(board, i).gap === false) ||
  isMark(board, i, '×') ||
  board.terms[i]?.text === 'x' ||
  (isMark(board, i, '/') && termAt(board, i).gap === false);

const noteUnit = (board: Board, i: number): void => {
  const unit = concentrationAt(board, i)?.id;
  if (unit === 'ppm' || unit === 'mg/L' || unit === 'g/hL') board.marks.concentrationUnit ??= unit;
};

/** The figure at term `i` as an aim, past its unit and its kind. */
function aimAt(board: Board, i: number): Aim | undefined {
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

function keepTarget(board: Board, aim: Aim, from: number, labelled?: Aim['kind']): void {
  const kind = aim.kind ?? labelled;
  if (kind === 'total' || kind === 'ph') return refuse(board, 'ambiguous-number', from, aim.to);
  if (aim.mg_L < 0) return refuse(board, 'negative-value', from, aim.to);
  find(board, 'target', targetOf(kind === undefined ? aim : { ...aim, kind }), 'labelled', from, aim.to);
}

function keepAddition(board: Board, aim: Aim, from: number): void {
  if (aim.kind === 'molecular' || aim.kind === 'total' || aim.kind === 'ph')
    return refuse(board, 'ambiguous-number', from, aim.to);
  if (aim.mg_L < 0) return refuse(board, 'negative-value', from, aim.to);
  if (board.pastTense) return find(board, 'added_mg_L', aim.mg_L, 'labelled', from, aim.to);
  find(board, 'target', { add_mg_L: aim.mg_L }, 'labelled', from, aim.to);
}

const skipJoins = (board: Board, i: number): number => {
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

const isArrow = (board: Board, i: number): boolean =>
  isMark(board, i, '->') || isMark(board, i, '=>') || isMark(board, i, '→');

/** `from 18 to 32`, `free 18 to 32`, `18 -> 32`: where it is and where it should go. */
function findWay(board: Board, i: number): boolean {
  const first = aimAt(board, i);
  if (!first || first.kind === 'molecular' || first.kind === 'ph') return false;
  const joint = first.to + 1;
  const arrow = isArrow(board, joint);
  if (!arrow && !isCue(board, joint, 'to')) return false;
  const second = aimAt(board, skipJoins(board, joint + 1));
  if (!second) return false;
  const labelAt =
    isMark(board, i - 1, ':') || isMark(board, i - 1, '=') || isCue(board, i - 1, 'is') ? i - 2 : i - 1;
  const before = kindAt(board, labelAt);
  if (before === 'ph' || before === 'molecular') {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  const said = isCue(board, i - 1, 'from') || isCue(board, labelAt - 1, 'from');
  const start = isCue(board, i - 1, 'from') ? i - 1 : before ? labelAt : i;
  if (second.kind === 'molecular') {
    find(board, 'free_mg_L', first.mg_L, 'labelled', start, first.to);
    keepTarget(board, second, joint);
    return true;
  }
  if (
    before === 'total' ||
    second.kind === 'total' ||
    (!arrow &&
      !said &&
      Math.abs(second.mg_L - first.mg_L) < SMALLEST_CLEAR_STEP_mg_L &&
      second.mg_L > MOST_BARE_MOLECULAR_mg_L)
  ) {
    refuse(board, 'ambiguous-number', i, second.to);
    return true;
  }
  find(board, 'free_mg_L', first.mg_L, 'labelled', start, first.to);
  keepTarget(board, second, joint);
  return true;
}

/** `0.8 molecular`, `mol 0.5`. A measured "molecular is 0.4 now" is no aim. */
function findMolecular(board: Board, i: number): void {
  const states = ['is', 'was', 'now', 'reads'].includes(board.terms[i + 1]?.text ?? '');
  const at = skipJoins(board, i + 1);
  const after = isFree(board, at) && !isOther(board, at + 1) ? at : undefined;
  const unit = board.terms[i - 1]?.tags.some((tag) => tag === 'unit:ppm' || tag === 'unit:mg/L')
    ? i - 2
    : i - 1;
  const before = isFree(board, unit) ? unit : undefined;
  const both = after !== undefined && before !== undefined;
  const chosen = both
    ? decimalAt(board, before).value <= MOST_BARE_MOLECULAR_mg_L
      ? before
      : after
    : (before ?? after);
  if (chosen === undefined) return;
  const aim = aimAt(board, chosen);
  if (!aim) return;
  const [from, to] = [Math.min(i, chosen), Math.max(i, chosen === after ? aim.to : i)];
  if (states) refuse(board, 'ambiguous-number', from, to);
  else keepTarget(board, { ...aim, kind: 'molecular', to }, from);
}

/** The figure that a verb at term `i` governs: `add 28 ppm`, `target free 35`. */
function governed(board: Board, i: number): { aim: Aim; label?: Aim['kind'] } | undefined {
  let k = skipJoins(board, i + 1);
  const label = kindAt(board, k) ?? (hasTag(board, k, 'label:so2') ? 'free' : undefined);
  if (label !== undefined) k = skipJoins(board, k + 1);
  const aim = aimAt(board, k);
  return aim && { aim, ...(label ? { label } : {}) };
}

function findVerb(board: Board, i: number): void {
  if (isCue(board, i, 'need') && isCue(board, i + 1, 'to')) return;
  const found = governed(board, i);
  if (!found) return;
  const { aim, label } = found;
  const isPlain = aim.kind === undefined && label === undefined;
  if (isArrow(board, i) || isCue(board, i, 'target')) return keepTarget(board, aim, i, label);
  if (isCue(board, i, 'need')) {
    const more = isCue(board, aim.to + 1, 'addition') || isCue(board, aim.to + 1, 'past');
    if (more) return keepAddition(board, { ...aim, to: aim.to + 1 }, i);
    return isPlain || (label === undefined && aim.kind === undefined)
      ? refuse(board, 'ambiguous-number', i, aim.to)
      : keepTarget(board, aim, i, label);
  }
  if (isCue(board, i, 'add') || isCue(board, i, 'raise') || isCue(board, i, 'by'))
    return keepAddition(board, aim, i);
  const isPlainTo = aim.kind === undefined && label === undefined && !concentrationAt(board, aim.from + 1);
  if (isPlainTo && !isCellarTalk(board)) return;
  if (isCue(board, i, 'to')) keepTarget(board, aim, i, label);
}

const isVerb = (board: Board, i: number): boolean =>
  isArrow(board, i) ||
  (isCue(board, i, 'by') && holdsCue(board, 'raise')) ||
  (['target', 'add', 'raise', 'need', 'to'] as const).some((cue) => isCue(board, i, cue));

/** Finds what is aimed at: a level of free or molecular SO2, or a stated addition. */
export function findTarget(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) if (isFree(board, i)) findWay(board, i);
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true) continue;
    if (
      isMark(board, i, '+') &&
      board.terms[i + 1]?.gap === false &&
      (termAt(board, i).gap || board.terms[i - 1]?.kind !== 'number')
    ) {
      const aim = aimAt(board, i + 1);
      if (aim) keepAddition(board, aim, i);
    } else if (termAt(board, i).kind !== 'number' && isVerb(board, i)) findVerb(board, i);
  }
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] !== true && isCue(board, i, 'molecular')) findMolecular(board, i);
    const aim = isFree(board, i) && concentrationAt(board, i + 1) ? aimAt(board, i) : undefined;
    if (!aim || aim.kind !== undefined || isLabelBefore(board, i)) continue;
    if (isCue(board, aim.to + 1, 'addition') && !hasTag(board, aim.to + 1, 'label:total'))
      keepAddition(board, { ...aim, to: aim.to + 1 }, i);
    else if (board.pastTense && !isFound(board, 'added_mg_L')) keepAddition(board, aim, i);
  }
}

const isLabelBefore = (board: Board, i: number): boolean => {
  const k =
    isMark(board, i - 1, ':') || isMark(board, i - 1, '=') || isCue(board, i - 1, 'is') ? i - 2 : i - 1;
  return board.terms[k]?.tags.some((tag) => tag.startsWith('label:') && tag !== 'label:so2') === true;
};
