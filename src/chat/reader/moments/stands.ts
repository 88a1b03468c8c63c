import type { Board } from '../board.ts';
import { isCue, termAt } from '../board.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';
import type { Part } from './part.ts';

/** A word that has a business of its own, which the day may belong to: `racked yesterday`, `bottling monday`. */
const BUSY = /^cue:(vessel-statement|not-yet|add|make-up|buy|cleaning|need)$/;

const isStop = (piece: Piece | undefined): boolean =>
  piece === undefined || piece.kind === 'break' || /^[,.;()!]$/.test(piece.text);

const OURS: ReadonlySet<OwnWordId> = new Set(['sampled', 'who', 'at', 'on']);
/** Small words of an addition, beside which a time may stand. */
const SMALL: ReadonlySet<OwnWordId> = new Set(['to', 'of', 'with', 'lot', 'number']);

/** A word of a titration (`AO`, `0.01 N`), beside which the time is the sample's. */
const isOfLab = ({ ids }: Piece): boolean => ids.some((id) => id.startsWith('lab-'));

/** The words that make a message a titration. */
const isMethod = ({ ids }: Piece): boolean =>
  ids.some((id) => /^lab-(aeration|iodine|naoh|iodate|titration)$/.test(id));

const isOurs = ({ ids }: Piece): boolean => ids.some((id) => OURS.has(id));

const isBusy = (board: Board, piece: Piece): boolean =>
  piece.kind === 'word' &&
  !isOurs(piece) &&
  termAt(board, piece.from).tags.some((tag) => BUSY.test(tag)) &&
  !(board.pastTense && isCue(board, piece.from, 'past-if-accented'));

const isCode = ({ pieces }: Board, k: number): boolean =>
  pieces[k + 1]?.kind === 'number' && pieces[k + 1]?.gap === false;

/** A word that the reader does not know; the letters of a code (`T4`, `FV3`) are none. */
const isUnknown = (board: Board, k: number): boolean => {
  const piece = board.pieces[k];
  return (
    piece?.kind === 'word' &&
    !isOurs(piece) &&
    !isCode(board, k) &&
    piece.text.length > 1 &&
    !isOfLab(piece) &&
    termAt(board, piece.from).tags.length === 0
  );
};

const OF_AN_ADDITION = /^(unit:|additive:|vessel:|style:|category:|stage:|cue:(past-time|article|and|plus)$)/;

const isOfOther = (board: Board, k: number): boolean => {
  const piece = board.pieces[k];
  if (piece?.kind !== 'word' || isOurs(piece) || piece.ids.some((id) => SMALL.has(id))) return false;
  if (piece.text.length === 1) return false;
  return !isCode(board, k) && !termAt(board, piece.from).tags.some((tag) => OF_AN_ADDITION.test(tag));
};

/** The pieces between the stops round a part, without the part itself. */
function segmentOf({ pieces }: Board, { from, to }: Part): number[] {
  const around: number[] = [];
  for (let k = from - 1; k >= 0 && !isStop(pieces[k]); k--) around.push(k);
  for (let k = to + 1; k < pieces.length && !isStop(pieces[k]); k++) around.push(k);
  return around;
}

/** The piece before a part, past `at`, `on` and the `from` of a sample. */
function before({ pieces }: Board, { from }: Part): number {
  let k = from - 1;
  while (isOwn(pieces, k, 'at', 'on', 'from') && !isOwn(pieces, k, 'until')) k--;
  return k;
}

const isSampled = ({ pieces }: Board, k: number): boolean =>
  [k, k - 1, k - 2, k - 3].some((at) => isOwn(pieces, at, 'sampled'));

/** An addition or an event that is told: the moment is its own unless another business stands nearer. */
function standsInFact(board: Board, part: Part, around: readonly number[]): boolean {
  if (board.tells) return true;
  const isVerbs = around.some((k) =>
    termAt(board, board.pieces[k]?.from ?? -1).tags.some(
      (tag) => tag === 'cue:past' || tag === 'cue:past-if-accented' || tag === 'cue:put',
    ),
  );
  // `added 250 g T4, pump over at 17:00`: beside other words than those of the addition the time is theirs.
  if (!isVerbs && around.some((k) => isOfOther(board, k))) return false;
  const [k, next] = [before(board, part), part.to + 1];
  if ([k, next].some((at) => board.pieces[at] && isBusy(board, board.pieces[at]))) return false;
  return part.isPast || !isUnknown(board, k);
}

/** Beside readings: a day that is over, or a time that says it is the sample's. */
function standsInReading(board: Board, part: Part, around: readonly number[]): boolean {
  const { pieces } = board;
  if (around.some((k) => isBusy(board, pieces[k] as Piece))) return false;
  const k = before(board, part);
  if (isUnknown(board, part.to + 1)) return false;
  if (isSampled(board, k)) return true;
  const unknown = around.some((at) => isUnknown(board, at));
  if (part.isPast && part.hour === undefined && part.day?.is === 'today' && isOwn(pieces, part.from, 'today'))
    return false;
  if (part.isPast) return !unknown || around.some((at) => pieces[at]?.kind === 'number');
  if (unknown) return false;
  const isTitrated = part.isPointed !== true && around.some((at) => isMethod(pieces[at] as Piece));
  const isLed =
    isTitrated || (isOwn(pieces, part.from - 1, 'at') && (pieces[k] === undefined || isFigure(board, k)));
  if (part.day === undefined) return isLed;
  // The name of a day alone may head a list that is written on that day.
  return part.day.is !== 'weekday' || part.hour !== undefined || isOwn(pieces, part.from - 1, 'on');
}

const isFigure = (board: Board, k: number): boolean =>
  isStop(board.pieces[k]) ||
  board.pieces[k]?.kind === 'number' ||
  termAt(board, board.pieces[k]?.from ?? -1).tags.some((tag) => tag.startsWith('unit:'));

/**
 * Whether a day or a time in the message is when the thing itself happened, and not when something else did or will
 * be done (`bottling monday`, `by 17:00`, `since yesterday`).
 */
export function stands(board: Board, part: Part): boolean {
  const { pieces } = board;
  if (isOwn(pieces, part.from - 1, 'moment-bar') || isOwn(pieces, part.to + 1, 'moment-bar')) return false;
  // `free yesterday at 8.30` has a label whose figure that is.
  const label = termAt(board, pieces[before(board, part)]?.from ?? -1).tags;
  if (part.isPointed && label.some((tag) => tag.startsWith('label:'))) return false;
  // `sample 0.01 N`: the strength of a titrant, and no minute past midnight.
  const next = pieces[part.to + 1];
  if (part.isPointed && next !== undefined && isOfLab(next)) return false;
  const around = segmentOf(board, part);
  return board.pastTense || board.tells
    ? standsInFact(board, part, around)
    : standsInReading(board, part, around);
}
