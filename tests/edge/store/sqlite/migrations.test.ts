import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { OperatorError } from '../../../../src/edge/operator-error.ts';
import { migrate, readVersion } from '../../../../src/edge/store/sqlite/migrate.ts';
import { MIGRATIONS } from '../../../../src/edge/store/sqlite/migrations/migrations.ts';
import { openSqliteReader } from '../../../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { allEntries, note, noteIn } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

const change = (path: string, sql: string): void => {
  const connection = new DatabaseSync(path);
  connection.exec(sql);
  connection.close();
};

test('a new file is brought to the present form, with its folder; a second start changes nothing', async () => {
  const path = join(temporaryFolder(), 'a', 'b', 'cellar.db');
  const store = await open(path);
  await noteIn(store, note(1));
  await store.close();
  const again = await open(path);
  expect(await allEntries(again)).toHaveLength(1);
  await again.close();
  const connection = new DatabaseSync(path, { readOnly: true });
  expect(connection.prepare('pragma user_version').get()).toEqual({ user_version: MIGRATIONS.length });
  expect(connection.prepare('pragma journal_mode').get()).toEqual({ journal_mode: 'wal' });
  connection.close();
});

test('a file of a newer version is refused with a sentence, and left as it is', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  await (await open(path)).close();
  change(path, `pragma user_version = ${MIGRATIONS.length + 1}`);
  const before = readFileSync(path);
  await expect(open(path)).rejects.toThrow(
    /cellar\.db was written by a newer brimnote \(form 5; this one knows 4\): /,
  );
  await expect(open(path)).rejects.toBeInstanceOf(OperatorError);
  await expect(openSqliteReader(path, { now: () => 0 })).rejects.toThrow(/newer brimnote/);
  expect(readFileSync(path)).toEqual(before);
});

test('a file of another program is refused with a sentence, and left as it is', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  change(path, 'create table recipe (name text)');
  const before = readFileSync(path);
  await expect(open(path)).rejects.toThrow(/is no cellar file of brimnote/);
  expect(readFileSync(path)).toEqual(before);
});

test('whoever only reads refuses a file of an older form, and one that is not there', async () => {
  const folder = temporaryFolder();
  const path = join(folder, 'cellar.db');
  writeFileSync(path, '');
  await expect(openSqliteReader(path, { now: () => 0 })).rejects.toThrow(/of an older form: start brimnote/);
  const absent = join(folder, 'absent.db');
  await expect(openSqliteReader(absent, { now: () => 0 })).rejects.toThrow(
    /There is no cellar file .*absent\.db/,
  );
});

test('a step that breaks off leaves the file as it was before it', () => {
  const path = join(temporaryFolder(), 'cellar.db');
  const connection = new DatabaseSync(path);
  connection.exec('create table waypoint (a)');
  expect(() => migrate(connection, 0)).toThrow(/waypoint/);
  expect(connection.prepare('select name from sqlite_schema').all()).toEqual([{ name: 'waypoint' }]);
  expect(() => readVersion(connection, path)).toThrow(/no cellar file/);
  connection.close();
});
