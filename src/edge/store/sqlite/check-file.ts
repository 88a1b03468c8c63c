import { statSync } from 'node:fs';
import type { DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { damagedSentence } from './as-operator-error.ts';
import { callSqlite } from './sqlite-fault.ts';

const sizeOf = (path: string): number => statSync(path, { throwIfNoEntry: false })?.size ?? 0;

/**
 * Refuses an empty or missing file that has a log of writes (`-wal`) beside it: SQLite would begin anew and delete the
 * log, and with it what may be the last copy of some entries.
 *
 * @throws OperatorError
 */
export function checkNotOrphaned(path: string): void {
  if (sizeOf(path) > 0 || sizeOf(`${path}-wal`) === 0) return;
  throw new OperatorError(
    damagedSentence(path, `it is empty or missing while ${path}-wal still holds what was written to it`),
  );
}

/** Size in bytes of a cellar file with what was written to it last. */
export const fileSize = (path: string): number => sizeOf(path) + sizeOf(`${path}-wal`);

/**
 * Reads every page of a file.
 *
 * @returns what is wrong with it; undefined where nothing is
 */
export function findDamage(connection: DatabaseSync): string | undefined {
  const rows = callSqlite(() => connection.prepare('pragma quick_check(1)').all());
  const found = String(rows[0]?.['quick_check']);
  return found === 'ok' ? undefined : found;
}
