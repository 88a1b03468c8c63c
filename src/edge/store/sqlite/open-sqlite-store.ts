import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import type { CellarStore } from '../../../core/cellar/cellar-store.ts';
import { OperatorError } from '../../operator-error.ts';
import { asOperatorError, damagedSentence } from './as-operator-error.ts';
import { checkAside } from './check-aside.ts';
import { checkNotOrphaned, fileSize, findDamage } from './check-file.ts';
import { createSqliteStore } from './create-sqlite-store.ts';
import { migrate, readVersion } from './migrate.ts';
import { realPath } from './real-path.ts';
import { renewProjection } from './renew-projection.ts';
import { callSqlite } from './sqlite-fault.ts';
import { lockForWriting } from './writer-lock.ts';

/** What a store is told when it is opened. */
export interface SqliteStoreOptions {
  /** The time in milliseconds since 1970: what is kept lapses by it. */
  readonly now: () => number;
  /** Told of damage that a check after the start has found: nothing is written from then on. */
  readonly report: (damage: OperatorError) => void;
}

/** A larger file is checked after the start: see `checkAside`. */
const CHECKED_AT_START_bytes = 64_000_000;
/** How long a statement waits for another program that holds the file: everybody waits with it. */
const PATIENCE_ms = 100;
/** What remains of the log of writes after it has once grown. */
const WAL_KEPT_bytes = 64_000_000;

/**
 * Opens a cellar file for writing, or makes it, with its folder.
 *
 * @throws OperatorError with a sentence where it is damaged, newer, another program's, in use, or cannot be written
 */
export async function openSqliteStore(path: string, options: SqliteStoreOptions): Promise<CellarStore> {
  const toClose: (() => void)[] = [];
  const close = (): void =>
    toClose
      .splice(0)
      .reverse()
      .forEach((one) => one());
  try {
    mkdirSync(dirname(path), { recursive: true });
    const file = realPath(path);
    toClose.push(lockForWriting(file));
    checkNotOrphaned(file);
    const writer = callSqlite(() => new DatabaseSync(file, { timeout: PATIENCE_ms }));
    toClose.push(() => writer.close());
    const version = readVersion(writer, file);
    const isLarge = fileSize(file) > CHECKED_AT_START_bytes;
    const damage = isLarge ? undefined : findDamage(writer);
    if (damage !== undefined) throw new OperatorError(damagedSentence(file, damage));
    configure(writer, file);
    migrate(writer, version);
    const reader = callSqlite(() => new DatabaseSync(file, { readOnly: true, timeout: PATIENCE_ms }));
    toClose.push(() => reader.close());

    const store = createSqliteStore({ path: file, writer, reader, now: options.now, close });
    await renewProjection(writer, store);
    if (isLarge)
      toClose.push(
        checkAside(file, (found) => {
          store.stopWriting(found);
          options.report(new OperatorError(damagedSentence(file, found)));
        }),
      );
    return store;
  } catch (error) {
    close();
    throw asOperatorError(error, path);
  }
}

function configure(writer: DatabaseSync, path: string): void {
  const mode = callSqlite(() => writer.prepare('pragma journal_mode = wal').get())?.['journal_mode'];
  if (mode !== 'wal')
    throw new OperatorError(`${path} lies where it cannot be kept safely: name a file on a local disk.`);
  callSqlite(() =>
    writer.exec(
      `pragma synchronous = full; pragma secure_delete = fast; pragma journal_size_limit = ${WAL_KEPT_bytes}`,
    ),
  );
}
