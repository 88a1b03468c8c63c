import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { asOperatorError, damagedSentence } from './as-operator-error.ts';
import { checkNotOrphaned, findDamage } from './check-file.ts';
import { copyFile } from './copy-file.ts';
import { readVersion } from './migrate.ts';
import { moveAside } from './move-aside.ts';
import { realPath } from './real-path.ts';
import { callSqlite } from './sqlite-fault.ts';
import { lockForWriting } from './writer-lock.ts';

/** What a restored file took the place of. */
export interface Restored {
  /** Where the former file is now; absent where there was none. */
  readonly former?: string;
}

/**
 * Puts a copy in the place of a cellar file that is not there any more, or that is moved to `aside` first. To lay a file
 * there by hand is dangerous: where the log of writes (`-wal`) of the former one still lies, it would be written into the
 * copy.
 *
 * @throws OperatorError where the copy is damaged or no cellar file, or its place is not free; then nothing has changed
 */
export async function restoreFile(copy: string, path: string, aside?: string): Promise<Restored> {
  let unlock: (() => void) | undefined;
  let moveBack: (() => void) | undefined;
  try {
    mkdirSync(dirname(path), { recursive: true });
    const file = realPath(path);
    unlock = lockForWriting(file);
    if (aside === undefined) checkNotOrphaned(file);
    checkCopy(copy);
    if (realPath(copy) === file)
      throw new OperatorError(`${copy} is the cellar's file itself: name a backup of it.`);
    if (aside !== undefined) moveBack = moveAside(file, aside);
    await copyFile(copy, file);
    return moveBack === undefined || aside === undefined ? {} : { former: aside };
  } catch (error) {
    moveBack?.();
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
