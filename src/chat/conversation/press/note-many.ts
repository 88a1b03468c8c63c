import type { CellarView, Write } from '../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import type { Line } from '../../replies/reply.ts';
import type { Here } from '../here.ts';
import { notedAddition, type AdditionNote } from '../intents/noted-addition.ts';
import { mannerOf } from '../manner.ts';
import { emptyReading } from '../../reader/empty-reading.ts';
import { noting } from '../note.ts';
import type { KeyedAddition } from './dose-additions.ts';
import { notedBy } from './noted-by.ts';

/** What came of noting several additions at once. */
export interface NotedMany {
  readonly notes: readonly AdditionNote[];
  readonly writes: readonly Write[];
  /** What is odd about them, vessel by vessel. */
  readonly odd: readonly Line[];
  /** What had been noted before, and still holds. */
  readonly before: readonly LoggedEntry[];
}

/** Notes several additions that buttons stand for, each an entry of its own; what was noted before is left as it is. */
export async function noteMany(
  additions: readonly KeyedAddition[],
  here: Here,
  view: CellarView,
): Promise<NotedMany> {
  const notes: AdditionNote[] = [];
  const keeps: Write[] = [];
  const odd: Line[] = [];
  const before: LoggedEntry[] = [];
  const manner = mannerOf(emptyReading('added'), here.memory.decimalMark ?? '.', here);
  for (const { addition, key } of additions) {
    const { standing, next } = await notedBy(key, view);
    if (standing) {
      before.push(standing);
      continue;
    }
    const note = { happening: addition, at: here.message.at, key: next };
    const outcome = notedAddition(note, {
      here: { ...here, nextEntry: here.nextEntry + notes.length },
      manner,
    });
    notes.push(note);
    keeps.push(...(outcome.keeps ?? []).filter(({ kind }) => kind === 'drop'));
    odd.push(...outcome.inRound.slice(1));
  }
  return { notes, writes: [...noting(here, notes), ...keeps], odd, before };
}
