import type { Command } from '../../command.ts';
import type { Tale } from './tale.ts';
import { findsOnly, tells, tellsOnly } from './tale.ts';

/** Reads `T4 empty`, `emptied T4`; `empty T4` is a plan and no fact. */
export function readEmptied(tale: Tale): Command | undefined {
  if (!findsOnly(tale, 'vessel', 'vessels')) return undefined;
  if (!tells(tale, 'emptied', 'empty') || !tellsOnly(tale, ['emptied', 'empty', 'is'])) return undefined;
  const vessel = tale.items.findIndex(({ finding }) => finding !== undefined);
  const empty = tale.items.findIndex(({ piece }) => piece.ids.includes('empty'));
  return empty >= 0 && empty < vessel ? undefined : { name: 'emptied' };
}
