import { existsSync } from 'node:fs';
import { DatabaseSync } from 'node:sqlite';
import { OperatorError } from '../../operator-error.ts';
import { asOperatorError } from './as-operator-error.ts';
import { createSqliteReader, type CellarReader } from './create-sqlite-reader.ts';
import { readVersion } from './migrate.ts';
import { MIGRATIONS } from './migrations/migrations.ts';
import { isProjectionNew } from './renew-projection.ts';
import { callSqlite } from './sqlite-fault.ts';

const PATIENCE_ms = 1000;

/**
 * Opens a cellar file only to read it, also beside a process that writes to it.
 *
 * @throws OperatorError with a sentence where there is none, or it is of another form than this version reads
 */
export async function openSqliteReader(
  path: string,
  { now }: { readonly now: () => number },
): Promise<CellarReader & { readonly close: () => Promise<void> }> {
  if (!existsSync(path)) throw new OperatorError(`There is no cellar file ${path}: check DATA_FILE.`);
  let reader: DatabaseSync | undefined;
  try {
    const opened = callSqlite(() => new DatabaseSync(path, { readOnly: true, timeout: PATIENCE_ms }));
    reader = opened;
    if (readVersion(opened, path) < MIGRATIONS.length || !isProjectionNew(opened))
      throw new OperatorError(`${path} is of an older form: start brimnote with it once, then read it.`);
    return { ...createSqliteReader({ path, reader: opened, now }), close: async () => opened.close() };
  } catch (error) {
    reader?.close();
    throw asOperatorError(error, path);
  }
}
