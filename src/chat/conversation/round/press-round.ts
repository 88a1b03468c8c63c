import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import { takeRoundOfFile } from '../take-round-of-file.ts';
import type { Here } from '../here.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { noteTapped, undoBarrels } from '../press/note-tapped.ts';
import { replying } from '../replying.ts';
import { keptRound } from './kept-round.ts';
import { noteRound } from './note-round.ts';
import { pickLines } from './pick-lines.ts';
import type { PressedRound } from './round-key.ts';
import { takeSheet } from './take-sheet.ts';
import { undoRound } from './undo-round.ts';

/** A button of a round: all of it, one line, the list of its lines, its sheet, or all of it taken back. */
export async function pressRound(pressed: PressedRound, here: Here, view: CellarView): Promise<Handled> {
  const { does, ref, place } = pressed;
  switch (does) {
    case 'rt':
      return noteTapped(ref, here, view);
    case 'bu':
      return undoBarrels(ref, here, view);
    case 'fd':
      return takeRoundOfFile(ref, 'dose', here, view);
    case 'fn':
      return takeRoundOfFile(ref, 'note', here, view);
    case 'ra':
    case 'rl':
    case 'rp':
    case 'rx':
    case 'ru':
      break;
  }
  const sheet = await keptRound(here, view, ref);
  if (sheet === undefined)
    return replying(here, { lines: [line('first', 'round-gone')], keepsButtons: true });
  switch (does) {
    case 'ra':
      return noteRound(sheet, here, view);
    case 'rl':
      return pickLines(sheet, place, here, view);
    case 'rp':
      return takeSheet(sheet, 'picture', here);
    case 'rx':
      return takeSheet(sheet, 'xlsx', here);
    case 'ru':
      return undoRound(sheet, here, view);
  }
}
