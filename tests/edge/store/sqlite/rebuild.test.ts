import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { PROJECTION_VERSION } from '../../../../src/core/cellar/projection-version.ts';
import { openSqliteReader } from '../../../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { note, noteIn, strike } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

test.each([
  ["update vessel set state = json_set(state, '$.since', 7) where vessel = 'tank 4'", ['tank 4']],
  ["update vessel set state = null where vessel = 'tank 9'", ['tank 9']],
  ["update vessel set run = 40 where vessel = 'tank 9'", ['tank 9']],
  ["delete from vessel where vessel = 'tank 4'", ['tank 4']],
  ["insert into vessel select cellar, 'tank 7', at, entry, run, state from vessel limit 1", ['tank 7']],
  ["update waypoint set state = '{}' where vessel = 'tank 9'", ['tank 9']],
  ['delete from waypoint', ['tank 4', 'tank 9']],
  ["insert into waypoint values ('cellar 1', 'tank 4', 3, 99, 0, null)", ['tank 4']],
  ['select 1', []],
])('a rebuild mends what "%s" has spoilt, and says where', async (sql, differed) => {
  const path = join(temporaryFolder(), 'cellar.db');
  const store = await open(path);
  await noteIn(store, note(1), note(2, { vessels: ['tank 4', 'tank 9'] }), note(3), strike(4, 3));
  const vessels = () => store.look('cellar 1', (view) => view.vessels());
  const before = await vessels();
  const somebody = new DatabaseSync(path);
  somebody.exec(sql);
  somebody.close();
  expect(await store.rebuild('cellar 1')).toEqual({ vessels: 2, differed });
  expect(await vessels()).toEqual(before);
  expect(await store.rebuild('cellar 1')).toEqual({ vessels: 2, differed: [] });
  await store.close();
});

test('vessels that another rule has derived are derived anew when the file is opened, and nobody reads them before', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  const store = await open(path);
  await noteIn(store, note(1), note(2, { vessels: ['tank 9'] }));
  const before = await store.look('cellar 1', (view) => view.vessels());
  await store.close();
  const somebody = new DatabaseSync(path);
  somebody.exec(`update vessel set state = json_set(state, '$.since', 7); update projection set version = 0`);
  await expect(openSqliteReader(path, { now: () => 0 })).rejects.toThrow(/start brimnote with it once/);
  const again = await open(path);
  expect(await again.look('cellar 1', (view) => view.vessels())).toEqual(before);
  expect(somebody.prepare('select version from projection').get()).toEqual({ version: PROJECTION_VERSION });
  somebody.close();
  await again.close();
});
