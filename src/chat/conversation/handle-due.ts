import type { CellarView, Due, Write } from '../../core/cellar/cellar-store.ts';
import { dueVessels } from '../../core/cellar/due-vessels.ts';
import { dailyTurn } from '../../core/time/daily-turn.ts';
import { dayBounds } from '../../core/time/day-bounds.ts';
import { localTimeOf } from '../../core/time/local-time-of.ts';
import { checkSettingsOf } from './check-settings-of.ts';
import { dailyDue, dailyHoursOf, type DueAbout } from './daily.ts';
import { arrive, withVessels, type Here } from './here.ts';
import { dueLines } from './intents/command/lists.ts';
import { dailyKey } from './keys.ts';
import { entryPart } from './lines/entry-part.ts';
import { line } from './lines/line.ts';
import type { Handled } from './ports.ts';
import type { Settings } from './settings.ts';
import { zoneOf } from './zone.ts';

/** A due thing, with its cellar and the moment at which it is handled. */
export interface DueNow {
  readonly cellar: string;
  readonly due: Due;
  /** In milliseconds since 1970. */
  readonly at: number;
}

/**
 * What is said when something falls due: the daily list, if anything is on it, and a reminder that somebody asked for. As
 * with a message, the writes and the replies are returned as data.
 */
export async function handleDue(
  { cellar, due, at }: DueNow,
  view: CellarView,
  defaults: Settings,
): Promise<Handled> {
  const about = JSON.parse(due.about) as DueAbout;
  const message = {
    cellar,
    chat: due.chat,
    person: '',
    id: due.id,
    at,
    language: about.language,
    content: { kind: 'text', text: '' },
  } as const;
  const here = await arrive(message, view, defaults);
  return about.kind === 'daily' ? sayDaily(due, about, here, view) : sayReminder(due, about, here, view);
}

/** One message a day lists what is to be measured, today included; nothing is said where nothing is. */
async function sayDaily(
  due: Due,
  about: Extract<DueAbout, { kind: 'daily' }>,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const { settings, message } = here;
  const said: Write = { kind: 'said', id: due.id };
  const hours = dailyHoursOf(settings);
  if (hours === undefined) return { writes: [said, { kind: 'drop', key: dailyKey(due.chat) }], replies: [] };
  const { at } = message;
  const turn = dailyTurn(at, { ...hours, ...(about.said_at !== undefined && { said_at: about.said_at }) });
  const next = dailyDue(
    due.chat,
    { at: turn.next, set_at: at },
    { ...about, ...(turn.is === 'now' && { said_at: at }) },
  );
  const writes: Write[] = [
    said,
    { kind: 'due', due: next },
    { kind: 'keep', key: dailyKey(due.chat), text: next.id },
  ];
  if (turn.is === 'later') return { writes, replies: [] };
  const { to } = dayBounds(localTimeOf(at, zoneOf(settings)), zoneOf(settings));
  const list = dueVessels(await view.vessels(), { at, until: to, settings: checkSettingsOf(settings) });
  if (list.length === 0) return { writes, replies: [] };
  const lines = [line('first', 'daily-head'), ...dueLines(list, here)];
  return { writes, replies: [{ language: about.language, lines, buttons: [] }] };
}

/** A day after the addition; not said where it was taken back, or measured since. */
async function sayReminder(
  due: Due,
  about: Extract<DueAbout, { kind: 'remind' }>,
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const writes: Write[] = [{ kind: 'said', id: due.id }];
  const entry = await view.entry(about.entry);
  if (entry === undefined || entry.struck) return { writes, replies: [] };
  const near = await withVessels(here, view, entry.vessels);
  const isOpen = entry.vessels.some((name) => near.vessels.get(name)?.unlanded.includes(entry.entry));
  if (!isOpen) return { writes, replies: [] };
  const lines = [{ ...line('first', 'remind'), list: [entryPart(entry, near)] }];
  return { writes, replies: [{ language: about.language, lines, buttons: [] }] };
}
