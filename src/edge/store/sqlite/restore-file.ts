import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { asOperatorError, damagedSentence } from './as-operator-error.ts';
import { checkNotOrphaned, findDamage } from './check-file.ts';
import { copyFile } from './copy-file.ts';
import { readVersion } from './migrate.ts';
import { callSqlite } from './sqlite-fault.ts';
import { lockForWriting } from './writer-lock.ts';

/**
 * Puts a copy in the place of a cellar file that is not there any more. To lay a file there by hand is dangerous: where
 * the log of writes (`-wal`) of the former one still lies, it would be written into the copy.
 *
 * @throws OperatorError where the copy is damaged or no cellar file, or its place is not free
 */
export async function restoreFile(copy: string, path: string): Promise<void> {
  let unlock: (() => void) | undefined;
  try {
    mkdirSync(dirname(path), { recursive: true });
    unlock = lockForWriting(path);
    checkNotOrphaned(path);
    checkCopy(copy);
    await copyFile(copy, path);
  } catch (error) {
    throw asOperatorError(error, copy);
  } finally {
    unlock?.();
  }
}

function checkCopy(copy: string): void {
  const connection = callSqlite(() => new DatabaseSync(copy, { readOnly: true }));
  try {
    const isEmpty = readVersion(connection, copy) === 0;
    const damage = isEmpty ? 'there is nothing in it' : findDamage(connection);
    if (damage !== undefined) throw new OperatorError(damagedSentence(copy, damage));
  } finally {
    connection.close();
  }
}
