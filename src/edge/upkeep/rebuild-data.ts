import { existsSync } from 'node:fs';
import { OperatorError } from '../operator-error.ts';
import { openSqliteStore, type SqliteStoreOptions } from '../store/sqlite/open-sqlite-store.ts';

/**
 * Derives all vessels of a cellar's file anew from its log, as after a change of what an entry does to a vessel.
 *
 * @returns what to tell the operator, a line for each cellar in it
 * @throws OperatorError where there is no such file, or it cannot be opened for writing
 */
export async function rebuildData(dataFile: string, options: SqliteStoreOptions): Promise<string> {
  if (!existsSync(dataFile)) throw new OperatorError(`There is no ${dataFile}: check DATA_FILE.`);
  const store = await openSqliteStore(dataFile, options);
  try {
    const lines: string[] = [];
    for (const cellar of await store.cellars()) {
      const { vessels, differed } = await store.rebuild(cellar);
      const result =
        differed.length === 0
          ? 'none differed from what was kept'
          : `${differed.length} differed from what was kept, and are mended: ${differed.join(', ')}`;
      lines.push(`${cellar}: ${vessels} vessels derived anew from the log; ${result}.`);
    }
    return lines.length === 0 ? `There is no cellar in ${dataFile} yet.` : lines.join('\n');
  } finally {
    await store.close();
  }
}
