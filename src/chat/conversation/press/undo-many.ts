import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import type { Here } from '../here.ts';
import { UNDO_ms } from '../intents/command/undo.ts';
import { entryRange } from '../lines/entry-range.ts';
import { line } from '../lines/line.ts';
import { noting } from '../note.ts';
import type { Handled } from '../ports.ts';
import { replying } from '../replying.ts';
import { notedBy } from './noted-by.ts';

/** Takes back what buttons have noted, all at once: one's own entries of the last quarter of an hour. */
export async function undoMany(keys: readonly string[], here: Here, view: CellarView): Promise<Handled> {
  const entries: LoggedEntry[] = [];
  for (const key of keys) {
    const { standing } = await notedBy(key, view);
    if (standing && standing.by === here.me && here.message.at - standing.noted_at <= UNDO_ms)
      entries.push(standing);
  }
  if (entries.length === 0) return replying(here, { lines: [line('first', 'round-undone-none')] });
  const numbers = entries.map(({ entry }) => entry).toSorted((a, b) => a - b);
  const { writes, ...said } = replying(here, {
    lines: [line('first', 'round-undone', { entries: entryRange(numbers) })],
  });
  const notes = entries.map(({ entry, vessels }) => ({
    happening: { kind: 'correction' as const, vessels, corrects: entry, reason: 'undo' },
    at: here.message.at,
    key: `strike ${entry}`,
  }));
  return { ...said, writes: [...noting(here, notes), ...writes] };
}
