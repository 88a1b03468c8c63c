import { closeSync, openSync, renameSync, rmSync } from 'node:fs';
import { backup, DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { asOperatorError } from './as-operator-error.ts';
import { callSqlite, sqliteFault } from './sqlite-fault.ts';

/** Pages copied between two pauses. */
const AT_ONCE = 200;

/**
 * Copies a cellar file as it is at this moment, while it is written to. The copy is made beside its place and gets its
 * name only when it is whole.
 *
 * @throws OperatorError where there is something at `to` already, or nothing can be put there
 */
export async function copyFile(path: string, to: string): Promise<void> {
  const unfinished = `${to}.unfinished`;
  reserve(to);
  try {
    rmSync(unfinished, { force: true });
    // A connection of its own with an open view: the copy is of one moment, and need not begin anew at each write.
    const source = callSqlite(() => new DatabaseSync(path, { readOnly: true }));
    try {
      callSqlite(() => source.exec('begin; select count(*) from cellar'));
      await backup(source, unfinished, { rate: AT_ONCE });
    } catch (error) {
      throw sqliteFault(error);
    } finally {
      source.close();
    }
    makePlain(unfinished);
    renameSync(unfinished, to);
  } catch (error) {
    rmSync(unfinished, { force: true });
    rmSync(to, { force: true });
    throw error;
  }
}

function reserve(to: string): void {
  try {
    closeSync(openSync(to, 'wx'));
  } catch (cause) {
    if ((cause as NodeJS.ErrnoException).code !== 'EEXIST') throw asOperatorError(cause, to);
    throw new OperatorError(`There is something at ${to} already: name a file that does not exist yet.`, {
      cause,
    });
  }
}

/** Without the files that go with writing, so that the copy is one file, and can be read where nothing can be written. */
function makePlain(copy: string): void {
  callSqlite(() => {
    const connection = new DatabaseSync(copy);
    try {
      connection.exec('pragma journal_mode = delete');
    } finally {
      connection.close();
    }
  });
}
