import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { symlinkSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, onTestFinished, test } from 'vitest';
import { OperatorError } from '../../../../src/edge/operator-error.ts';
import { openSqliteReader } from '../../../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { note, noteIn } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

const CHILD = fileURLToPath(new URL('holding-child.ts', import.meta.url));
const REFUSED = /OperatorError: Another brimnote is writing to .*cellar\.db: stop that one first/;

/** Starts a process that opens the file; gives back what it says. */
async function openElsewhere(path: string): Promise<{ child: ChildProcess; said: string }> {
  const child = spawn(process.execPath, [CHILD, path], { stdio: ['ignore', 'pipe', 'inherit'] });
  onTestFinished(() => void child.kill('SIGKILL'));
  const [chunk] = (await once(child.stdout, 'data')) as [Buffer];
  return { child, said: chunk.toString() };
}

test('a second process refuses to write to a file, also when it comes by a link, while the first goes on', async () => {
  const folder = temporaryFolder();
  const path = join(folder, 'cellar.db');
  const store = await open(path);
  symlinkSync(path, join(folder, 'link.db'));
  expect((await openElsewhere(path)).said).toMatch(REFUSED);
  expect((await openElsewhere(join(folder, 'link.db'))).said).toMatch(REFUSED);
  // That a second attempt in this process was refused must not open the door either.
  await expect(open(path)).rejects.toBeInstanceOf(OperatorError);
  expect((await openElsewhere(path)).said).toMatch(REFUSED);
  await noteIn(store, note(1));
  await store.close();
  expect((await openElsewhere(path)).said).toBe('held\n');
});

test('the lock goes with a process that is killed, and needs nobody to clear it away', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  const { child, said } = await openElsewhere(path);
  expect(said).toBe('held\n');
  await expect(open(path)).rejects.toThrow(/Another brimnote is writing/);
  child.kill('SIGKILL');
  await once(child, 'exit');
  await (await open(path)).close();
});

test('a reader reads beside a writer, after one that was killed, and after one that stopped', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  const store = await open(path);
  await noteIn(store, note(1));
  const read = async (): Promise<number> => {
    const reader = await openSqliteReader(path, { now: () => 0 });
    const next = await reader.look('cellar 1', (view) => view.nextEntry());
    expect(await reader.cellars()).toEqual(['cellar 1']);
    await reader.close();
    return next;
  };
  expect(await read()).toBe(2);
  await noteIn(store, note(2));
  expect(await read()).toBe(3);
  await store.close();
  expect(await read()).toBe(3);
  const { child } = await openElsewhere(path);
  child.kill('SIGKILL');
  await once(child, 'exit');
  expect(await read()).toBe(3);
});
