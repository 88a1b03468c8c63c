import { StoreError, type StoreFault } from '../store-error.ts';

/** SQLite's result codes that tell of the world (https://www.sqlite.org/rescode.html). */
const FAULTS = new Map<number, StoreFault>([
  [3, 'read-only'], // SQLITE_PERM
  [5, 'locked'], // SQLITE_BUSY
  [6, 'locked'], // SQLITE_LOCKED
  [8, 'read-only'], // SQLITE_READONLY
  [11, 'damaged'], // SQLITE_CORRUPT
  [13, 'full'], // SQLITE_FULL
  [26, 'damaged'], // SQLITE_NOTADB
  // The file that its connections share (`-shm`) could not grow: SQLITE_IOERR_SHMSIZE.
  [4874, 'full'],
]);
/** SQLITE_ERROR, SQLITE_CONSTRAINT, SQLITE_MISMATCH, SQLITE_MISUSE, SQLITE_RANGE: we asked for what cannot be. */
const OURS = new Set([1, 19, 20, 21, 25]);

/** What SQLite threw, as a StoreError where the world failed; a fault of our own stays as it is. */
export function sqliteFault(error: unknown): unknown {
  const code = error instanceof Error && 'errcode' in error ? Number(error.errcode) : undefined;
  if (code === undefined) return error;
  const primary = code & 0xff;
  if (OURS.has(primary)) return error;
  return new StoreError(FAULTS.get(code) ?? FAULTS.get(primary) ?? 'other', { cause: error });
}

/** Calls SQLite; where the world fails it throws a StoreError. */
export function callSqlite<T>(call: () => T): T {
  try {
    return call();
  } catch (error) {
    throw sqliteFault(error);
  }
}
