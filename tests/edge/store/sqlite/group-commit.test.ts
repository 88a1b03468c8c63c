import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setImmediate as nextTurnOfTheLoop } from 'node:timers/promises';
import { expect, test } from 'vitest';
import { createGroupCommit, type CommitConnection } from '../../../../src/edge/store/sqlite/group-commit.ts';
import { note, noteIn, writeOf } from '../../../contracts/cellar-store/notes.ts';
import { open } from './open.ts';
import { temporaryFolder } from './temporary-folder.ts';

/** A connection that only remembers what it was told, and fails when it is told to. */
function connection(
  fails: (sql: string) => boolean = () => false,
): CommitConnection & { readonly told: string[] } {
  const told: string[] = [];
  let isTransaction = false;
  return {
    told,
    get isTransaction() {
      return isTransaction;
    },
    exec: (sql) => {
      told.push(sql);
      if (fails(sql)) throw Object.assign(new Error('full'), { errcode: 13 });
      if (sql.startsWith('begin')) isTransaction = true;
      if (['commit', 'rollback'].includes(sql)) isTransaction = false;
    },
  };
}

const SET = ['savepoint write_set', 'release write_set'];

test('write sets of one turn of the event loop are committed together, later ones apart', async () => {
  const to = connection();
  const commits = createGroupCommit(to);
  const batches = await Promise.all([1, 2, 3].map(() => commits.write(async () => undefined)));
  expect(to.told).toEqual(['begin immediate', ...SET, ...SET, ...SET]);
  await Promise.all(batches.map(({ durable }) => durable));
  await (
    await commits.write(async () => undefined)
  ).durable;
  expect(to.told.slice(7)).toEqual(['commit', 'begin immediate', ...SET, 'commit']);
});

test('a write set that fails is taken back alone', async () => {
  const to = connection();
  const commits = createGroupCommit(to);
  const good = commits.write(async () => undefined);
  await expect(commits.write(() => Promise.reject(new RangeError('two of one key')))).rejects.toThrow(
    RangeError,
  );
  await (
    await good
  ).durable;
  const back = ['savepoint write_set', 'rollback to write_set', 'release write_set'];
  expect(to.told).toEqual(['begin immediate', ...SET, ...back, 'commit']);
});

test('a commit never falls into a write set that takes its time', async () => {
  const to = connection();
  const commits = createGroupCommit(to);
  const first = await commits.write(async () => undefined);
  const slow = commits.write(async () => {
    await nextTurnOfTheLoop();
    await nextTurnOfTheLoop();
    to.told.push('slow');
  });
  await Promise.all([first.durable, slow]);
  expect(to.told).toEqual(['begin immediate', ...SET, SET[0], 'slow', SET[1], 'commit']);
});

test('when the commit fails, all of the batch are told and nothing is kept; the next batch may do better', async () => {
  let isFull = true;
  const to = connection((sql) => sql === 'commit' && isFull);
  const commits = createGroupCommit(to);
  const batches = await Promise.all([1, 2].map(() => commits.write(async () => undefined)));
  for (const { durable } of batches) await expect(durable).rejects.toMatchObject({ kind: 'full' });
  for (const { check } of batches) expect(check).toThrow(/full/);
  expect(to.told.slice(5)).toEqual(['commit', 'rollback']);
  isFull = false;
  await (
    await commits.write(async () => undefined)
  ).durable;
  expect(to.told.slice(7)).toEqual(['begin immediate', ...SET, 'commit']);
});

test('when a write set takes the whole batch down with it, the others of it are told', async () => {
  const to = connection();
  const commits = createGroupCommit(to);
  const good = await commits.write(async () => undefined);
  const bad = commits.write(async () => {
    // As SQLite does on some faults of the disk.
    to.exec('rollback');
    throw Object.assign(new Error('full'), { errcode: 13 });
  });
  await expect(bad).rejects.toThrow('full');
  await expect(good.durable).rejects.toThrow('full');
  expect(commits.pending()).toBeUndefined();
});

test('a transaction that can be neither begun nor ended rejects who writes, and nobody else', async () => {
  let isFull = true;
  const to = connection((sql) => isFull && sql.startsWith('begin'));
  const commits = createGroupCommit(to);
  await expect(commits.write(async () => undefined)).rejects.toMatchObject({ kind: 'full' });
  await commits.settle();
  isFull = false;
  await (
    await commits.write(async () => undefined)
  ).durable;
  expect(commits.pending()).toBeUndefined();
});

/** Commits in a log of writes: frames that end one (https://www.sqlite.org/fileformat2.html#walformat). */
function commitsIn(wal: Buffer): number {
  const pageSize = wal.readUInt32BE(8);
  let commits = 0;
  for (let frame = 32; frame < wal.length; frame += 24 + pageSize)
    if (wal.readUInt32BE(frame + 4) > 0) commits += 1;
  return commits;
}

test('fifty turns of fifty cellars at once cost the disk one commit, and a turn that only reads none', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  const store = await open(path);
  await noteIn(store, note(1));
  const before = commitsIn(readFileSync(`${path}-wal`));
  await Promise.all(
    Array.from({ length: 50 }, (_, at) =>
      store.turn(`cellar ${at}`, async (view) => {
        await view.nextEntry();
        return { writes: [writeOf(note(at + 10))], result: undefined };
      }),
    ),
  );
  await store.turn('cellar 1', async (view) => ({ writes: [], result: await view.nextEntry() }));
  expect(commitsIn(readFileSync(`${path}-wal`)) - before).toBe(1);
  await store.close();
});
