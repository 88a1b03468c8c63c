import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { rebuildData } from '../../../src/edge/upkeep/rebuild-data.ts';
import { note, noteIn } from '../../contracts/cellar-store/notes.ts';
import { open } from '../store/sqlite/open.ts';
import { temporaryFolder } from '../store/sqlite/temporary-folder.ts';

const options = {
  now: () => 0,
  report: (damage: unknown): never => {
    throw damage;
  },
};

test('a rebuild says whether what was kept of the vessels differed from the log, and mends it', async () => {
  const dataFile = join(temporaryFolder(), 'cellar.db');
  const store = await open(dataFile);
  await noteIn(store, note(1, { vessels: ['tank 4', 'tank 9'] }));
  await store.close();
  const same = 'cellar 1: 2 vessels derived anew from the log; none differed from what was kept.';
  expect(await rebuildData(dataFile, options)).toBe(same);
  const somebody = new DatabaseSync(dataFile);
  somebody.exec("update vessel set state = json_set(state, '$.since', 7) where vessel = 'tank 9'");
  somebody.close();
  expect(await rebuildData(dataFile, options)).toBe(
    'cellar 1: 2 vessels derived anew from the log; 1 differed from what was kept, and are mended: tank 9.',
  );
  expect(await rebuildData(dataFile, options)).toBe(same);
});

test('an empty file has no cellar, and a missing one is not made', async () => {
  const dataFile = join(temporaryFolder(), 'cellar.db');
  await expect(rebuildData(dataFile, options)).rejects.toThrow(
    /^There is no .*cellar\.db: check DATA_FILE\.$/,
  );
  expect(existsSync(dataFile)).toBe(false);
  await (await open(dataFile)).close();
  expect(await rebuildData(dataFile, options)).toBe(`There is no cellar in ${dataFile} yet.`);
});
