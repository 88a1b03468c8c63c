import type { CellarView, Write } from '../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../core/cellar/entry.ts';
import type { Here } from './here.ts';
import { eventKey, notedKey } from './keys.ts';
import { BUTTONS_ms } from './plan.ts';
import type { Handled } from './ports.ts';

/**
 * The fact that the same event has noted before: it is delivered again. What a button or a correction notes has a key of
 * its own, as the same may come of many events; taken back since, it must not come anew of one that is old.
 */
export async function notedBefore(
  entries: readonly LoggedEntry[],
  { noted }: Here,
  view: CellarView,
): Promise<LoggedEntry | undefined> {
  const fact = entries.find(({ kind }) => kind !== 'reading' && kind !== 'vessel');
  if (fact) return fact;
  return noted === undefined ? undefined : view.entry(Number(noted));
}

/** The write that remembers which entry an event has noted under another key than its own. */
export function rememberingNoted({ writes, again }: Handled, { message, nextEntry }: Here): Write[] {
  const { kind } = message.content;
  if (again || (kind !== 'press' && kind !== 'text')) return [];
  const own = eventKey(message);
  if (!writes.some((write) => write.kind === 'entry' && !write.entry.key.startsWith(own))) return [];
  const until = message.at + BUTTONS_ms;
  return [{ kind: 'keep', key: notedKey(message), text: String(nextEntry), until }];
}
