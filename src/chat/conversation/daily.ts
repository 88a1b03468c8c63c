import type { CellarView, Due, Write } from '../../core/cellar/cellar-store.ts';
import { nextDaily, type DailyHours } from '../../core/time/next-daily.ts';
import type { Language } from '../reader/understood.ts';
import type { Here } from './here.ts';
import { dailyKey, dueId } from './keys.ts';
import type { Settings } from './settings.ts';
import { zoneOf } from './zone.ts';

/** What a due message is about, as it is kept. */
export type DueAbout =
  | { readonly kind: 'daily'; readonly language: Language; readonly said_at?: number }
  | { readonly kind: 'remind'; readonly language: Language; readonly entry: number };

/** When the daily list of a cellar goes out; undefined where it has been turned off. */
export function dailyHoursOf(settings: Settings): DailyHours | undefined {
  const { daily_minute: at_minute, quiet } = settings;
  return at_minute === 'off' ? undefined : { at_minute, quiet, zone: zoneOf(settings) };
}

/** The daily list of a chat at its next turn, and when that was set; in milliseconds since 1970. */
export function dailyDue(
  chat: string,
  { at, set_at }: { readonly at: number; readonly set_at: number },
  about: Extract<DueAbout, { kind: 'daily' }>,
): Due {
  // With the moment it was set at: an id that was said is never taken again, and an hour may be set twice.
  return { id: dueId('daily', chat, `${at} ${set_at}`), chat, at, about: JSON.stringify(about) };
}

/** The writes that set the daily list of this chat, where it is not set yet, or when its hour has changed. */
export async function scheduleDaily(
  { message, settings, chatLanguage }: Pick<Here, 'message' | 'settings' | 'chatLanguage'>,
  view: CellarView,
  { anew = false }: { readonly anew?: boolean } = {},
): Promise<Write[]> {
  const { chat, at } = message;
  const before = await view.kept(dailyKey(chat));
  if (before !== undefined && !anew) return [];
  const old = before === undefined ? undefined : await view.due(before);
  const hours = dailyHoursOf(settings);
  const gone: Write[] = old ? [{ kind: 'said', id: old.id }] : [];
  if (hours === undefined) return [...gone, { kind: 'drop', key: dailyKey(chat) }];
  const about = old ? (JSON.parse(old.about) as Extract<DueAbout, { kind: 'daily' }>) : undefined;
  const due = dailyDue(
    chat,
    { at: nextDaily(at, hours), set_at: at },
    {
      kind: 'daily',
      language: chatLanguage,
      ...(about?.said_at !== undefined && { said_at: about.said_at }),
    },
  );
  if (old?.at === due.at) return [];
  return [...gone, { kind: 'due', due }, { kind: 'keep', key: dailyKey(chat), text: due.id }];
}
