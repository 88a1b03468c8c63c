import type { Board } from '../board.ts';
import { claim, wordsOf } from '../board.ts';
import type { SaidDay } from '../../../core/time/said-when.ts';
import type { SaidWhen } from '../command.ts';
import { agoAt } from '../moments/ago-at.ts';
import type { ClockAt } from '../moments/clock-at.ts';
import { clockAt, isTime } from '../moments/clock-at.ts';
import { dayAt } from '../moments/day-at.ts';
import type { Part } from '../moments/part.ts';
import { stands } from '../moments/stands.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import type { OwnWordId } from '../words/words.ts';

/** An hour of the clock, or one of which nobody says whether it is before or after noon. */
type Hour = Pick<ClockAt, 'to'> & Partial<ClockAt>;

/** Below it an hour alone may be one of the afternoon. */
const FIRST_CLEAR_HOUR = 7;

/** `yesterday at 9`: an hour alone, where an addition or an event is told and nothing else can be meant. */
function bareHour(board: Board, k: number): Hour | undefined {
  const { pieces } = board;
  const hour = Number(pieces[k]?.text);
  if (!(board.pastTense || board.tells) || !isOwn(pieces, k - 1, 'at')) return undefined;
  if (!/^\d{1,2}$/.test(pieces[k]?.text ?? '') || hour > 23) return undefined;
  const next = pieces[k + 1];
  const ends = next === undefined || next.kind === 'break' || /^[,.;!]$/.test(next.text);
  if (!ends) return undefined;
  return hour < FIRST_CLEAR_HOUR ? { to: k } : { hour, minute: 0, to: k };
}

/** A time beside a day: `yesterday 17:00`, `monday at 5 pm`, `yesterday, 17:00`. */
function clockBehind(board: Board, k: number): Hour | undefined {
  const { pieces } = board;
  const comma = pieces[k]?.text === ',' ? k + 1 : k;
  const at = isOwn(pieces, comma, 'at') ? comma + 1 : comma;
  const clock = clockAt(pieces, at);
  if (clock && isTime(clock) && (clock.isFirm || at > comma)) return clock;
  return bareHour(board, at);
}

/** The words that a moment can begin with. */
const MOMENTS: ReadonlySet<OwnWordId> = new Set([
  'today', 'this-morning', 'yesterday', 'last-night', 'before-yesterday', 'last', 'noon', 'count-half', 'count-1', 'count-2',
  'count-3', 'count-4', 'count-5', 'count-6', 'ago-before',
]); // prettier-ignore

/** Whether a moment could begin at a piece at all: most figures have nothing of one beside them. */
function mayOpen(pieces: readonly Piece[], k: number): boolean {
  const [piece, next] = [pieces[k], pieces[k + 1]];
  if (piece === undefined || piece.kind === 'mark' || piece.kind === 'break') return false;
  if (piece.kind === 'word')
    return (
      piece.ids.some((id) => MOMENTS.has(id)) || piece.month !== undefined || piece.weekday !== undefined
    );
  if (next === undefined || next.kind !== 'word') return piece.text.includes('.') || next?.gap === false;
  return next.ids.length > 0 || next.month !== undefined || piece.text.includes('.');
}

/** `T4 Nov 12`, `tank 4 Nov 12`: the 4 is the vessel's. */
function isOfVessel({ pieces, terms }: Board, k: number): boolean {
  const [piece, before] = [pieces[k], pieces[k - 1]];
  if (piece?.kind !== 'number' || before === undefined) return false;
  if (!piece.gap && (before.kind === 'word' || before.text === '-')) return true;
  return before.text === 't' || terms[before.to]?.tags.some((tag) => tag.startsWith('vessel:')) === true;
}

function partAt(board: Board, k: number, hasAgo: boolean): Part | undefined {
  const { pieces } = board;
  if (!mayOpen(pieces, k) || isOfVessel(board, k)) return undefined;
  const ago = hasAgo ? agoAt(pieces, k) : undefined;
  if (ago) return { ...ago, from: k, isPast: true, isClaimed: true };
  const found = dayAt(pieces, k);
  if (found) {
    const clock = clockBehind(board, found.to + 1);
    const isPast = ['yesterday', 'before-yesterday', 'today'].includes(found.day.is);
    const time = clock?.hour === undefined ? undefined : { hour: clock.hour, minute: clock.minute ?? 0 };
    const isFigured = clock !== undefined || found.day.is === 'date';
    return { day: found.day, ...time, from: k, to: clock?.to ?? found.to, isPast, isClaimed: isFigured };
  }
  const clock = clockAt(pieces, k);
  if (!clock || !isTime(clock)) return undefined;
  const { hour, minute, to } = clock;
  const isLed = isOwn(pieces, k - 1, 'at', 'sampled');
  return clock.isFirm || isLed
    ? { hour, minute, from: k, to, isPast: false, isClaimed: true, isPointed: !clock.isFirm }
    : undefined;
}

/** A message with more days and times than this tells of many things, and is read in no time; own threshold. */
const MOST_PARTS = 12;

function partsOf(board: Board): Part[] {
  const parts: Part[] = [];
  const hasAgo = board.pieces.some(({ ids }) => ids.includes('ago') || ids.includes('ago-before'));
  let seen = 0;
  for (let k = 0; k < board.pieces.length; k++) {
    const part = partAt(board, k, hasAgo);
    if (!part) continue;
    seen += 1;
    if (seen > MOST_PARTS) return [];
    if (stands(board, part)) parts.push(part);
    k = part.to;
  }
  return parts;
}

/** The parts as one moment; two days or two times are none. */
function joined(board: Board, parts: readonly Part[]): SaidWhen | undefined {
  const days: SaidDay[] = parts.flatMap(({ day }) => day ?? []);
  const clocks = parts.filter(({ hour }) => hour !== undefined);
  const agos = parts.flatMap(({ hours_ago }) => hours_ago ?? []);
  if (days.length > 1 || clocks.length > 1 || agos.length > 1) return undefined;
  if (agos.length > 0 && parts.length > 1) return undefined;
  const [day] = days;
  const [clock] = clocks;
  const text = parts.map((part) => wordsOf(board, ...termsOf(board, part))).join(' ');
  return {
    ...(day && { day }),
    ...(clock && { hour: clock.hour as number, minute: clock.minute ?? 0 }),
    ...(agos[0] !== undefined && { hours_ago: agos[0] }),
    text,
  };
}

const termsOf = (board: Board, { from, to }: Part): [number, number] => [
  board.pieces[from]?.from ?? 0,
  board.pieces[to]?.to ?? 0,
];

/** Finds when it was added, sampled or done; what the moment is on the calendar is not the reader's to say. */
export function findWhen(board: Board): void {
  // What is ordered has not happened yet.
  if (board.orders) return;
  const parts = partsOf(board);
  const when = parts.length === 0 ? undefined : joined(board, parts);
  if (!when) return;
  board.when = when;
  board.ofWhen = new Set(parts.flatMap(({ from, to }) => board.pieces.slice(from, to + 1)));
  for (const part of parts) if (part.isClaimed) claim(board, ...termsOf(board, part));
}
