import type { Board } from '../board.ts';
import { figureAt, find, findingOf, hasTag, isCue, isFree, refuse, isLabelled } from '../board.ts';
import type { UnitId } from '../words/words.ts';
import { VOLUME_UNITS, unitAt } from '../units.ts';
import { litresOf } from './barrels.ts';

const SMALL: readonly UnitId[] = ['mL', 'cL', 'floz'];

const isAdditive = (board: Board, i: number): boolean =>
  board.findings.some(
    ({ field, from, to }) => (field === 'additive' || field === 'strength_percent') && i >= from && i <= to,
  );

const volumesIn = (board: Board): number =>
  board.terms.filter((_, i) => isFree(board, i) && unitAt(board, i + 1, VOLUME_UNITS) !== undefined).length;

const isOfWater = (board: Board, i: number): boolean =>
  isCue(board, i, 'water') || (isCue(board, i, 'of') && isCue(board, i + 1, 'water'));

function isSolution(board: Board): boolean {
  const id = findingOf(board, 'additive')?.value;
  return id !== undefined && id.endsWith('-solution');
}

/** Whether a volume at `i`, whose unit ends at `to`, is of the additive and not of the wine. */
function isOfAdditive(board: Board, i: number, unit: UnitId, to: number, volumes: number): boolean {
  if (isOfWater(board, to + 1) || board.marks.solutionUse !== undefined) return false;
  const several =
    volumes > 1 || board.marks.barrelsAssumed_L !== undefined || findingOf(board, 'volume_L') !== undefined;
  const anyAdditive = findingOf(board, 'additive') !== undefined || board.marks.unnamedAdditive === true;
  const isReading = ['label:ph', 'label:free'].some((tag) => board.cues.has(tag as 'label:ph'));
  if (SMALL.includes(unit)) return anyAdditive || board.pastTense || (several && !isReading);
  if (!isSolution(board) && board.marks.unnamedAdditive !== true) return false;
  const of = isCue(board, to + 1, 'of');
  const beside =
    isAdditive(board, of ? to + 2 : to + 1) ||
    (of && hasTag(board, to + 2, 'additive:unnamed')) ||
    hasTag(board, to + 1, 'additive:unnamed');
  if (!beside) return false;
  const small = figureAt(board, i).value * litresOf(board, unit) <= 20;
  return (
    of || several || (small && !['label:ph', 'label:free'].some((tag) => board.cues.has(tag as 'label:ph')))
  );
}

/** Finds the volume of a dissolved additive: `350 mL of 10% kmbs`, `1.2 L 6% so2`. */
export function findAdditiveVolume(board: Board): void {
  const volumes = volumesIn(board);
  for (let i = 0; i < board.terms.length; i++) {
    const unit = isFree(board, i) && !isLabelled(board, i) ? unitAt(board, i + 1, VOLUME_UNITS) : undefined;
    if (!unit || !isOfAdditive(board, i, unit.id, unit.to, volumes)) continue;
    const { value, unsure, from } = figureAt(board, i);
    if (unsure) refuse(board, 'ambiguous-number', i, unit.to);
    else if (value < 0) refuse(board, 'negative-value', from, unit.to);
    else find(board, 'additive_volume_mL', value * litresOf(board, unit.id) * 1000, 'unit', from, unit.to);
  }
}
