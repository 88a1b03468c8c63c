import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import { reminderAt } from '../../../core/cellar/reminder-at.ts';
import { momentText } from '../../replies/moment-text.ts';
import { vesselNames } from '../../replies/vessel-name.ts';
import type { DoesToEntry } from '../buttons.ts';
import { withVessels, type Here } from '../here.ts';
import { undoEntry } from '../intents/command/undo.ts';
import { dueId } from '../keys.ts';
import { line } from '../lines/line.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { tellingOf } from '../telling.ts';
import { noteOnce } from './log-buttons.ts';
import { notedBy } from './noted-by.ts';

/** A button of an entry of the log: undo it, carry out the order, be asked a day after the addition. */
export async function pressEntry(
  { does, entry: number }: { readonly does: DoesToEntry; readonly entry: number },
  here: Here,
  view: CellarView,
): Promise<Handled> {
  const entry = await view.entry(number);
  if (entry === undefined) return replying(here, { lines: [line('first', 'old-button')] });
  const near = await withVessels(here, view, entry.vessels);
  switch (does) {
    case 'u':
      return undoEntry(entry, near);
    case 'd':
      return carryOut(entry, near, view);
    case 'r':
      return remind(entry, near);
  }
}

/** What was ordered went in, as it was ordered. */
async function carryOut(entry: LoggedEntry, here: Here, view: CellarView): Promise<Handled> {
  const values = { entry: String(entry.entry) };
  if (entry.kind !== 'order' || entry.struck)
    return replying(here, { lines: [line('first', 'order-gone', values)] });
  const { kind: _kind, key: _key, entry: order, at: _at, noted_at: _noted, by: _by, ...amount } = entry;
  const happening = { ...amount, kind: 'addition', order } as const;
  const isOpen = entry.vessels.some((name) =>
    here.vessels.get(name)?.orders.some((one) => one.entry === order),
  );
  const key = `done ${order}`;
  const { standing } = await notedBy(key, view);
  if (!isOpen && standing === undefined)
    return replying(here, { lines: [line('first', 'order-gone', values)] });
  return noteOnce({ happening, at: here.message.at }, key, here, view);
}

/** A message exactly a day after the addition: somebody asked for it, so it comes at any hour. */
function remind(entry: LoggedEntry, here: Here): Handled {
  const at = reminderAt(entry.at);
  const values = { vessel: vesselNames(entry.vessels), when: momentText(at, tellingOf(here)) };
  if (entry.kind !== 'addition' || entry.struck || at <= here.message.at)
    return replying(here, { lines: [line('first', 'remind-late', values)], keepsButtons: true });
  const { chat } = here.message;
  const due = {
    id: dueId('remind', chat, String(entry.entry)),
    chat,
    at,
    about: JSON.stringify({ kind: 'remind', entry: entry.entry, language: here.settings.language }),
  };
  const { writes, ...said } = replying(here, {
    lines: [line('first', 'remind-set', values)],
    keepsButtons: true,
  });
  return { ...said, writes: [{ kind: 'due', due }, ...writes] };
}
