import type { DatabaseSync } from 'node:sqlite';
import type { CellarStore } from '../../../core/cellar/cellar-store.ts';
import { rebuildVessels } from '../projection/rebuild-vessels.ts';
import { leaseDue, readOpenDue } from '../sql/due-things.ts';
import { createSqlLedger } from '../sql/sql-ledger.ts';
import { createSqlView } from '../sql/sql-view.ts';
import { createSqlMailbox } from '../sql/sql-mailbox.ts';
import { writeSet } from '../sql/write-set.ts';
import { StoreError } from '../store-error.ts';
import { makeTakeTurns } from '../take-turns.ts';
import { createKysely } from './create-kysely.ts';
import { createSqliteReader } from './create-sqlite-reader.ts';
import { createGroupCommit, type Batch } from './group-commit.ts';

/** What a store on SQLite is made of. */
export interface SqliteParts {
  readonly path: string;
  /** The only connection that writes, and the one that turns read by: it sees what is not committed yet. */
  readonly writer: DatabaseSync;
  /** Sees what is durable and nothing else. */
  readonly reader: DatabaseSync;
  readonly now: () => number;
  readonly close: () => void;
}

/** A store that can be kept from writing once its file was found to be damaged. */
export interface SqliteStore extends CellarStore {
  readonly stopWriting: (damage: string) => void;
}

/** Makes a store of the connections to a file. */
export function createSqliteStore({ path, writer, reader, now, close }: SqliteParts): SqliteStore {
  const db = createKysely(writer);
  const { look, cellars, backup, nextDue } = createSqliteReader({ path, reader, now });
  const commits = createGroupCommit(writer);
  const inTurn = makeTakeTurns();
  let damage: StoreError | undefined;

  const write = async (work: () => Promise<void>): Promise<Batch> => {
    if (damage !== undefined) throw damage;
    return commits.write(work);
  };

  const writeDurably = async (work: () => Promise<void>, onWritten?: () => void): Promise<void> => {
    const batch = await write(work);
    onWritten?.();
    await batch.durable;
  };

  return {
    ...createSqlMailbox(db, writeDurably),
    look,
    cellars,
    backup,
    nextDue,
    stopWriting: (found) => {
      damage = new StoreError('damaged', { cause: new Error(found) });
    },

    turn: async (cellar, work) => {
      const { result, batches } = await inTurn(cellar, async () => {
        const seen = new Set<Batch>();
        const onRead = (): void => {
          const pending = commits.pending();
          if (pending !== undefined) seen.add(pending);
        };
        const done = await work(createSqlView(db, { cellar, now, onRead }));
        if (done.writes.length > 0)
          seen.add(
            await write(async () => {
              // What it read may have come to nothing since.
              for (const batch of seen) batch.check();
              await writeSet(db, done.writes, { cellar, now: now() });
            }),
          );
        return { result: done.result, batches: [...seen] };
      });
      // The next turn of the cellar need not wait for the disk.
      await Promise.all(batches.map(({ durable }) => durable));
      return result;
    },

    takeDue: async (moment, { lease_ms, most }) => {
      if ((await readOpenDue(db, moment, 1)).length === 0) return [];
      const taken: Awaited<ReturnType<typeof readOpenDue>> = [];
      const batch = await write(async () => {
        taken.push(...(await readOpenDue(db, moment, most)));
        for (const due of taken) await leaseDue(db, due, moment + lease_ms);
      });
      await batch.durable;
      return taken;
    },

    rebuild: (cellar) => inTurn(cellar, () => rebuildVessels(createSqlLedger(db, cellar), writeDurably)),

    close: async () => {
      await commits.settle();
      await db.destroy();
      close();
    },
  };
}
