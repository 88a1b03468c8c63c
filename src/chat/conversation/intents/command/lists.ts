import type { CellarView } from '../../../../core/cellar/cellar-store.ts';
import { dueVessels, type DueVessel } from '../../../../core/cellar/due-vessels.ts';
import { nextCheck } from '../../../../core/cellar/next-check.ts';
import type { Vessel } from '../../../../core/cellar/vessel.ts';
import { dayBounds } from '../../../../core/time/day-bounds.ts';
import { localTimeOf } from '../../../../core/time/local-time-of.ts';
import { dayText, momentText } from '../../../replies/moment-text.ts';
import { numberText } from '../../../replies/number-text.ts';
import type { Button, Line } from '../../../replies/reply.ts';
import { vesselName } from '../../../replies/vessel-name.ts';
import { entryButtons } from '../../buttons.ts';
import { checkSettingsOf } from '../../check-settings-of.ts';
import type { Here } from '../../here.ts';
import { dueLine } from '../../lines/due.ts';
import { line, part } from '../../lines/line.ts';
import { notedAmount } from '../../lines/noted-amount.ts';
import { nameText } from '../../people.ts';
import type { Handled } from '../../ports.ts';
import { replying } from '../../replying.ts';
import { tellingOf } from '../../telling.ts';
import { zoneOf } from '../../zone.ts';

/** So many lines of a list stand in one message; the others are counted. */
const MOST_LINES = 40;

/** At most so many orders get a button of their own. */
const MOST_BUTTONS = 8;

/** All vessels, the most overdue first, then as they fall due, then those that nothing is due of. */
export async function listVessels(here: Here, view: CellarView): Promise<Handled> {
  const vessels = await view.vessels();
  if (vessels.length === 0) return replying(here, { lines: [line('first', 'vessels-none')] });
  const settings = checkSettingsOf(here.settings);
  const { at } = here.message;
  const due = dueVessels(vessels, { at, until: Infinity, settings });
  const overdue = due.filter(({ check }) => check.at <= at);
  const coming = due.filter(({ check }) => check.at > at).toSorted((a, b) => a.check.at - b.check.at);
  const watched = [...overdue, ...coming].map(({ vessel }) => vessel);
  const rest = vessels
    .filter((vessel) => !watched.includes(vessel))
    .toSorted((a, b) => a.vessel.localeCompare(b.vessel, 'en', { numeric: true }));
  const rows = [...watched, ...rest].map((vessel) => vesselLine(vessel, here));
  const head = line('first', 'vessels-head', { ...countOf(vessels.length), due: String(overdue.length) });
  return replying(here, { lines: [head, ...shortened(rows)] });
}

function vesselLine(vessel: Vessel, here: Here): Line {
  const telling = tellingOf(here);
  const check = nextCheck(vessel, checkSettingsOf(here.settings));
  const { free_mg_L } = vessel;
  const mark = here.memory.decimalMark ?? '.';
  const values = {
    vessel: vesselName(vessel.vessel),
    lot: vessel.lot?.value ?? 'none',
    free: free_mg_L === undefined ? 'none' : numberText(free_mg_L.value, 1, mark),
    day: free_mg_L === undefined ? '' : dayText(free_mg_L.at, telling),
    next:
      vessel.empty !== undefined
        ? 'empty'
        : check === undefined
          ? 'none'
          : check.at <= here.message.at
            ? 'now'
            : 'later',
    check: check === undefined ? '' : dayText(check.at, telling),
  };
  return line('first', 'vessels-line', values);
}

/** What is to be measured, the most urgent first. */
export async function listDue(here: Here, view: CellarView): Promise<Handled> {
  const { at } = here.message;
  const zone = zoneOf(here.settings);
  // Like the list in the morning: also what falls due later on the same day.
  const { to } = dayBounds(localTimeOf(at, zone), zone);
  const due = dueVessels(await view.vessels(), { at, until: to, settings: checkSettingsOf(here.settings) });
  if (due.length === 0) return replying(here, { lines: [line('first', 'due-none')] });
  return replying(here, { lines: dueLines(due, here) });
}

/** The lines of a list of vessels to be measured. */
export function dueLines(
  due: readonly DueVessel[],
  here: Pick<Here, 'settings' | 'message' | 'memory'>,
): Line[] {
  return [line('first', 'due-head', countOf(due.length)), ...shortened(due.map((one) => dueLine(one, here)))];
}

/** The orders that nobody has confirmed yet, with a button for each of the first. */
export async function listOrders(here: Here, view: CellarView): Promise<Handled> {
  const people = new Map((await view.people()).map((person) => [person.number, person]));
  const mark = here.memory.decimalMark ?? '.';
  const telling = tellingOf(here);
  const open = (await view.vessels())
    .flatMap(({ vessel, orders }) => orders.map((order) => ({ vessel, order })))
    .toSorted((a, b) => a.order.entry - b.order.entry);
  if (open.length === 0) return replying(here, { lines: [line('first', 'open-none')] });
  const rows = open.map(({ vessel, order }): Line => {
    const amount = notedAmount(order, mark);
    const values = {
      entry: String(order.entry),
      vessel: vesselName(vessel),
      who: nameText(order.by, { people }),
      when: momentText(order.at, telling),
    };
    return { ...line('first', 'open-line', values), list: amount ? [amount] : [part('amount-unknown')] };
  });
  const buttons = [...new Set(open.map(({ order }) => order.entry))]
    .slice(0, MOST_BUTTONS)
    .flatMap((entry): Button[] => entryButtons(entry, ['d']))
    .map((button, at) => ({ ...button, mark: String(at + 1) }));
  return replying(here, {
    lines: [line('first', 'open-head', countOf(open.length)), ...shortened(rows)],
    buttons,
  });
}

/** A count as text, and whether the words after it are of one or of many. */
function countOf(count: number): Record<'count' | 'number', string> {
  return { count: String(count), number: count === 1 ? 'one' : 'many' };
}

/** What has no room is counted. */
function shortened(rows: readonly Line[]): Line[] {
  if (rows.length <= MOST_LINES) return [...rows];
  return [
    ...rows.slice(0, MOST_LINES),
    line('first', 'list-more', { count: String(rows.length - MOST_LINES) }),
  ];
}
