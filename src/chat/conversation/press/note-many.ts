import type { CellarView, Write } from '../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import type { Line } from '../../replies/reply.ts';
import { drawnBy, shelvesAfter, withOnlyLot } from '../drawn.ts';
import type { Here } from '../here.ts';
import { notedAddition, type AdditionNote } from '../intents/noted-addition.ts';
import { mannerOf } from '../manner.ts';
import { emptyReading } from '../../reader/empty-reading.ts';
import { noting } from '../note.ts';
import { withShelves } from '../with-shelves.ts';
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
  const near = await withShelves(here, view);
  let { shelves } = near;
  const manner = mannerOf(emptyReading('added'), here.memory.decimalMark ?? '.', here);
  for (const { addition, key } of additions) {
    const { standing, next } = await notedBy(key, view);
    if (standing) {
      before.push(standing);
      continue;
    }
    const now = { ...near, shelves, nextEntry: here.nextEntry + notes.length };
    const told = { happening: addition, at: here.message.at, key: next };
    const note = { ...told, happening: withOnlyLot(told, now) };
    const outcome = notedAddition(note, { here: now, manner });
    // The next one finds what this one leaves.
    shelves = shelvesAfter(shelves, drawnBy(note, now));
    notes.push(note);
    keeps.push(...(outcome.keeps ?? []).filter(({ kind }) => kind === 'drop'));
    odd.push(...outcome.inRound.slice(1));
  }
  return { notes, writes: [...noting(here, notes), ...keeps], odd, before };
}
