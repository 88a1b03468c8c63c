import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { OperatorError } from '../../../../src/edge/operator-error.ts';
import { openSqliteReader } from '../../../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { restoreFile } from '../../../../src/edge/store/sqlite/restore-file.ts';
import { allEntries, note, noteIn, numbersOf } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

test('a copy made while the store is written to is whole, one file, and opens as a store', async () => {
  const folder = temporaryFolder();
  const store = await open(join(folder, 'cellar.db'));
  await noteIn(store, ...Array.from({ length: 3000 }, (_, at) => note(at)));
  const copying = store.backup(join(folder, 'copy.db'));
  let done = false;
  void copying.finally(() => (done = true));
  let written = 3000;
  while (!done) await noteIn(store, note((written += 1)));
  await copying;
  expect(readdirSync(folder).filter((name) => name.startsWith('copy'))).toEqual(['copy.db']);
  const reader = await openSqliteReader(join(folder, 'copy.db'), { now: () => 0 });
  const numbers = numbersOf(await reader.look('cellar 1', (view) => view.entries({})));
  expect(numbers).toEqual(Array.from({ length: numbers.length }, (_, at) => at + 1));
  expect(numbers.length).toBeGreaterThanOrEqual(3000);
  expect(readdirSync(folder).filter((name) => name.startsWith('copy'))).toEqual(['copy.db']);
  await reader.close();
  await store.close();
  const restored = await open(join(folder, 'copy.db'));
  expect((await restored.rebuild('cellar 1')).differed).toEqual([]);
  await noteIn(restored, note(5000));
  await restored.close();
});

test('a copy never takes the place of anything', async () => {
  const folder = temporaryFolder();
  const store = await open(join(folder, 'cellar.db'));
  writeFileSync(join(folder, 'there.txt'), 'dear to somebody');
  for (const name of ['there.txt', 'cellar.db', '.']) {
    const attempt = store.backup(join(folder, name));
    await expect(attempt).rejects.toBeInstanceOf(OperatorError);
    await expect(attempt).rejects.toThrow(/There is something at .* already/);
  }
  expect(readFileSync(join(folder, 'there.txt'), 'utf8')).toBe('dear to somebody');
  await noteIn(store, note(1));
  await store.close();
});

test('a copy that cannot be made leaves nothing behind', async () => {
  const folder = temporaryFolder();
  const store = await open(join(folder, 'cellar.db'));
  const attempt = store.backup(join(folder, 'absent', 'copy.db'));
  await expect(attempt).rejects.toThrow(/copy\.db cannot be opened .*folder/);
  expect(existsSync(join(folder, 'absent'))).toBe(false);
  await store.close();
});

test('a copy takes the place of a file that is gone, and nothing else', async () => {
  const folder = temporaryFolder();
  const [path, copy] = [join(folder, 'cellar.db'), join(folder, 'copy.db')];
  const store = await open(path);
  await noteIn(store, note(1), note(2));
  await store.backup(copy);
  await expect(restoreFile(copy, path)).rejects.toThrow(/Another brimnote is writing/);
  await store.close();
  await expect(restoreFile(copy, path)).rejects.toThrow(/There is something at .*cellar\.db already/);
  rmSync(path);
  writeFileSync(`${path}-wal`, 'of the former file');
  await expect(restoreFile(copy, path)).rejects.toThrow(
    /cellar\.db is damaged \(it is empty or missing while/,
  );
  rmSync(`${path}-wal`);
  writeFileSync(join(folder, 'other.txt'), 'no cellar'.repeat(100));
  await expect(restoreFile(join(folder, 'other.txt'), path)).rejects.toThrow(/other\.txt is damaged/);
  await expect(restoreFile(join(folder, 'absent.db'), path)).rejects.toThrow(/absent\.db cannot be opened/);
  expect(existsSync(path)).toBe(false);
  await restoreFile(copy, path);
  const again = await open(path);
  expect(numbersOf(await allEntries(again))).toEqual([1, 2]);
  await again.close();
});
