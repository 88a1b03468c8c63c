import { placeOf } from '../../board.ts';
import type { Command, Setting } from '../../command.ts';
import type { Piece } from '../../own-pieces.ts';
import type { Talk } from '../talk.ts';

/** A setting that was said. */
export const set = (setting: Setting): Command => ({ name: 'set', setting });

/** A setting whose value cannot be, with the words from one piece to another as what was written. */
export function setWrong(talk: Talk, of: Setting['of'], pieces: readonly Piece[]): Command {
  const [from, to] = [pieces[0]?.from ?? 0, pieces.at(-1)?.to ?? 0];
  return { name: 'set-wrong', of, about: placeOf(talk.board, from, to).text };
}
