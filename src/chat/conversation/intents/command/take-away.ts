import { addDays } from '../../../../core/time/add-days.ts';
import { dayBounds } from '../../../../core/time/day-bounds.ts';
import type { LocalDate } from '../../../../core/time/local-time.ts';
import { localTimeOf } from '../../../../core/time/local-time-of.ts';
import { monthBounds } from '../../../../core/time/month-bounds.ts';
import { resolveDay } from '../../../../core/time/resolve-day.ts';
import { yearBounds } from '../../../../core/time/year-bounds.ts';
import type { Command, Span } from '../../../reader/command.ts';
import type { Here } from '../../here.ts';
import { line } from '../../lines/line.ts';
import type { Handled, Errand } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { zoneOf } from '../../zone.ts';

/** Export, import and backup: files are made and read at the edge, after what was written is durable. */
export function takeAway(
  command: Extract<Command, { name: 'export' | 'import' | 'backup' }>,
  vessel: string | undefined,
  here: Here,
): Handled {
  const { settings, memory } = here;
  const { language } = settings;
  const run = (errand: Errand): Handled => ({ ...replying(here, { lines: [] }), replies: [], errand });
  if (command.name === 'backup') return run({ kind: 'backup', language });
  if (command.name === 'import') return run({ kind: 'import', file: command.file, language });
  const stretch = stretchOf(command.span, here);
  if (stretch === undefined) return replying(here, { lines: [line('first', 'day-none-such')] });
  return run({
    kind: 'export',
    ...stretch,
    ...(vessel !== undefined && { vessel }),
    ...(command.of && { of: command.of }),
    format: command.format ?? 'xlsx',
    zone: zoneOf(settings),
    language,
    decimalMark: memory.decimalMark ?? '.',
  });
}

/** A span as a stretch of time, and a name for the file; undefined for a day that no calendar has. */
function stretchOf(
  span: Span,
  { settings, message }: Here,
): { readonly from?: number; readonly to?: number; readonly span: string } | undefined {
  const zone = zoneOf(settings);
  const today = localTimeOf(message.at, zone);
  const two = (count: number): string => String(count).padStart(2, '0');
  const dated = ({ year, month, day }: LocalDate): string => `${year}-${two(month)}-${two(day)}`;
  switch (span.is) {
    case 'month':
      return { ...monthBounds(today, zone), span: `${today.year}-${two(today.month)}` };
    case 'last-month': {
      const before = addDays({ ...today, day: 1 }, -1);
      return { ...monthBounds(before, zone), span: `${before.year}-${two(before.month)}` };
    }
    case 'named-month': {
      const year = span.year ?? (span.month <= today.month ? today.year : today.year - 1);
      return { ...monthBounds({ year, month: span.month }, zone), span: `${year}-${two(span.month)}` };
    }
    case 'year':
      return { ...yearBounds(span.year ?? today.year, zone), span: String(span.year ?? today.year) };
    case 'last-year':
      return { ...yearBounds(today.year - 1, zone), span: String(today.year - 1) };
    case 'between': {
      const here = { at: message.at, zone };
      const [from, to] = [resolveDay(span.from, here), resolveDay(span.to, here)];
      if (from.is === 'no-such-day' || to.is === 'no-such-day') return undefined;
      const [first, last] = [dayBounds(from.date, zone).from, dayBounds(to.date, zone).to];
      if (first >= last) return undefined;
      return { from: first, to: last, span: `${dated(from.date)}-${dated(to.date)}` };
    }
    case 'all':
      return { span: 'all' };
  }
}
