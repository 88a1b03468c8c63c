import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import { expect } from 'vitest';
import type { CellarStore } from '../../../../src/core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../../src/core/cellar/entry.ts';
import { openSqliteReader } from '../../../../src/edge/store/sqlite/open-sqlite-reader.ts';
import { openSqliteStore } from '../../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { numbersOf } from '../../../contracts/cellar-store/notes.ts';
import { plainVessels } from '../../../contracts/cellar-store/plain-vessels.ts';

const CHILD = fileURLToPath(new URL('writing-child.ts', import.meta.url));
const LONGEST_ms = 150;

/** Starts a process that writes, and kills it after a while; gives back the keys that it said were durable. */
export async function killOne(path: string, run: string): Promise<readonly string[]> {
  const child = spawn(process.execPath, [CHILD, path, run], { stdio: ['ignore', 'pipe', 'inherit'] });
  let said = '';
  let timer: NodeJS.Timeout | undefined;
  child.stdout.on('data', (chunk: Buffer) => {
    said += chunk.toString();
    timer ??= setTimeout(() => child.kill('SIGKILL'), Math.random() * LONGEST_ms);
  });
  const [, signal] = (await once(child, 'close')) as [number | null, string | null];
  expect(signal).toBe('SIGKILL');
  // The last line may be cut; whoever reads half of it was not told.
  return said.split('\n').slice(0, -1);
}

/** Kills a writing process so many times, looking at the file after each; gives back how many keys were acknowledged. */
export async function killRounds(path: string, rounds: number): Promise<number> {
  const acknowledged: string[] = [];
  for (let round = 1; round <= rounds; round += 1) {
    acknowledged.push(...(await killOne(path, `run ${round}`)));
    // A reader comes first: it finds the file as the killed one left it.
    const reader = await openSqliteReader(path, { now: () => 0 });
    expectEntries(await reader.look('cellar 1', (view) => view.entries({})), acknowledged);
    await reader.close();
    const store = await openSqliteStore(path, {
      now: () => 0,
      report: (damage) => expect(damage).toBeUndefined(),
    });
    await expectAll(store, acknowledged);
    await store.close();
  }
  return acknowledged.length;
}

function expectEntries(log: readonly LoggedEntry[], acknowledged: readonly string[]): void {
  const keys = log.map(({ key }) => key);
  const kept = new Set(keys);
  expect(kept.size).toBe(keys.length);
  expect(acknowledged.filter((key) => !kept.has(key))).toEqual([]);
  expect(numbersOf(log).sort((one, other) => one - other)).toEqual(keys.map((_, at) => at + 1));
}

async function expectAll(store: CellarStore, acknowledged: readonly string[]): Promise<void> {
  const log = await store.look('cellar 1', (view) => view.entries({}));
  expectEntries(log, acknowledged);
  const last = log.reduce((one, other) => (one.entry > other.entry ? one : other));
  expect(await store.look('cellar 1', (view) => view.kept('last'))).toBe(last.key);
  const vessels = await store.look('cellar 1', (view) => view.vessels());
  expect(vessels).toEqual(plainVessels(log));
  expect(await store.rebuild('cellar 1')).toEqual({ vessels: vessels.length, differed: [] });
}
