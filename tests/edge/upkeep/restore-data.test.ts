import {
  copyFileSync,
  existsSync,
  readdirSync,
  readFileSync,
  symlinkSync,
  truncateSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { restoreData } from '../../../src/edge/upkeep/restore-data.ts';
import { allEntries, note, noteIn, numbersOf } from '../../contracts/cellar-store/notes.ts';
import { open } from '../store/sqlite/open.ts';
import { temporaryFolder } from '../store/sqlite/temporary-folder.ts';

const now = Date.parse('2026-12-01T17:03:58Z');
const UNTIL = 'cellar-until-2026-12-01-17-03-58.db';

/** A cellar's file with two entries, and a backup of it from when it had one. */
async function cellarWithBackup(): Promise<{ folder: string; dataFile: string; copy: string }> {
  const folder = temporaryFolder();
  const [dataFile, copy] = [join(folder, 'cellar.db'), join(folder, 'copy.db')];
  const store = await open(dataFile);
  await noteIn(store, note(1));
  await store.backup(copy);
  await noteIn(store, note(2));
  await store.close();
  return { folder, dataFile, copy };
}

async function entriesIn(path: string): Promise<number[]> {
  const store = await open(path);
  try {
    return numbersOf(await allEntries(store));
  } finally {
    await store.close();
  }
}

test('a backup takes the place of the file, which is kept beside it under a name that is told', async () => {
  const { folder, dataFile, copy } = await cellarWithBackup();
  const told = await restoreData({ copy, dataFile, now });
  expect(told).toBe(
    `${dataFile} is now what ${copy} holds.\nThe former one is ${join(folder, UNTIL)}: nothing reads it any more.`,
  );
  expect(await entriesIn(dataFile)).toEqual([1]);
  expect(await entriesIn(join(folder, UNTIL))).toEqual([1, 2]);
});

test('what a killed program had written last goes with the former file', async () => {
  const { folder, dataFile, copy } = await cellarWithBackup();
  const store = await open(dataFile);
  await noteIn(store, note(3));
  // As a kill leaves it: the file and its log of writes, not yet joined.
  for (const part of ['', '-wal']) copyFileSync(`${dataFile}${part}`, join(folder, `killed.db${part}`));
  await store.close();
  await restoreData({ copy, dataFile: join(folder, 'killed.db'), now });
  expect(await entriesIn(join(folder, 'killed.db'))).toEqual([1]);
  expect(await entriesIn(join(folder, UNTIL.replace('cellar', 'killed')))).toEqual([1, 2, 3]);
});

test('where there was no file, none is told of', async () => {
  const { folder, copy } = await cellarWithBackup();
  const dataFile = join(folder, 'new', 'place.db');
  expect(await restoreData({ copy, dataFile, now })).toBe(`${dataFile} is now what ${copy} holds.`);
  expect(await entriesIn(dataFile)).toEqual([1]);
});

test('a damaged file makes room, and stays as it is', async () => {
  const { folder, dataFile, copy } = await cellarWithBackup();
  writeFileSync(dataFile, 'no cellar'.repeat(1000));
  await restoreData({ copy, dataFile, now });
  expect(await entriesIn(dataFile)).toEqual([1]);
  expect(readFileSync(join(folder, UNTIL), 'utf8')).toBe('no cellar'.repeat(1000));
});

test('while another program writes, also by way of a link, nothing is changed', async () => {
  const { folder, dataFile, copy } = await cellarWithBackup();
  const link = join(folder, 'link.db');
  symlinkSync(dataFile, link);
  const store = await open(dataFile);
  for (const path of [dataFile, link])
    await expect(restoreData({ copy, dataFile: path, now })).rejects.toThrow(/Another brimnote is writing/);
  await store.close();
  expect(readdirSync(folder).filter((name) => name.includes('until'))).toEqual([]);
  expect(await entriesIn(dataFile)).toEqual([1, 2]);
});

test.each<[string, (copy: string) => void, RegExp]>([
  ['is no cellar file', (copy) => writeFileSync(copy, 'no cellar'.repeat(1000)), /copy\.db is damaged/],
  ['has lost its end', (copy) => truncateSync(copy, 8192), /copy\.db is damaged/],
  ['is empty', (copy) => truncateSync(copy, 0), /copy\.db is damaged \(there is nothing in it\)/],
  [
    'is of a newer version',
    (copy) => {
      const connection = new DatabaseSync(copy);
      connection.exec('pragma user_version = 99');
      connection.close();
    },
    /newer/,
  ],
])('a backup that %s changes nothing', async (_, spoil, sentence) => {
  const { folder, dataFile, copy } = await cellarWithBackup();
  spoil(copy);
  await expect(restoreData({ copy, dataFile, now })).rejects.toThrow(sentence);
  expect(existsSync(join(folder, UNTIL))).toBe(false);
  expect(await entriesIn(dataFile)).toEqual([1, 2]);
});

test('neither a missing backup nor the file itself is one', async () => {
  const { folder, dataFile } = await cellarWithBackup();
  const absent = restoreData({ copy: join(folder, 'absent.db'), dataFile, now });
  await expect(absent).rejects.toThrow(/^There is no .*absent\.db: name a backup\.$/);
  await expect(restoreData({ copy: dataFile, dataFile, now })).rejects.toThrow(/is the cellar's file itself/);
  expect(await entriesIn(dataFile)).toEqual([1, 2]);
});

test('two restores in one second do not lose the first of the former files', async () => {
  const { folder, dataFile, copy } = await cellarWithBackup();
  await restoreData({ copy, dataFile, now });
  await expect(restoreData({ copy, dataFile, now })).rejects.toThrow(/There is something at/);
  expect(await entriesIn(join(folder, UNTIL))).toEqual([1, 2]);
  expect(await entriesIn(dataFile)).toEqual([1]);
});
