import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import { readStrength } from '../../../core/additives/read-strength.ts';
import type { Board } from '../board.ts';
import {
  claim,
  figureAt,
  find,
  findingOf,
  hasTag,
  isCue,
  isFree,
  isMark,
  refuse,
  termAt,
  labelBefore,
} from '../board.ts';
import { concentrationAt, unitAt } from '../units.ts';

const KNOWN: readonly AdditiveId[] = [
  'potassium-metabisulfite',
  'sodium-metabisulfite',
  'potassium-bisulfite-solution',
  'ammonium-bisulfite-solution',
  'sulfur-dioxide-solution',
  'sulfur-dioxide-gas',
];

/** A strength beside an additive: the figure in per cent, and the terms it stands in. */
interface StrengthAt {
  readonly percent: number;
  readonly from: number;
  readonly to: number;
  readonly perLitre: boolean;
}

const isOtherLabel = (board: Board, i: number): boolean =>
  board.terms[i]?.tags.some((tag) => tag.startsWith('label:') && tag !== 'label:so2') === true;

function strengthFrom(board: Board, i: number): StrengthAt | undefined {
  if (!isFree(board, i) || isMark(board, i - 1, '+') || isOtherLabel(board, labelBefore(board, i) ?? -1))
    return undefined;
  const { value } = figureAt(board, i);
  const percent = isMark(board, i + 1, '%') || isCue(board, i + 1, 'percent');
  if (percent && !isOtherLabel(board, i + 2)) return { percent: value, from: i, to: i + 1, perLitre: false };
  const per = concentrationAt(board, i + 1);
  return per?.id === 'g/L' ? { percent: value / 10, from: i, to: per.to, perLitre: true } : undefined;
}

const JOINS = ['solution', 'powder', 'of', 'is', 'salt-word'] as const;
const joins = (board: Board, i: number): boolean =>
  JOINS.some((cue) => isCue(board, i, cue)) ||
  (isMark(board, i, '-') && !termAt(board, i).gap) ||
  isMark(board, i, '(') ||
  isMark(board, i, ':');

/** The strength before or after the name at term `i`, across "solution", "of", a bracket. */
function strengthNear(board: Board, i: number): StrengthAt | undefined {
  for (let k = i - 1; k >= i - 6 && k >= 0; k--) {
    const found = strengthFrom(board, k);
    if (found && found.to < i) return found;
    if (
      termAt(board, k).kind === 'number' ||
      !(
        joins(board, k) ||
        isMark(board, k, '%') ||
        isMark(board, k, '/') ||
        termAt(board, k).tags.some((tag) => /^unit:(g|L)$/.test(tag))
      )
    )
      break;
  }
  for (let k = i + 1; k <= i + 3; k++) {
    const found = strengthFrom(board, k);
    if (found) return found;
    if (!joins(board, k) && !isCue(board, k, 'at-strength')) break;
  }
  return undefined;
}

function cueNear(board: Board, from: number, to: number, cue: 'solution' | 'salt-word'): boolean {
  const near = (i: number): boolean =>
    isCue(board, i, cue) || (isCue(board, i, 'of') && isCue(board, i - 1, cue));
  for (let k = from; k <= to; k++) if (near(k)) return true;
  return near(from - 1) || near(to + 1) || (isMark(board, to + 1, '(') && near(to + 2));
}

/** `350 mL`: a figure before the unit, so that `ML done` is none. */
const hasMillilitres = (board: Board): boolean =>
  board.terms.some(
    (_, i) => board.terms[i]?.kind === 'number' && unitAt(board, i + 1, ['mL', 'cL', 'floz']) !== undefined,
  );

function solutionOf(id: AdditiveId): AdditiveId {
  return id === 'potassium-metabisulfite'
    ? 'potassium-metabisulfite-solution'
    : id === 'sodium-metabisulfite'
      ? 'sodium-metabisulfite-solution'
      : id;
}

const isPowder = (id: AdditiveId): boolean => solutionOf(id) !== id;

