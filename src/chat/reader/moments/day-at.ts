import type { SaidDay } from '../../../core/time/said-when.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';

/** A day as it stands in the text, and its last piece. */
export interface DayAt {
  readonly day: SaidDay;
  readonly to: number;
}

const DAYS_IN = [31, 29, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];

/** A date, where the calendar has such a day. */
function dateOf(day: number, month: number, year?: number): SaidDay | undefined {
  if (month < 1 || month > 12 || day < 1 || day > (DAYS_IN[month - 1] ?? 0)) return undefined;
  return { is: 'date', day, month, ...(year === undefined ? {} : { year }) };
}

const wholeAt = (pieces: readonly Piece[], i: number, digits: RegExp): number | undefined =>
  pieces[i]?.kind === 'number' && digits.test(pieces[i].text) ? Number(pieces[i].text) : undefined;

const isMark = (pieces: readonly Piece[], i: number, mark: string): boolean =>
  pieces[i]?.kind === 'mark' && pieces[i].text === mark;

/** `, 2026` behind a date. */
function yearAt(pieces: readonly Piece[], i: number): { year?: number; to: number } {
  const at = isMark(pieces, i, ',') ? i + 1 : i;
  const year = wholeAt(pieces, at, /^20\d\d$/);
  return year === undefined ? { to: i - 1 } : { year, to: at };
}

/** `12th`, and `12.` before the name of a month. */
const pastOrdinal = (pieces: readonly Piece[], i: number): number => {
  const isPoint = isMark(pieces, i, '.') && pieces[i + 1]?.month !== undefined;
  return (isOwn(pieces, i, 'ordinal') || isPoint) && pieces[i]?.gap === false ? i + 1 : i;
};

/** `12 Nov`, `12th of November 2026`, `Nov 12`. */
function namedDate(pieces: readonly Piece[], i: number): DayAt | undefined {
  const before = pieces[i]?.month;
  const day = wholeAt(pieces, before === undefined ? i : i + 1, /^\d{1,2}$/);
  if (day === undefined) return undefined;
  let to = pastOrdinal(pieces, before === undefined ? i + 1 : i + 2);
  let month = before;
  if (month === undefined) {
    if (isOwn(pieces, to, 'of')) to++;
    month = pieces[to]?.month;
    to++;
  }
  if (month === undefined) return undefined;
  const { year, to: last } = yearAt(pieces, to);
  const said = dateOf(day, month, year);
  return said && { day: said, to: last };
}

/** `2026-11-12`, `12.11.2026`, `25/11/2026`; with strokes only where one figure can be no month. */
function figuredDate(pieces: readonly Piece[], i: number): DayAt | undefined {
  const dotted = /^(\d{1,2})\.(\d{1,2})\.(20\d\d)$/.exec(pieces[i]?.text ?? '');
  if (dotted) {
    const said = dateOf(Number(dotted[1]), Number(dotted[2]), Number(dotted[3]));
    return said && { day: said, to: i };
  }
  const mark = pieces[i + 1]?.text;
  if (!(mark === '-' || mark === '/') || !isMark(pieces, i + 3, mark)) return undefined;
  if ([1, 2, 3, 4].some((n) => pieces[i + n]?.gap !== false)) return undefined;
  const [first, second] = [pieces[i]?.text ?? '', Number(pieces[i + 2]?.text)];
  const third = pieces[i + 4]?.text ?? '';
  let said: SaidDay | undefined;
  if (/^20\d\d$/.test(first)) said = dateOf(Number(third), second, Number(first));
  else if (/^20\d\d$/.test(third) && /^\d{1,2}$/.test(first)) {
    const one = Number(first);
    if (one > 12 || one === second) said = dateOf(one, second, Number(third));
    else if (second > 12) said = dateOf(second, one, Number(third));
  }
  return said && { day: said, to: i + 4 };
}

/**
 * The day that begins at a piece: `today`, `last night`, `monday`, `12 Nov`, `2026-11-12`.
 *
 * @param pieces The pieces of a message.
 * @returns The day as it was said, or undefined; `12/11` is none, as it could be two days or no day.
 */
export function dayAt(pieces: readonly Piece[], i: number): DayAt | undefined {
  const piece = pieces[i];
  if (piece?.kind === 'number') return figuredDate(pieces, i) ?? namedDate(pieces, i);
  if (piece?.kind !== 'word') return undefined;
  const past = (to: number): number => (isOwn(pieces, to + 1, 'part-of-day', 'last') ? to + 1 : to);
  if (isOwn(pieces, i, 'today', 'this-morning')) return { day: { is: 'today' }, to: i };
  if (isOwn(pieces, i, 'before-yesterday')) return { day: { is: 'before-yesterday' }, to: past(i) };
  if (isOwn(pieces, i, 'yesterday', 'last-night')) return { day: { is: 'yesterday' }, to: past(i) };
  const at = isOwn(pieces, i, 'last') ? i + 1 : i;
  const weekday = pieces[at]?.weekday;
  if (weekday !== undefined) return { day: { is: 'weekday', weekday }, to: past(at) };
  return namedDate(pieces, i);
}
