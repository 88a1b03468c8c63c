import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import { DAY_ms } from '../../../core/time/durations.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { turnedAwayKey } from '../keys.ts';
import { line } from '../lines/line.ts';
import type { Handled, IncomingMessage } from '../ports.ts';

/** Somebody who may not write here is told so once a day, and gets nothing else; what is said among others is passed over. */
export async function turnAway(
  { person, at, language, addressed }: IncomingMessage,
  key: SentenceKey,
  view: CellarView,
): Promise<Handled> {
  const told = turnedAwayKey(person);
  if (addressed === 'overheard' || (await view.kept(told)) !== undefined) return { writes: [], replies: [] };
  return {
    writes: [{ kind: 'keep', key: told, text: 'true', until: at + DAY_ms }],
    replies: [{ language, lines: [line('first', key)], buttons: [] }],
  };
}
