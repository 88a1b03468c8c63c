import type { DatabaseSync } from 'node:sqlite';
import { makeTakeTurns } from '../take-turns.ts';
import { callSqlite } from './sqlite-fault.ts';

/** The write sets of one turn of the event loop, which are committed together. */
export interface Batch {
  /** Resolves when they are on the disk; rejects where they are not, and then none of them is kept. */
  readonly durable: Promise<void>;
  /** @throws what `durable` rejects with, where it has */
  readonly check: () => void;
}

/** Commits write sets in batches. */
export interface GroupCommit {
  /** What is written but not yet committed. */
  readonly pending: () => Batch | undefined;
  /** Runs a write set alone; where it throws, nothing of it is kept, and the others of its batch are. */
  readonly write: (work: () => Promise<void>) => Promise<Batch>;
  /** Resolves when nothing is pending. */
  readonly settle: () => Promise<void>;
}

/** What a batch needs of a connection. */
export type CommitConnection = Pick<DatabaseSync, 'exec' | 'isTransaction'>;

/**
 * A commit waits for the disk, so that all that is written in one turn of the event loop waits for it together. Each
 * write set has a savepoint of its own. The statements of two write sets never mix, nor does a commit fall into one:
 * they take turns.
 */
export function createGroupCommit(connection: CommitConnection): GroupCommit {
  const takeTurns = makeTakeTurns();
  const alone = <T>(work: () => Promise<T>): Promise<T> => takeTurns('', work);
  const run = (sql: string): void => callSqlite(() => connection.exec(sql));
  let open: OpenBatch | undefined;

  const begin = (): OpenBatch => {
    // A rollback that failed when the world did is made up for.
    if (connection.isTransaction) run('rollback');
    run('begin immediate');
    open = openBatch();
    setImmediate(() => void alone(commit));
    return open;
  };

  const commit = async (): Promise<void> => {
    const batch = open;
    if (batch === undefined) return;
    open = undefined;
    try {
      run('commit');
      batch.resolve();
    } catch (error) {
      abandon(batch, error);
    }
  };

  /** Nothing of a batch is kept. */
  const abandon = (batch: OpenBatch, error: unknown): void => {
    open = undefined;
    batch.reject(error);
    try {
      if (connection.isTransaction) run('rollback');
    } catch {
      // The next batch tries it again before it begins.
    }
  };

  /** A write set failed. A full disk may have rolled back the whole batch with it. */
  const takeBack = (batch: OpenBatch, error: unknown): void => {
    try {
      if (!connection.isTransaction) throw error;
      run('rollback to write_set');
      run('release write_set');
    } catch {
      abandon(batch, error);
    }
  };

  return {
    pending: () => open,
    write: (work) =>
      alone(async () => {
        const batch = open ?? begin();
        try {
          run('savepoint write_set');
          await work();
          run('release write_set');
        } catch (error) {
          takeBack(batch, error);
          throw error;
        }
        return batch;
      }),
    settle: () => alone(commit),
  };
}

interface OpenBatch extends Batch {
  readonly resolve: () => void;
  readonly reject: (error: unknown) => void;
}

function openBatch(): OpenBatch {
  const { promise: durable, resolve, reject } = Promise.withResolvers<void>();
  let failure: { readonly error: unknown } | undefined;
  // Whoever wrote waits for it; where all of them failed before, nobody does.
  durable.catch(() => undefined);
  return {
    durable,
    resolve,
    reject: (error) => {
      failure = { error };
      reject(error);
    },
    check: () => {
      if (failure !== undefined) throw failure.error;
    },
  };
}
