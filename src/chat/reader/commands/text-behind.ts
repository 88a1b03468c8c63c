import type { Board } from '../board.ts';
import type { Piece } from '../own-pieces.ts';

/** What stands behind a piece to the end of the message, as it was written, without quotes and the stop at its end. */
export function textBehind({ message, folded, terms }: Board, piece: Piece): string {
  const start = folded.at[terms[piece.to]?.end ?? 0] ?? message.length;
  return bare(message.slice(start));
}

/** What stands between two pieces, as it was written. */
export function textBetween({ message, folded, terms }: Board, from: Piece | undefined, to: Piece): string {
  const start = from === undefined ? 0 : (folded.at[terms[from.to]?.end ?? 0] ?? message.length);
  return bare(message.slice(start, folded.at[terms[to.from]?.start ?? 0] ?? message.length));
}

function bare(text: string): string {
  return text
    .trim()
    .replaceAll(/^[\s:"“„«']+|[\s"”“»'.!]+$/gu, '')
    .trim();
}
