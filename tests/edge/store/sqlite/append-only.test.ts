import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { allEntries, note, noteIn } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

test.each([
  "update entry set content = '{}'",
  'update entry set corrects = 1',
  'delete from entry',
  'update touched set at = 5',
  'delete from touched',
  'insert or replace into entry select cellar, entry, key, at, noted_at, person, kind, corrects, content from entry',
  'insert or replace into entry select cellar, 3, key, at, noted_at, person, kind, corrects, content from entry limit 1',
  "insert into entry select cellar, 4, 'a gap', at, noted_at, person, kind, corrects, content from entry limit 1",
])('the file itself refuses "%s", whoever writes', async (sql) => {
  const path = join(temporaryFolder(), 'cellar.db');
  const store = await open(path);
  await noteIn(store, note(1), note(2));
  const before = await allEntries(store);
  const somebody = new DatabaseSync(path);
  expect(() => somebody.exec(sql)).toThrow(/an entry of the log is (never (changed|deleted)|new)/);
  somebody.close();
  expect(await allEntries(store)).toEqual(before);
  await store.close();
});
