import type { CellarView, Due, Write } from '../../core/cellar/cellar-store.ts';
import { dueVessels } from '../../core/cellar/due-vessels.ts';
import { dailyTurn } from '../../core/time/daily-turn.ts';
import { dayBounds } from '../../core/time/day-bounds.ts';
import { localTimeOf } from '../../core/time/local-time-of.ts';
import { namingCellar } from './cellar/naming-cellar.ts';
import { checkSettingsOf } from './check-settings-of.ts';
import { dailyDue, dailyHoursOf, type DueAbout } from './daily.ts';
import { arrive, withVessels, type Here } from './here.ts';
import { dueLines } from './intents/command/lists.ts';
import { dailyKey } from './keys.ts';
import { entryPart } from './lines/entry-part.ts';
import { line } from './lines/line.ts';
import type { CellarPlace, Handled } from './ports.ts';
import type { Settings } from './settings.ts';
import { zoneOf } from './zone.ts';

/** A due thing, with its cellar and the moment at which it is handled. */
export interface DueNow {
  readonly cellar: string;
  readonly due: Due;
  /** In milliseconds since 1970. */
  readonly at: number;
  /** The name that the chat goes by now, where it has got another. */
  readonly chat?: string;
  /** All cellars of the chat, where there are several. */
  readonly cellars?: readonly CellarPlace[];
  /** Whether the chat is in the cellar by an invitation; nothing is said where that holds no more. */
  readonly isJoined?: true;
}

/**
 * What is said when something falls due: the daily list, if anything is on it, and a reminder that somebody asked for. As
 * with a message, the writes and the replies are returned as data.
 */
export async function handleDue(
  { cellar, due, at, chat = due.chat, cellars, isJoined }: DueNow,
  view: CellarView,
  defaults: Settings,
): Promise<Handled> {
  const about = JSON.parse(due.about) as DueAbout;
  const message = {
    cellar,
    chat,
    ...(cellars && { cellars }),
    person: '',
    id: due.id,
    at,
    language: about.language,
    content: { kind: 'text', text: '' },
  } as const;
  const here = await arrive(message, view, defaults);
  const isShutOut = isJoined === true && here.roster.chats[chat] === undefined;
  if (isShutOut) return { writes: [{ kind: 'said', id: due.id }], replies: [] };
  const said =
    about.kind === 'daily' ? sayDaily(due, about, here, view) : sayReminder(due, about, here, view);
  return namingCellar(await said, message);
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
  const { at, chat } = message;
  // A chat that has got another name may have its list by that already.
  const isMoved = chat !== due.chat;
  const old: Write[] = isMoved ? [{ kind: 'drop', key: dailyKey(due.chat) }] : [];
  if (isMoved && (await view.kept(dailyKey(chat))) !== undefined)
    return { writes: [said, ...old], replies: [] };
  const turn = dailyTurn(at, { ...hours, ...(about.said_at !== undefined && { said_at: about.said_at }) });
  const next = dailyDue(
    chat,
    { at: turn.next, set_at: at },
    { ...about, ...(turn.is === 'now' && { said_at: at }) },
  );
  const writes: Write[] = [
    said,
    ...old,
    { kind: 'due', due: next },
    { kind: 'keep', key: dailyKey(chat), text: next.id },
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
