import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../../core/cellar/entry.ts';
import { dayBounds } from '../../../../core/time/day-bounds.ts';
import { momentOf } from '../../../../core/time/moment-of.ts';
import { resolveDay } from '../../../../core/time/resolve-day.ts';
import type { SaidDay } from '../../../../core/time/said-when.ts';
import { clockText, dayText, momentText } from '../../../replies/moment-text.ts';
import type { Line } from '../../../replies/reply.ts';
import { vesselName } from '../../../replies/vessel-name.ts';
import type { Here } from '../../here.ts';
import { entryPart } from '../../lines/entry-part.ts';
import { line } from '../../lines/line.ts';
import { nameText } from '../../people.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { tellingOf } from '../../telling.ts';
import { zoneOf } from '../../zone.ts';

/** So many entries stand in one message of a sheet, and so many in all of it; the export has the rest. */
const A_MESSAGE = 20;
const A_SHEET = 60;

/** So many of a vessel's entries are shown. */
const A_HISTORY = 25;

/** The entries of a day: when, who, which vessel, what, how much, and what was taken back. */
export async function daySheet(said: SaidDay, here: Here, view: CellarView): Promise<Handled> {
  const zone = zoneOf(here.settings);
  const day = resolveDay(said, { at: here.message.at, zone });
  if (day.is === 'no-such-day') return replying(here, { lines: [line('first', 'day-none-such')] });
  const { from, to } = dayBounds(day.date, zone);
  const entries = await view.entries({ from, to, last: A_SHEET + 1 });
  const text = dayText(momentOf({ ...day.date, hour: 12, minute: 0 }, zone), tellingOf(here));
  if (entries.length === 0) return replying(here, { lines: [line('first', 'day-empty', { day: text })] });
  const shown = entries.slice(-A_SHEET);
  const near = await withPeople(here, view);
  const telling = tellingOf(here);
  const head = line('first', 'day-head', { day: text, zone });
  const rows = shown.map((entry) => sheetLine(entry, clockText(entry.at, telling), near));
  const more = entries.length > A_SHEET ? [line('first', 'day-more')] : [];
  return inMessages([head, ...rows, ...more], here);
}

/** The last entries of a vessel, the newest last. */
export async function historySheet(
  vessel: string | undefined,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const name = vessel === undefined ? 'none' : vesselName(vessel);
  const entries = vessel === undefined ? [] : await view.entries({ vessel, last: A_HISTORY + 1 });
  if (entries.length === 0)
    return replying(here, { lines: [line('first', 'history-empty', { vessel: name })] });
  const near = await withPeople(here, view);
  const telling = tellingOf(here);
  const rows = entries
    .slice(-A_HISTORY)
    .map((entry) => sheetLine(entry, momentText(entry.at, telling), near));
  const more = entries.length > A_HISTORY ? [line('first', 'history-more', { vessel: name })] : [];
  return inMessages([line('first', 'history-head', { vessel: name }), ...rows, ...more], here);
}

async function withPeople(here: Here, view: CellarView): Promise<Here> {
  return { ...here, people: new Map((await view.people()).map((person) => [person.number, person])) };
}

function sheetLine(entry: LoggedEntry, when: string, here: Here): Line {
  const struck = entry.struck;
  const values = {
    entry: String(entry.entry),
    when,
    who: nameText(entry.by, here),
    struck: struck === undefined ? 'none' : String(struck.entry),
    reason: struck?.reason ?? '',
    late: entry.noted_at - entry.at > LATE_ms ? 'late' : 'none',
    noted: dayText(entry.noted_at, tellingOf(here)),
  };
  return { ...line('first', 'sheet-entry', values), list: [entryPart(entry, here)] };
}

/** An entry that was made so long after the event is marked: the shortest of the record duties is three days. */
const LATE_ms = 3 * 86_400_000;

/** A long sheet comes in several messages. */
function inMessages(lines: readonly Line[], here: Here): Handled {
  const { writes, replies } = replying(here, { lines: [] });
  const [reply] = replies;
  const count = Math.ceil(lines.length / A_MESSAGE);
  const chunks = Array.from({ length: count }, (_, at) => lines.slice(at * A_MESSAGE, (at + 1) * A_MESSAGE));
  return { writes, replies: reply === undefined ? [] : chunks.map((chunk) => ({ ...reply, lines: chunk })) };
}
