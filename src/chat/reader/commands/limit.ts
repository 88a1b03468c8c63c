import type { Board } from '../board.ts';
import { freshBoard, isFree } from '../board.ts';
import { draftOfBoard } from '../draft-of-board.ts';
import { findKind } from '../finders/kind.ts';
import { findLabelled } from '../finders/labels.ts';
import { findLawFacts } from '../finders/law-facts.ts';
import { findPercentAndDegree } from '../finders/percent-and-degree.ts';
import { findStage } from '../finders/stage.ts';
import { findVessel } from '../finders/vessel.ts';
import type { Piece } from '../own-pieces.ts';
import type { Draft } from '../understood.ts';
import type { OwnWordId } from '../words/words.ts';
import { LAW_IDS, regionsSaid } from './regions-said.ts';
import type { Talk } from './talk.ts';

const FINDERS = [findStage, findVessel, findLawFacts, findLabelled, findPercentAndDegree, findKind];

/** Words that may stand beside the wine. */
const BESIDE: readonly OwnWordId[] = ['limit', 'ask', 'show', 'is', 'of', 'for', 'to', 'in', 'on', 'with', 'and', 'wine', 'at', 'law', 'filler', 'courtesy', 'article', ...LAW_IDS]; // prettier-ignore

const isOne = ({ ids }: Piece, of: readonly OwnWordId[]): boolean => ids.some((id) => of.includes(id));

/** Whether the word for a limit comes first, after no more than a question, courtesy, or the name of a vessel. */
function opens({ pieces, findings }: Board): boolean {
  const isOfVessel = ({ from, to }: Piece): boolean =>
    findings.some((finding) => from >= finding.from && to <= finding.to);
  const [first] = pieces.filter(
    (piece) => !isOfVessel(piece) && !isOne(piece, ['ask', 'show', 'filler', 'courtesy', 'article']),
  );
  return first !== undefined && isOne(first, ['limit']);
}

/** The board without the words that are no wine's: `limit` beside a figure makes it none that was measured. */
function ofWine(board: Board): Board {
  const apart = board.pieces.filter((piece) => isOne(piece, ['limit', ...LAW_IDS]));
  const terms = board.terms.map((term, i) =>
    apart.some(({ from, to }) => i >= from && i <= to) ? { ...term, tags: ['cue:plain' as const] } : term,
  );
  return { ...freshBoard(board), terms };
}

/**
 * Reads `limit T4`, `limit red RS 3 EU`, `room in T4`: what the law allows a wine that is known, or that is told. It takes
 * every word of the message; a market alone is enough, the mere word for a limit too.
 */
export function readLimit(talk: Talk): Draft | undefined {
  if (!opens(talk.board)) return undefined;
  const board = ofWine(talk.board);
  for (const find of FINDERS) find(board);
  const { pieces } = board;
  const isWhole = pieces.every(
    (piece) =>
      piece.kind === 'break' || board.taken[piece.from] === true || isMark(piece) || isOne(piece, BESIDE),
  );
  if (!isWhole || board.terms.some((_, i) => isFree(board, i)) || board.setAside.length > 0) return undefined;
  const regions = regionsSaid(pieces.filter(({ from }) => board.taken[from] !== true));
  if (regions.length > 1) return undefined;
  const [region] = regions;
  return {
    ...draftOfBoard(board, 'command'),
    command: { name: 'limit', ...(region !== undefined && { region }) },
  };
}

const isMark = ({ kind, text }: Piece): boolean => kind === 'mark' && /^[,.;:!?/-]$/.test(text);
