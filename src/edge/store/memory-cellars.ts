import type { CellarStore, CellarView, TakenDue } from '../../core/cellar/cellar-store.ts';
import { createMemoryView } from './memory/memory-view.ts';
import { createMemoryLedger } from './memory/memory-ledger.ts';
import { emptyCellar, type DueKept, type MemoryCellar } from './memory/memory-cellar.ts';
import { createMemoryMailbox, emptyMail } from './memory/memory-mail.ts';
import { makeUndoable } from './memory/undoable.ts';
import { writeToMemory } from './memory/write-to-memory.ts';
import { rebuildVessels } from './projection/rebuild-vessels.ts';
import { makeTakeTurns } from './take-turns.ts';

type DueOf = readonly [cellarName: string, MemoryCellar, DueKept];

const placeOf = ([name, , { due }]: DueOf): string => JSON.stringify([name, due.id]);
const openFrom = ({ due, leased_until }: DueKept): number => Math.max(due.at, leased_until);

/**
 * Keeps cellars for as long as the process lives: for tests, and where nothing is to be kept. What was written is as
 * durable as it gets.
 *
 * @param options `now` gives milliseconds since 1970: what is kept lapses by it
 */
export function createMemoryCellars({ now }: { readonly now: () => number }): CellarStore {
  const cellars = new Map<string, MemoryCellar>();
  const mail = emptyMail();
  const inTurn = makeTakeTurns();
  /** Cellars that are being written to at this moment. */
  const writing = new Map<string, Promise<void>>();
  /** A cellar that was only looked at is not there yet. */
  const cellarOf = (name: string): MemoryCellar => cellars.get(name) ?? emptyCellar();
  const allDue = (): DueOf[] =>
    [...cellars].flatMap(([name, cellar]) =>
      [...cellar.due.values()].filter(({ said }) => !said).map((kept) => [name, cellar, kept] as const),
    );

  return {
    ...createMemoryMailbox(mail),
    turn: (name, work) =>
      inTurn(name, async () => {
        const cellar = cellarOf(name);
        const { writes, result } = await work(createMemoryView(cellar, now));
        if (writes.length === 0) return result;
        const written = writeToMemory(cellar, writes, { mail, now: now() });
        writing.set(
          name,
          written.catch(() => undefined),
        );
        try {
          await written;
        } finally {
          writing.delete(name);
        }
        cellars.set(name, cellar);
        return result;
      }),
    look: (name, work) =>
      work(
        whenWritten(createMemoryView(cellarOf(name), now), async () => {
          while (writing.has(name)) await writing.get(name);
        }),
      ),
    cellars: async () => [...cellars.keys()].toSorted(),
    nextDue: async () => {
      const opening = allDue().map(([, , kept]) => openFrom(kept));
      return opening.length === 0 ? undefined : Math.min(...opening);
    },
    takeDue: async (moment, { lease_ms, most }) => {
      const open = allDue().filter(([, , kept]) => openFrom(kept) <= moment);
      // Sorting keeps the order of what opens at one moment.
      const byName = open.toSorted((one, other) => (placeOf(one) < placeOf(other) ? -1 : 1));
      const taken = byName.sort(([, , one], [, , other]) => openFrom(one) - openFrom(other)).slice(0, most);
      return taken.map(([name, cellar, kept]): TakenDue => {
        cellar.due.set(kept.due.id, { ...kept, leased_until: moment + lease_ms });
        return { ...kept.due, cellar: name };
      });
    },
    rebuild: (name) =>
      inTurn(name, () =>
        rebuildVessels(createMemoryLedger(cellarOf(name), makeUndoable()), async (work) => work()),
      ),
    backup: async () => {
      throw new Error('what is kept in memory has no copy');
    },
    close: async () => undefined,
  };
}

/** A view whose readings wait until no half of a write set can be seen. */
function whenWritten(view: CellarView, ready: () => Promise<void>): CellarView {
  const patient = Object.entries(view).map(([name, read]: [string, (asked: unknown) => unknown]) => [
    name,
    async (asked: unknown) => {
      await ready();
      return read(asked);
    },
  ]);
  return Object.fromEntries(patient) as CellarView;
}
