import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';
import type { LabFigure } from './figures.ts';

/** What a volume of a titration is of. */
export type LabLabel = 'sample' | 'titrant' | 'blank' | 'ascorbic';

/** The words of each label; the titrant's own name stands for it only behind its figure. */
const BEFORE: readonly (readonly [LabLabel, readonly OwnWordId[]])[] = [
  ['blank', ['lab-blank']],
  ['ascorbic', ['lab-ascorbic']],
  ['sample', ['lab-sample']],
  ['titrant', ['lab-titrant']],
];
const BEHIND: typeof BEFORE = [
  ...BEFORE,
  ['titrant', ['lab-iodine', 'lab-naoh', 'lab-iodate']],
  ['sample', ['wine']],
];

const labelAt = (pieces: readonly Piece[], k: number, among: typeof BEFORE): LabLabel | undefined =>
  among.find(([, ids]) => isOwn(pieces, k, ...ids))?.[0];

/** A small word or a mark that parts no figure from its label. */
const isLink = (piece: Piece | undefined): boolean =>
  piece !== undefined && /^(of|:|=|is|was|the|in)$/.test(piece.text);

interface Neighbour {
  readonly label: LabLabel;
  readonly piece: number; // its position
}

function behind(pieces: readonly Piece[], { to }: LabFigure): Neighbour | undefined {
  let k = to + 1;
  while (isLink(pieces[k])) k++;
  const label = labelAt(pieces, k, BEHIND);
  return label && { label, piece: k };
}

function before(pieces: readonly Piece[], { from }: LabFigure): Neighbour | undefined {
  let k = from - 1;
  while (isLink(pieces[k])) k--;
  const label = labelAt(pieces, k, BEFORE);
  return label && { label, piece: k };
}

/** Whether a message puts its labels before the figures (`sample 20, titrant 1.9`) or behind (`20 mL sample`). */
function looksBefore(pieces: readonly Piece[], figures: readonly LabFigure[]): boolean {
  const first = pieces.findIndex((_, k) => labelAt(pieces, k, BEFORE) !== undefined);
  return first >= 0 && first < (figures[0]?.from ?? 0);
}

/** What each figure is of, by the label beside it; a label goes with one figure alone. */
export function labelFigures(
  pieces: readonly Piece[],
  figures: readonly LabFigure[],
): ReadonlyMap<LabFigure, LabLabel> {
  const labels = new Map<LabFigure, LabLabel>();
  const used = new Set<number>();
  const ways = looksBefore(pieces, figures) ? [before, behind] : [behind, before];
  for (const way of ways)
    for (const figure of figures) {
      const found = labels.has(figure) ? undefined : way(pieces, figure);
      if (found === undefined || used.has(found.piece)) continue;
      labels.set(figure, found.label);
      used.add(found.piece);
    }
  return labels;
}
