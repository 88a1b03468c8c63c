import type { Board, Figure } from '../board.ts';
import {
  figureAt,
  find,
  findingOf,
  hasTag,
  isCue,
  isFree,
  isMark,
  refuse,
  setAside,
  termAt,
  labelBefore,
} from '../board.ts';
import { litresOf, noteUnit } from './barrels.ts';
import { isOfSize, sizeOfBottles } from './size-of-bottles.ts';
import type { UnitAt } from '../units.ts';
import { VOLUME_UNITS, unitAt } from '../units.ts';

/** A volume as it stands: `2.5k L`, `12 hl`, `3 m3`. */
interface VolumeAt {
  readonly volume_L: number;
  readonly figure: Figure;
  readonly unit: UnitAt;
}

function volumeAt(board: Board, i: number): VolumeAt | undefined {
  if (!isFree(board, i)) return undefined;
  const thousand =
    isCue(board, i + 1, 'thousand') &&
    (termAt(board, i + 1).gap === false || termAt(board, i + 1).text !== 'k');
  const unit = unitAt(board, thousand ? i + 2 : i + 1, VOLUME_UNITS);
  if (!unit) return undefined;
  const figure = figureAt(board, i);
  return { volume_L: figure.value * (thousand ? 1000 : 1) * litresOf(board, unit.id), figure, unit };
}

/** `6+6+4 gal`: the terms of a sum that one unit closes. */
function sumStart(board: Board, i: number): number {
  let from = i;
  while (
    isMark(board, from - 1, '+') &&
    isFree(board, from - 2) &&
    !(termAt(board, from - 1).gap && !termAt(board, from).gap)
  )
    from -= 2;
  return from;
}

function sumOf(board: Board, from: number, to: number): number {
  let total = 0;
  for (let k = from; k <= to; k += 2) total += figureAt(board, k).value;
  return total;
}

/** `83 gal (28+15+40)`: the sum in brackets is the same volume once more. */
function bracketEnd(board: Board, i: number): number | undefined {
  if (!isMark(board, i, '(') || !isFree(board, i + 1) || !isMark(board, i + 2, '+')) return undefined;
  let k = i + 1;
  while (isFree(board, k) && isMark(board, k + 1, '+')) k += 2;
  return isFree(board, k) && isMark(board, k + 1, ')') ? k + 1 : undefined;
}

const isRange = (board: Board, i: number): boolean =>
  (isMark(board, i - 1, '-') || isCue(board, i - 1, 'to') || isCue(board, i - 1, 'joined')) &&
  isFree(board, i - 2) &&
  !(isMark(board, i - 1, '-') && termAt(board, i - 1).gap);

/** `60 hl/h` is a flow and no volume. */
const isFlow = (board: Board, i: number): boolean =>
  (isMark(board, i, '/') || isCue(board, i, 'per')) && hasTag(board, i + 1, 'unit:none-of-ours');

/** `300 bottles of 750 mL`: how many, before the size at term `i`. */
function bottlesBefore(board: Board, i: number): number | undefined {
  const at = isOfSize(board, i - 1) ? i - 3 : i - 2;
  const isCount = isCue(board, at + 1, 'bottle-unit') && isFree(board, at) && figureAt(board, at).value > 0;
  return isCount && sizeOfBottles(board, at + 2) === i ? at : undefined;
}

/** `topped barrel 7 with 2 L; 3.5, free 18`: what went in, and not what the vessel holds. */
const isToppedWith = (board: Board, i: number): boolean =>
  isCue(board, i - 1, 'with') &&
  board.tells !== true &&
  board.terms.slice(0, i).some((_, k) => isCue(board, k, 'vessel-statement')) &&
  (board.cues.has('label:ph') || board.cues.has('label:free'));

/** Reads the volume at term `i`, with the sum or the second unit that belongs to it; gives back its last term. */
function findVolumeAt(board: Board, i: number): number {
  const volume = volumeAt(board, i);
  if (!volume) return i;
  // `total 60,950 L` may be a total and a volume, with no blank after the comma.
  const isGlued = labelBefore(board, i) === i - 1 && /^\d{1,3},\d{3}$/.test(termAt(board, i).text);
  if (isGlued || volume.figure.unsure || Number.isNaN(volume.figure.value)) {
    refuse(board, 'ambiguous-number', i, volume.unit.to);
    return volume.unit.to;
  }
  if (isToppedWith(board, i)) {
    refuse(board, 'ambiguous-number', i - 1, volume.unit.to);
    return volume.unit.to;
  }
  if (isRange(board, i)) {
    refuse(board, 'ambiguous-number', i - 2, volume.unit.to);
    return volume.unit.to;
  }
  const bottles = bottlesBefore(board, i);
  const start = bottles ?? sumStart(board, i);
  const litres =
    bottles !== undefined
      ? volume.volume_L * figureAt(board, bottles).value
      : start < i
        ? sumOf(board, start, i) * litresOf(board, volume.unit.id)
        : volume.volume_L;
  const bracket = bracketEnd(board, volume.unit.to + 1);
  if (isFlow(board, volume.unit.to + 1)) {
    setAside(board, i, volume.unit.to + 2);
    return volume.unit.to + 2;
  }
  noteUnit(board, volume.unit.id);
  if (litres <= 0) {
    refuse(board, 'volume-not-positive', volume.figure.from, volume.unit.to);
    return volume.unit.to;
  }
  const to = bracket ?? volume.unit.to;
  const before = findingOf(board, 'volume_L');
  find(board, 'volume_L', litres, 'unit', start < i ? start : volume.figure.from, to);
  if (start < i && bottles === undefined)
    board.notes.push({
      id: 'volume-sum',
      text: board.message.slice(
        board.folded.at[termAt(board, start).start],
        board.folded.at[termAt(board, to).end],
      ),
    });
  if (isCue(board, to + 1, 'each')) board.marks.statedEach = true;
  if (isCue(board, to + 1, 'altogether') || (hasTag(board, to + 1, 'label:total') && !isFree(board, to + 2)))
    board.marks.statedTotal = true;
  const isSame = before !== undefined && Math.abs(before.value - litres) <= 0.01 * before.value;
  if (isSame) board.findings.splice(board.findings.length - 1, 1);
  return to;
}

/** Finds the volume of wine. The same volume in two units, within 1 %, is one: the first figure counts. */
export function findVolume(board: Board): void {
  for (let i = 0; i < board.terms.length; i++) i = findVolumeAt(board, i);
}
