import { randomUUID } from 'node:crypto';
import { existsSync, linkSync, renameSync, rmSync } from 'node:fs';
import { backup, DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { StoreError } from '../store-error.ts';
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
  refuseExisting(to);
  const unfinished = `${to}.${randomUUID()}.unfinished`;
  try {
    await copyPages(path, unfinished);
    makePlain(unfinished);
    giveName(unfinished, to);
  } catch (error) {
    const fault = sqliteFault(error);
    const isOfSource = fault instanceof StoreError && fault.kind === 'damaged';
    throw asOperatorError(fault, isOfSource ? path : to);
  } finally {
    rmSync(unfinished, { force: true });
  }
}

async function copyPages(path: string, to: string): Promise<void> {
  // A connection of its own with an open view: the copy is of one moment, and need not begin anew at each write.
  const source = callSqlite(() => new DatabaseSync(path, { readOnly: true }));
  try {
    source.exec('begin; select count(*) from cellar');
    await backup(source, to, { rate: AT_ONCE });
  } finally {
    source.close();
  }
}

/** Without the files that go with writing, so that the copy is one file, and can be read where nothing can be written. */
function makePlain(copy: string): void {
  const connection = new DatabaseSync(copy);
  try {
    connection.exec('pragma journal_mode = delete');
  } finally {
    connection.close();
  }
}

function giveName(unfinished: string, to: string): void {
  try {
    // Unlike a renaming, a link never takes the place of anything.
    linkSync(unfinished, to);
  } catch (error) {
    refuseExisting(to, error);
    // Some disks that one carries about know no links.
    renameSync(unfinished, to);
  }
}

function refuseExisting(to: string, cause?: unknown): void {
  if (!existsSync(to)) return;
  throw new OperatorError(`There is something at ${to} already: name a file that does not exist yet.`, {
    cause,
  });
}
