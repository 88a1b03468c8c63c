import { clockAt, isTime } from '../../moments/clock-at.ts';
import type { Piece } from '../../own-pieces.ts';

/** A time of the day as a setting has it: its minute, absent where no clock has that time, and its last piece. */
export interface MinuteAt {
  readonly minute?: number;
  readonly to: number;
}

const MOST_HOURS = 24;

/** The time at a piece, where nothing but a time can stand: `20`, `7:30`, `6.30`, `8 pm`, `24` for midnight. */
export function minuteAt(pieces: readonly Piece[], i: number): MinuteAt | undefined {
  const clock = clockAt(pieces, i);
  if (clock) return { to: clock.to, ...(isTime(clock) && { minute: clock.hour * 60 + clock.minute }) };
  const text = pieces[i]?.kind === 'number' ? (pieces[i]?.text ?? '') : '';
  const pointed = /^(\d{1,2})[.](\d\d)$/.exec(text);
  const hour = Number(pointed?.[1] ?? (/^\d{1,3}$/.test(text) ? text : Number.NaN));
  const past = Number(pointed?.[2] ?? 0);
  if (Number.isNaN(hour)) return undefined;
  const isOnClock = hour <= MOST_HOURS && past <= 59 && !(hour === MOST_HOURS && past > 0);
  return { to: i, ...(isOnClock && { minute: (hour % MOST_HOURS) * 60 + past }) };
}

/** Every time in some pieces, in order, with the pieces it stands in. */
export function minutesIn(
  pieces: readonly Piece[],
): { readonly minute: number | undefined; readonly said: readonly Piece[] }[] {
  const found: { minute: number | undefined; said: readonly Piece[] }[] = [];
  for (let i = 0; i < pieces.length; i++) {
    const time = minuteAt(pieces, i);
    if (!time) continue;
    found.push({ minute: time.minute, said: pieces.slice(i, time.to + 1) });
    i = time.to;
  }
  return found;
}
