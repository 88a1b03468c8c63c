import type { DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { MIGRATIONS } from './migrations/migrations.ts';
import { callSqlite } from './sqlite-fault.ts';

/** "brim" in ASCII: says of a file that it is one of ours. */
const OURS = 0x6272696d;

const pragma = (connection: DatabaseSync, name: string): number => {
  const row = callSqlite(() => connection.prepare(`pragma ${name}`).get());
  return Number(row?.[name]);
};

/**
 * Says how many migrations a file has gone through; 0 of an empty one.
 *
 * @throws OperatorError where the file is another program's, or of a newer version of this one
 */
export function readVersion(connection: DatabaseSync, path: string): number {
  const version = pragma(connection, 'user_version');
  const isEmpty = pragma(connection, 'schema_version') === 0;
  if (!isEmpty && pragma(connection, 'application_id') !== OURS)
    throw new OperatorError(
      `${path} is no cellar file of brimnote, and it is left as it is: name another with DATA_FILE.`,
    );
  if (version > MIGRATIONS.length)
    throw new OperatorError(
      `${path} was written by a newer brimnote (form ${version}; this one knows ${MIGRATIONS.length}): run the newer one, or name another file with DATA_FILE.`,
    );
  return version;
}

/** Brings a file to the present form, each step whole or not at all. `from` is the number of steps it has gone. */
export function migrate(connection: DatabaseSync, from: number): void {
  for (const [step, sql] of MIGRATIONS.entries()) {
    if (step < from) continue;
    callSqlite(() => {
      connection.exec('begin immediate');
      try {
        connection.exec(sql);
        connection.exec(`pragma application_id = ${OURS}; pragma user_version = ${step + 1}; commit`);
      } catch (error) {
        if (connection.isTransaction) connection.exec('rollback');
        throw error;
      }
    });
  }
}
