import type { DatabaseSync } from 'node:sqlite';
import type { CellarStore } from '../../../core/cellar/cellar-store.ts';
import { readNextDue } from '../sql/due-things.ts';
import { createSqlView } from '../sql/sql-view.ts';
import { copyFile } from './copy-file.ts';
import { createKysely } from './create-kysely.ts';

/** What can be done with cellars without writing. */
export type CellarReader = Pick<CellarStore, 'look' | 'cellars' | 'nextDue' | 'backup'>;

/** Makes a reader of a connection that only reads. */
export function createSqliteReader({
  path,
  reader,
  now,
}: {
  readonly path: string;
  readonly reader: DatabaseSync;
  readonly now: () => number;
}): CellarReader {
  const db = createKysely(reader);
  return {
    look: (cellar, work) => work(createSqlView(db, { cellar, now })),
    cellars: async () => {
      const rows = await db.selectFrom('cellar').select('cellar').execute();
      return rows.map(({ cellar }) => cellar).toSorted();
    },
    nextDue: () => readNextDue(db),
    backup: (to) => copyFile(path, to),
  };
}
