import type { DatabaseSync } from 'node:sqlite';
import type { CellarStore } from '../../../core/cellar/cellar-store.ts';
import { PROJECTION_VERSION } from '../../../core/cellar/projection-version.ts';
import { callSqlite } from './sqlite-fault.ts';

/** Whether the vessels in a file were derived from its log by the rule of this program. */
export function isProjectionNew(connection: DatabaseSync): boolean {
  const row = callSqlite(() => connection.prepare('select version from projection').get());
  return row?.['version'] === PROJECTION_VERSION;
}

/**
 * Derives the vessels of all cellars anew where another rule has made them. The version is noted last: what is broken off
 * is done again.
 */
export async function renewProjection(
  writer: DatabaseSync,
  store: Pick<CellarStore, 'cellars' | 'rebuild'>,
): Promise<void> {
  if (isProjectionNew(writer)) return;
  for (const cellar of await store.cellars()) await store.rebuild(cellar);
  callSqlite(() => writer.prepare('update projection set version = ?').run(PROJECTION_VERSION));
}
