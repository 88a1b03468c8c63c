import type { Board } from '../board.ts';
import { claim, decimalAt, isMark, termAt } from '../board.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import { concentrationAt, unitAt } from '../units.ts';

/** A figure of a titration: its value, the unit beside it, and the pieces that it stands in. */
export interface LabFigure {
  readonly value: number; // in `unit`
  readonly unit?: 'mL' | 'L' | 'mg' | 'mg/L' | 'N' | 'M';
  readonly from: number;
  readonly to: number;
}

const UNIT_OF = { mL: 'mL', L: 'L', mg: 'mg', ppm: 'mg/L', 'mg/L': 'mg/L' } as const;

/** The unit that begins at piece `k`, with the piece it ends at. */
function unitBehind(
  board: Board,
  k: number,
): { unit: NonNullable<LabFigure['unit']>; to: number } | undefined {
  const { pieces } = board;
  const piece = pieces[k];
  if (piece === undefined) return undefined;
  if (isOwn(pieces, k, 'lab-normal')) return { unit: 'N', to: k };
  if (isOwn(pieces, k, 'lab-molar')) return { unit: 'M', to: k };
  const found = concentrationAt(board, piece.from) ?? unitAt(board, piece.from, ['mL', 'L', 'mg']);
  const unit = found && UNIT_OF[found.id as keyof typeof UNIT_OF];
  if (found === undefined || unit === undefined) return undefined;
  const to = pieces.findLastIndex((one) => one.from <= found.to);
  return { unit, to };
}

/** `N/50`: a fiftieth of a normal solution. */
function fractionOf(board: Board, k: number): LabFigure | undefined {
  const { pieces } = board;
  const [sign, figure] = [pieces[k + 1], pieces[k + 2]];
  if (!isOwn(pieces, k, 'lab-normal', 'lab-molar') || sign === undefined || figure?.kind !== 'number')
    return undefined;
  if (!isMark(board, sign.from, '/')) return undefined;
  const { value } = decimalAt(board, figure.from);
  const unit = isOwn(pieces, k, 'lab-molar') ? 'M' : 'N';
  return value > 0 ? { value: 1 / value, unit, from: k, to: k + 2 } : undefined;
}

/** `N 0.0105`, `normality: 0.01`: the unit stands before its figure. */
function unitBefore(pieces: readonly Piece[], k: number): { unit: 'N' | 'M'; from: number } | undefined {
  let at = k - 1;
  while (pieces[at]?.kind === 'mark' && /^[:=]$/.test(pieces[at]?.text ?? '')) at--;
  if (isOwn(pieces, at, 'lab-normal')) return { unit: 'N', from: at };
  return isOwn(pieces, at, 'lab-molar') ? { unit: 'M', from: at } : undefined;
}

/** All figures of a message with the units beside them, but those that a vessel's name holds. */
export function labFigures(board: Board): readonly LabFigure[] {
  const { pieces } = board;
  const found: LabFigure[] = [];
  for (let k = 0; k < pieces.length; k++) {
    const piece = pieces[k] as Piece;
    const fraction = fractionOf(board, k);
    if (fraction) {
      found.push(fraction);
      k = fraction.to;
      continue;
    }
    if (piece.kind !== 'number' || board.taken[piece.from] === true) continue;
    const { value } = decimalAt(board, piece.from);
    const behind = unitBehind(board, k + 1);
    const before = behind === undefined && !isTakenUnit(found, k - 1) ? unitBefore(pieces, k) : undefined;
    const unit = behind?.unit ?? before?.unit;
    found.push({
      value,
      ...(unit !== undefined && { unit }),
      from: before?.from ?? k,
      to: behind?.to ?? k,
    });
    k = behind?.to ?? k;
  }
  return found;
}

/** Whether the piece before is the unit of the figure before. */
const isTakenUnit = (found: readonly LabFigure[], k: number): boolean => (found.at(-1)?.to ?? -1) >= k;

/** Marks the terms of a figure as read. */
export function claimFigure(board: Board, { from, to }: LabFigure): void {
  const [first, last] = [board.pieces[from], board.pieces[to]];
  if (first && last) claim(board, first.from, last.to);
}

/** The words of a figure, as they were written. */
export function figureWords(board: Board, { from, to }: LabFigure): string {
  const [first, last] = [board.pieces[from], board.pieces[to]];
  const [start, end] = [termAt(board, first?.from ?? 0).start, termAt(board, last?.to ?? 0).end];
  return board.message.slice(board.folded.at[start] ?? 0, (board.folded.at[end - 1] ?? 0) + 1);
}
