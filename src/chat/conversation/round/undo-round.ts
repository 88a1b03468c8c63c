import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { RoundSheet } from '../../attachments/round/round-sheet.ts';
import type { Here } from '../here.ts';
import type { Handled } from '../ports.ts';
import { undoMany } from '../press/undo-many.ts';
import { rowsToNote } from './remembered-rows.ts';

/** All that a round has noted, taken back. */
export async function undoRound(sheet: RoundSheet, here: Here, view: CellarView): Promise<Handled> {
  const { rows } = await rowsToNote(sheet.rows, here, view);
  return undoMany(
    rows.flatMap(({ additions }) => additions.map(({ key }) => key)),
    here,
    view,
  );
}
