import { isWithinBounds } from '../../../core/bounds.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';

/** A time of the clock as it stands in the text, whether or not a clock has it, and its last piece. */
export interface ClockAt {
  readonly hour: number;
  readonly minute: number;
  readonly to: number;
  /** A colon, `am`, `pm` or `noon` says that it is a time; a point may also part a decimal. */
  readonly isFirm: boolean;
}

/** Whether the clock has such a time. */
export const isTime = ({ hour, minute }: ClockAt): boolean => hour <= 23 && minute <= 59;

const isMark = (pieces: readonly Piece[], i: number, mark: string): boolean =>
  pieces[i]?.kind === 'mark' && pieces[i].text === mark && !pieces[i].gap;

const isWhole = (pieces: readonly Piece[], i: number, digits: RegExp): boolean =>
  pieces[i]?.kind === 'number' && digits.test(pieces[i].text);

/** `5` with `pm` behind it is 17; above 12 the half of the day changes nothing. */
function withHalf(pieces: readonly Piece[], hour: number, minute: number, to: number): ClockAt | undefined {
  const [am, pm] = [isOwn(pieces, to + 1, 'am'), isOwn(pieces, to + 1, 'pm')];
  if (!am && !pm) return undefined;
  const half = hour <= 12 ? (hour % 12) + (pm ? 12 : 0) : hour;
  return { hour: half, minute, to: to + 1, isFirm: true };
}

/** `9:30`, `17h30`, with `am` or `pm` behind it. */
function divided(pieces: readonly Piece[], i: number): ClockAt | undefined {
  const byColon = isMark(pieces, i + 1, ':');
  const byHour = isOwn(pieces, i + 1, 'hour') && pieces[i + 1]?.gap === false && pieces[i + 1]?.text === 'h';
  if (!(byColon || byHour) || !isWhole(pieces, i + 2, /^\d\d$/) || pieces[i + 2]?.gap !== false)
    return undefined;
  // `17:00:30` is no time of a cellar's.
  if (isMark(pieces, i + 3, ':') && pieces[i + 4]?.kind === 'number' && !pieces[i + 4]?.gap) return undefined;
  const [hour, minute] = [Number(pieces[i]?.text), Number(pieces[i + 2]?.text)];
  const whole = withHalf(pieces, hour, minute, i + 2) ?? { hour, minute, to: i + 2, isFirm: true };
  return isOwn(pieces, whole.to + 1, 'oclock') ? { ...whole, to: whole.to + 1 } : whole;
}

/** `8.30`, which with `am` or `pm` is certain; what could be a pH is no time without them. */
function pointed(pieces: readonly Piece[], i: number): ClockAt | undefined {
  const parts = /^(\d{1,2})\.(\d\d)$/.exec(pieces[i]?.text ?? '');
  if (!parts) return undefined;
  const [hour, minute] = [Number(parts[1]), Number(parts[2])];
  const halved = withHalf(pieces, hour, minute, i);
  if (halved) return halved;
  return isWithinBounds('ph', hour + minute / 100) ? undefined : { hour, minute, to: i, isFirm: false };
}

/**
 * The time of the clock that begins at a piece: `17:00`, `5 pm`, `17h30`, `noon`, and, not certain, `8.30`.
 *
 * @returns The time, also one that no clock has (`25:00`), so that it can be named; undefined where none stands there.
 */
export function clockAt(pieces: readonly Piece[], i: number): ClockAt | undefined {
  if (isOwn(pieces, i, 'noon')) return { hour: 12, minute: 0, to: i, isFirm: true };
  if (pieces[i]?.kind !== 'number') return undefined;
  if (!isWhole(pieces, i, /^\d{1,2}$/)) return pointed(pieces, i);
  const hour = Number(pieces[i]?.text);
  const plain = isOwn(pieces, i + 1, 'oclock') ? { hour, minute: 0, to: i + 1, isFirm: true } : undefined;
  return divided(pieces, i) ?? withHalf(pieces, hour, 0, i) ?? plain;
}
