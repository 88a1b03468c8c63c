import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import type { CellarStore } from '../../../../src/core/cellar/cellar-store.ts';
import { createSqliteStore } from '../../../../src/edge/store/sqlite/create-sqlite-store.ts';
import { migrate } from '../../../../src/edge/store/sqlite/migrate.ts';
import { sqliteFault } from '../../../../src/edge/store/sqlite/sqlite-fault.ts';
import { allEntries, note, noteIn, numbersOf, writeOf } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

/** A store whose connection the test can trouble. */
function troubled(): { store: CellarStore; writer: DatabaseSync; path: string } {
  const path = join(temporaryFolder(), 'cellar.db');
  const writer = new DatabaseSync(path, { timeout: 0 });
  migrate(writer, 0);
  writer.exec('pragma journal_mode = wal');
  const reader = new DatabaseSync(path, { readOnly: true });
  const close = (): void => [reader, writer].forEach((one) => one.close());
  return { store: createSqliteStore({ path, writer, reader, now: () => 0, close }), writer, path };
}

const pages = (writer: DatabaseSync): number =>
  Number(writer.prepare('pragma page_count').get()?.['page_count']);

test.each<[string, string, (writer: DatabaseSync, path: string) => () => void]>([
  [
    'full',
    'is full',
    (writer) => {
      writer.exec(`pragma max_page_count = ${pages(writer)}`);
      return () => writer.exec('pragma max_page_count = 1000000');
    },
  ],
  [
    'locked',
    'is held by another program',
    (_, path) => {
      const other = new DatabaseSync(path);
      other.exec('begin immediate');
      return () => other.close();
    },
  ],
  [
    'read-only',
    'became read-only',
    (writer) => {
      writer.exec('pragma query_only = on');
      return () => writer.exec('pragma query_only = off');
    },
  ],
])(
  '%s: while the file %s nothing is kept by halves, what is there can be read, and later all goes on',
  async (kind, _, trouble) => {
    const { store, writer, path } = troubled();
    await noteIn(store, note(1));
    const mend = trouble(writer, path);
    const large = (at: number) => note(at, { key: `large ${at}`, remark: 'x'.repeat(100_000) });
    const turns = [2, 3].map((at) => noteIn(store, note(at, { vessels: ['tank 9'] }), large(at)));
    const due = store.turn('cellar 2', async () => ({ writes: [writeOf(large(4))], result: 'kept' }));
    for (const turn of [...turns, due])
      await expect(turn).rejects.toMatchObject({ name: 'StoreError', kind });
    expect(numbersOf(await allEntries(store))).toEqual([1]);
    expect(
      await store.turn('cellar 1', async (view) => ({ writes: [], result: await view.nextEntry() })),
    ).toBe(2);
    mend();
    await noteIn(store, note(5), large(6));
    expect(numbersOf(await allEntries(store))).toEqual([1, 2, 3]);
    expect(await store.rebuild('cellar 1')).toEqual({ vessels: 1, differed: [] });
    await store.close();
  },
);

test.each([
  ['that wrote on it', [writeOf(note(3))]],
  ['that only read it', []],
])('a turn %s is lost with the one that it read of', async (_, writes) => {
  const { store, writer } = troubled();
  await noteIn(store, note(1));
  const { promise: whenRead, resolve: wasRead } = Promise.withResolvers<void>();
  const { promise: whenLost, resolve: wasLost } = Promise.withResolvers<void>();
  const first = noteIn(store, note(2));
  const second = store.turn('cellar 1', async (view) => {
    const next = await view.nextEntry();
    // The disk forgets the first turn under our feet.
    writer.exec('rollback');
    wasRead();
    await whenLost;
    return { writes, result: next };
  });
  await whenRead;
  await expect(first).rejects.toThrow(/./);
  wasLost();
  await expect(second).rejects.toThrow(/./);
  expect(numbersOf(await allEntries(store))).toEqual([1]);
  await noteIn(store, note(4));
  expect(numbersOf(await allEntries(store))).toEqual([1, 2]);
  await store.close();
});

// Codes: https://www.sqlite.org/rescode.html
test.each([
  [5, 'locked'],
  [261, 'locked'],
  [6, 'locked'],
  [8, 'read-only'],
  [1544, 'read-only'],
  [3, 'read-only'],
  [11, 'damaged'],
  [779, 'damaged'],
  [26, 'damaged'],
  [13, 'full'],
  [4874, 'full'],
  [10, 'other'],
  [778, 'other'],
  [14, 'other'],
  [7, 'other'],
])('the code %i of SQLite is the fault "%s", with its cause', (errcode, kind) => {
  const cause = Object.assign(new Error('as SQLite says'), { errcode });
  expect(sqliteFault(cause)).toMatchObject({ name: 'StoreError', kind, cause });
});

test.each([1, 19, 2067, 1811, 20, 21, 25])(
  'the code %i of SQLite is a fault of our own and stays as it is',
  (errcode) => {
    const error = Object.assign(new Error('as SQLite says'), { errcode });
    expect(sqliteFault(error)).toBe(error);
  },
);

test('a place where no file can be is told in a sentence', async () => {
  const folder = temporaryFolder();
  mkdirSync(join(folder, 'cellar.db'));
  await expect(open(join(folder, 'cellar.db'))).rejects.toThrow(
    /cellar\.db cannot be opened \(.+\): check DATA_FILE/,
  );
  writeFileSync(join(folder, 'file'), '');
  await expect(open(join(folder, 'file', 'cellar.db'))).rejects.toThrow(
    /cannot be opened \(.+\): check DATA_FILE/,
  );
});
