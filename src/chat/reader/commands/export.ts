import type { SaidDay } from '../../../core/time/said-when.ts';
import type { Command, Span } from '../command.ts';
import { dayAt } from '../moments/day-at.ts';
import type { Piece } from '../own-pieces.ts';
import { isOwn } from '../own-pieces.ts';
import type { Talk } from './talk.ts';
import { says, saysOnly } from './talk.ts';

interface Days {
  readonly days: readonly SaidDay[];
  readonly pieces: ReadonlySet<Piece>;
}

/** The days that are named, in order. */
function daysIn(said: readonly Piece[]): Days {
  const days: SaidDay[] = [];
  const pieces = new Set<Piece>();
  for (let k = 0; k < said.length; k++) {
    const found = dayAt(said, k);
    if (!found) continue;
    days.push(found.day);
    for (const piece of said.slice(k, found.to + 1)) pieces.add(piece);
    k = found.to;
  }
  return { days, pieces };
}

const yearIn = (said: readonly Piece[], used: ReadonlySet<Piece>): Piece | undefined =>
  said.find((piece) => !used.has(piece) && piece.kind === 'number' && /^20\d\d$/.test(piece.text));

function spanOf(talk: Talk, { days }: Days, year: Piece | undefined): Span | undefined {
  const [from, to = from, another] = days;
  if (from && to) {
    if (another || year || says(talk, 'month', 'year')) return undefined;
    // `since 1 Oct` ends today.
    const isOpen = days.length === 1 && says(talk, 'from');
    return { is: 'between', from, to: isOpen ? { is: 'today' } : to };
  }
  if (year) return says(talk, 'month', 'last') ? undefined : { is: 'year', year: Number(year.text) };
  if (says(talk, 'month'))
    return says(talk, 'year') ? undefined : { is: says(talk, 'last') ? 'last-month' : 'month' };
  if (says(talk, 'year')) return { is: says(talk, 'last') ? 'last-year' : 'year' };
  if (says(talk, 'last', 'this')) return undefined;
  return { is: says(talk, 'all', 'stock') || talk.isOfVessel ? 'all' : 'month' };
}

/** `november`, `nov 2026`. */
function monthOf(talk: Talk, { month }: Piece, year: Piece | undefined): Span | undefined {
  if (month === undefined || says(talk, 'month', 'year', 'last', 'from')) return undefined;
  return { is: 'named-month', month, ...(year && { year: Number(year.text) }) };
}

/** Reads `export`, `export last month as csv`, `export 1 Oct to 31 Oct`, `export T4 2026`, `export stock`. */
export function readExport(talk: Talk): Command | undefined {
  const { said, board } = talk;
  const first = said.findIndex(({ ids }) => !ids.includes('filler'));
  if (!isOwn(said, first, 'export') || (talk.isQuestion && said.length === 1)) return undefined;
  if (board.findings.length > 0 && !talk.isOfVessel) return undefined;
  const days = daysIn(said);
  const year = yearIn(said, days.pieces);
  const month = days.days.length === 0 ? said.find(({ month: named }) => named !== undefined) : undefined;
  const read = new Set([...days.pieces, ...(year ? [year] : []), ...(month ? [month] : [])]);
  const dashes = said.filter(({ kind, text }) => kind === 'mark' && text === '-');
  if (days.days.length === 2) for (const dash of dashes) read.add(dash);
  const allowed = ['export', 'this', 'last', 'month', 'year', 'all', 'csv', 'xlsx', 'stock', 'for', 'from', 'to', 'until', 'of', 'on'] as const; // prettier-ignore
  if (!saysOnly(talk, allowed, read)) return undefined;
  const span = month ? monthOf(talk, month, year) : spanOf(talk, days, year);
  const format = says(talk, 'xlsx') ? 'xlsx' : says(talk, 'csv') ? 'csv' : undefined;
  const of = says(talk, 'stock') && !talk.isOfVessel ? 'stock' : undefined;
  return span && { name: 'export', span, ...(of && { of }), ...(format && { format }) };
}
