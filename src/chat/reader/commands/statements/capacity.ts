import { findingOf } from '../../board.ts';
import type { Command } from '../../command.ts';
import type { Tale } from './tale.ts';
import { findsOnly, tells, tellsOnly } from './tale.ts';

/** Reads how much a vessel holds when it is full: `T4 holds 6000 L`, `capacity of T4 is 60 hl`, `T4 is a 6000 L tank`. */
export function readCapacity(tale: Tale): Command | undefined {
  if (!findsOnly(tale, 'vessel', 'volume_L') || !findingOf(tale.board, 'volume_L')) return undefined;
  const isSaid = tells(tale, 'holds', 'capacity') || (tells(tale, 'is') && tells(tale, 'tank'));
  if (!isSaid || !tellsOnly(tale, ['holds', 'capacity', 'is', 'has', 'of', 'tank'])) return undefined;
  // `T4 holds 5200 L now` is what is in it.
  return { name: tells(tale, 'now') ? 'told' : 'capacity' };
}
