import { closeSync, openSync, readFileSync, statSync, truncateSync, writeFileSync, writeSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { expect, test, vi } from 'vitest';
import { OperatorError } from '../../../../src/edge/operator-error.ts';
import { openSqliteStore } from '../../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { note, noteIn, write } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

/** A file with some hundreds of entries that nobody has open. */
async function filled(): Promise<string> {
  const path = join(temporaryFolder(), 'cellar.db');
  const store = await open(path);
  await noteIn(store, ...Array.from({ length: 400 }, (_, at) => note(at, { vessels: [`tank ${at % 9}`] })));
  await store.close();
  return path;
}

function overwrite(path: string, share: number): void {
  const file = openSync(path, 'r+');
  writeSync(file, Buffer.alloc(5000, 0xa5), 0, 5000, Math.floor(statSync(path).size * share));
  closeSync(file);
}

test.each<[string, (path: string) => void]>([
  ['has rubbish in its midst', (path) => overwrite(path, 0.5)],
  ['has rubbish at its beginning', (path) => overwrite(path, 0)],
  ['is cut short', (path) => truncateSync(path, Math.floor(statSync(path).size / 2))],
  ['is no such file at all', (path) => writeFileSync(path, 'entries of the cellar\n'.repeat(99))],
])('a file that %s is refused with a sentence that names a way out, and left as it is', async (_, damage) => {
  const path = await filled();
  damage(path);
  const before = readFileSync(path);
  const attempt = open(path);
  await expect(attempt).rejects.toBeInstanceOf(OperatorError);
  await expect(attempt).rejects.toThrow(
    /cellar\.db is damaged \(.+\)\. It is left as it is.* npm run restore -- BACKUP/,
  );
  expect(readFileSync(path)).toEqual(before);
});

test('a file that is gone while its log of writes lies there is not begun anew', async () => {
  const path = await filled();
  writeFileSync(`${path}-wal`, 'what was written last');
  truncateSync(path);
  await expect(open(path)).rejects.toThrow(/is empty or missing while .*-wal still holds/);
  expect(readFileSync(`${path}-wal`, 'utf8')).toBe('what was written last');
});

test('a large file is checked while the store serves already; when it is damaged nothing is written any more', async () => {
  const path = await filled();
  const large = await open(path);
  await write(large, { kind: 'keep', key: 'large', text: 'x'.repeat(70_000_000) });
  await large.close();
  overwrite(path, 0.5);
  const report = vi.fn<(damage: OperatorError) => void>();
  const store = await openSqliteStore(path, { now: () => 0, report });
  expect(await store.look('cellar 1', (view) => view.nextEntry())).toBe(401);
  while (report.mock.calls.length === 0) await pause(20);
  expect(report.mock.calls[0]?.[0].message).toMatch(/cellar\.db is damaged/);
  await expect(noteIn(store, note(1000))).rejects.toMatchObject({ name: 'StoreError', kind: 'damaged' });
  expect(await store.look('cellar 1', (view) => view.nextEntry())).toBe(401);
  await store.close();
});

test('what is damaged while the store is open is a StoreError for who reads it', async () => {
  const path = await filled();
  const store = await open(path);
  for (const share of [0.2, 0.4, 0.6, 0.8]) overwrite(path, share);
  const looking = store.look('cellar 1', (view) => view.entries({}));
  await expect(looking).rejects.toMatchObject({ name: 'StoreError', kind: 'damaged' });
  await store.close();
});
