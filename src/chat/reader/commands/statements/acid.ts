import type { Command } from '../../command.ts';
import { setAside } from '../../board.ts';
import { isPhLike } from '../../ph-like.ts';
import type { Item, Tale } from './tale.ts';
import { findsOnly, tells, tellsOnly } from './tale.ts';

/** Reads `acidified T4`, `added tartaric acid to T4`; with an amount it is an addition of something else. */
export function readAcid(tale: Tale): Command | undefined {
  if (!findsOnly(tale, 'vessel', 'vessels')) return undefined;
  const isSaid = tells(tale, 'acidified') || (tells(tale, 'went-in') && tells(tale, 'acid'));
  const { board, items } = tale;
  const isReached = ({ piece }: Item, k: number): boolean =>
    piece.kind === 'number' &&
    isPhLike(board, piece.from) &&
    items[k - 1]?.finding === undefined &&
    items[k - 1]?.piece.ids.includes('to') === true;
  const reached = tells(tale, 'acidified') ? items.filter(isReached) : [];
  const words = { board, items: items.filter((item) => !reached.includes(item)) };
  if (!isSaid || !tellsOnly(words, ['acidified', 'went-in', 'acid', 'to', 'in', 'some'])) return undefined;
  // `acidified T4 to 3.5`: wished or measured? The pH is asked when it is needed.
  for (const { piece } of reached) setAside(board, piece.from, piece.to);
  return { name: 'acid' };
}
