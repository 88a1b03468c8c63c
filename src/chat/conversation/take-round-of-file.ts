import type { CellarView } from '../../core/cellar/cellar-store.ts';
import type { Here } from './here.ts';
import { line } from './lines/line.ts';
import type { Handled } from './ports.ts';
import { replying } from './replying.ts';

/** stub */
export async function takeRoundOfFile(
  _ref: string,
  _does: 'dose' | 'note',
  here: Here,
  _view: CellarView,
): Promise<Handled> {
  return replying(here, { lines: [line('first', 'old-button')] });
}
