import { existsSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { backupData } from '../../../src/edge/upkeep/backup-data.ts';
import { allEntries, note, noteIn, numbersOf } from '../../contracts/cellar-store/notes.ts';
import { open } from '../store/sqlite/open.ts';
import { temporaryFolder } from '../store/sqlite/temporary-folder.ts';

const now = Date.parse('2026-12-01T17:03:58Z');
const NAME = 'cellar-2026-12-01-17-03-58.db';

test('a backup is made beside a program that writes, and opens as a store', async () => {
  const folder = temporaryFolder();
  const store = await open(join(folder, 'cellar.db'));
  await noteIn(store, note(1));
  const told = await backupData(join(folder, 'cellar.db'), now);
  await noteIn(store, note(2));
  await store.close();
  expect(told).toBe(`Backup written: ${join(folder, 'backups', NAME)}`);
  const copy = await open(join(folder, 'backups', NAME));
  expect(numbersOf(await allEntries(copy))).toEqual([1]);
  await copy.close();
});

test('of a missing file, or one that is no cellar, there is none', async () => {
  const folder = temporaryFolder();
  const absent = backupData(join(folder, 'absent.db'), now);
  await expect(absent).rejects.toThrow(/^There is no .*absent\.db: check DATA_FILE\.$/);
  writeFileSync(join(folder, 'other.db'), 'no cellar'.repeat(1000));
  await expect(backupData(join(folder, 'other.db'), now)).rejects.toThrow(/other\.db is damaged/);
  expect(existsSync(join(folder, 'backups', NAME))).toBe(false);
});
