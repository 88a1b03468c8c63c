import type { Command } from '../command.ts';
import { placeOf } from '../board.ts';
import { concentrationAt, MASS_UNITS, VOLUME_UNITS, unitAt } from '../units.ts';
import type { Talk } from './talk.ts';

/** More than any log has; own threshold. */
const MOST_DIGITS = 9;

/** Reads `strike 17 typo`, `strike #17: wrong tank`; the reason is in the person's own words, and may be missing. */
export function readStrike({ board, said }: Talk): Command | undefined {
  const at = said.findIndex(({ ids }) => !ids.includes('filler'));
  if (said[at]?.ids.includes('strike') !== true) return undefined;
  let k = at + 1;
  while (said[k]?.ids.some((id) => id === 'entry' || id === 'number') || said[k]?.text === '#') k++;
  const piece = said[k];
  if (piece?.kind !== 'number' || !/^\d+$/.test(piece.text) || piece.text.length > MOST_DIGITS)
    return undefined;
  const next = piece.to + 1;
  const isAmount =
    unitAt(board, next, [...MASS_UNITS, ...VOLUME_UNITS]) !== undefined ||
    concentrationAt(board, next) !== undefined ||
    board.terms[next]?.tags.includes('unit:none-of-ours') === true;
  const isSeveral = /^(,|&|\+)$/.test(said[k + 1]?.text ?? '') || said[k + 1]?.ids.includes('and') === true;
  if (isSeveral && board.terms.slice(next).some(({ kind }, n) => kind === 'number' && n < 3))
    return undefined;
  return isAmount
    ? undefined
    : { name: 'strike', entry: Number(piece.text), reason: reasonFrom({ board, said }, k) };
}

/** The words behind the number, without the mark or the "because" that leads to them. */
function reasonFrom({ board, said }: Pick<Talk, 'board' | 'said'>, k: number): string {
  const number = said[k]?.to ?? 0;
  let from = number + 1;
  const because = board.pieces.find((piece) => piece.from > number && piece.ids.includes('because'));
  while (board.terms[from]?.kind === 'mark' && !/["“„«(]/.test(board.terms[from]?.text ?? '')) from++;
  if (because?.from === from) from = because.to + 1;
  const words = from < board.terms.length ? placeOf(board, from, board.terms.length - 1).text.trim() : '';
  const bare = words.replaceAll(/^[("“„«]+|[)"”“»]+$/g, '').trim();
  return /[\p{L}\p{N}]/u.test(bare) ? bare : (board.remark ?? '');
}
