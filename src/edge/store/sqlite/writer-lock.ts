import { DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { StoreError } from '../store-error.ts';
import { callSqlite } from './sqlite-fault.ts';

/**
 * Makes this process the only one that writes to a cellar file, and gives back what ends that.
 *
 * The lock is an exclusive transaction, held open, on an empty SQLite file beside it. The kernel keeps such a lock and
 * drops it when the process dies, by SIGKILL too, so that a lock is never stale and the file may lie there for ever.
 * SQLite's own way to lock the cellar file (`locking_mode=exclusive`) would shut out readers and backups as well.
 * Nothing in this process may open the cellar file or this one but SQLite: to close such a file drops the locks on it
 * (POSIX: they belong to the process).
 *
 * @throws OperatorError where another one writes
 */
export function lockForWriting(path: string): () => void {
  const lock = callSqlite(() => new DatabaseSync(`${path}-writer`, { timeout: 0 }));
  try {
    callSqlite(() => lock.exec('begin exclusive'));
  } catch (cause) {
    lock.close();
    if (!(cause instanceof StoreError) || cause.kind !== 'locked') throw cause;
    throw new OperatorError(
      `Another brimnote is writing to ${path}: stop that one first, or name another file with DATA_FILE.`,
      { cause },
    );
  }
  return () => lock.close();
}