function findKnown(board: Board, i: number, named: AdditiveId): void {
  const strength = strengthNear(board, i);
  const [from, to] = [Math.min(i, strength?.from ?? i), Math.max(i, strength?.to ?? i)];
  const saysSolution = cueNear(board, from, to, 'solution');
  const saysSalt = cueNear(board, from, to, 'salt-word');
  const id =
    isPowder(named) &&
    (saysSolution || (strength !== undefined && !strength.perLitre && strength.percent <= 25))
      ? solutionOf(named)
      : named;
  if (strength === undefined) return keep(board, id, i, i);
  const { percent } = strength;
  const mayBeAlcohol =
    isPowder(named) &&
    !saysSolution &&
    !strength.perLitre &&
    percent >= 11 &&
    percent <= 16 &&
    !hasMillilitres(board);
  const unclear = mayBeAlcohol || (isPowder(named) && strength.perLitre && !saysSolution);
  if (unclear) {
    keep(board, named, i, i);
    return refuse(board, 'ambiguous-number', strength.from, strength.to);
  }
  const read = readStrength(id, percent, saysSalt, isCue(board, i, 'in-water-name'));
  if ('problem' in read) {
    const twoNames = id === 'sulfur-dioxide-solution' && read.problem === 'ambiguous-number';
    if (twoNames) claim(board, i, i);
    else keep(board, id, i, i);
    return refuse(board, read.problem, strength.from, strength.to);
  }
  if (saysSalt) board.marks.strengthAsSalt = true;
  if (id === 'potassium-bisulfite-solution' || id === 'ammonium-bisulfite-solution') {
    board.notes.push({ id: saysSalt ? 'strength-as-salt' : 'strength-as-SO2', text: `${percent}%` });
  }
  keep(board, id, i, i);
  find(board, 'strength_percent', percent, 'labelled', strength.from, strength.to);
}

function keep(board: Board, id: AdditiveId, from: number, to: number): void {
  const before = findingOf(board, 'additive');
  if (before !== undefined && isPowder(id) && before.value === solutionOf(id)) return claim(board, from, to);
  if (before !== undefined && isPowder(before.value) && id === solutionOf(before.value))
    board.findings.splice(board.findings.indexOf(before), 1);
  find(board, 'additive', id, 'labelled', from, to);
}

/** `6% so2`, `SO2 at 6%`: the bare word becomes the solution through its strength. */
function findBareSO2(board: Board, i: number): void {
  const strength = strengthNear(board, i);
  if (strength && !strength.perLitre && strength.percent <= 100 && !isMark(board, i + 1, '/'))
    findKnown(board, i, 'sulfur-dioxide-solution');
}

/** `sulfite powder`, `sulfite stock`: something with SO2 in it whose name nobody has said. */
function findUnnamed(board: Board, i: number, isSolution: boolean): void {
  const near = strengthNear(board, i);
  // `sulfites 40% meta`: the strength is of the name behind it.
  const isOfNext =
    near !== undefined && near.from > i && KNOWN.some((id) => hasTag(board, near.to + 1, `additive:${id}`));
  const strength = isOfNext ? undefined : near;
  board.marks.unnamedAdditive = true;
  if (isSolution) board.marks.unnamedSolution = true;
  claim(board, i, i);
  if (strength && strength.percent <= 25)
    find(board, 'strength_percent', strength.percent, 'labelled', strength.from, strength.to);
  else if (strength) claim(board, strength.from, strength.to);
}

/** `without kmbs`: what is said not to go in is none of the message's additive, and the usual one is no guess to make. */
const isDeclined = (board: Board, i: number): boolean =>
  (['not', 'no', 'except'] as const).some((cue) => isCue(board, i - 1, cue));

/** `10% stock`, apart from any name: the per cent is the strength of a solution, and no wine's alcohol. */
function findNamelessStock(board: Board): void {
  if (board.marks.unnamedAdditive === true || findingOf(board, 'strength_percent') !== undefined) return;
  const at = board.terms.findIndex((_, i) => {
    const isName = isCue(board, i, 'solution') && board.taken[i] !== true;
    return isName && strengthNear(board, i)?.perLitre === false;
  });
  const named = findingOf(board, 'additive')?.value;
  if (at < 0) return;
  if (named === undefined) findUnnamed(board, at, true);
  else if (isPowder(named)) findKnown(board, at, named);
}

/** Finds the additive and its strength. Powder or solution: the word, or a strength up to 25 %, tells. */
export function findAdditive(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) {
    if (board.taken[i] === true || termAt(board, i).kind !== 'word') continue;
    const id = KNOWN.find((one) => hasTag(board, i, `additive:${one}`));
    if (id && isDeclined(board, i)) {
      claim(board, i, i);
      board.marks.unnamedAdditive = true;
    } else if (id) findKnown(board, i, id);
    else if (hasTag(board, i, 'label:so2')) findBareSO2(board, i);
    else if (hasTag(board, i, 'additive:unnamed')) findUnnamed(board, i, isCue(board, i, 'solution-name'));
  }
  findNamelessStock(board);
}
