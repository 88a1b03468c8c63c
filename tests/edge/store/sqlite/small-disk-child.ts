/**
 * A process on a small disk of its own (its working directory): it fills the disk, makes room, goes on, and says on
 * stdout as JSON what came of it. Then the disk becomes read-only.
 */
import { spawnSync } from 'node:child_process';
import { rmSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import type { CellarStore } from '../../../../src/core/cellar/cellar-store.ts';
import { note, noteIn } from '../../../contracts/cellar-store/notes.ts';
import { plainVessels } from '../../../contracts/cellar-store/plain-vessels.ts';
import { open } from './open.ts';

const BALLAST_bytes = 500_000;
const AT_ONCE = 5;
const path = resolve('cellar.db');
const durable: string[] = [];
const refused: string[] = [];
const faults = new Set<string>();
let number = 0;

async function noteOne(store: CellarStore): Promise<boolean> {
  number += 1;
  const key = `key ${number}`;
  const vessels = number % 10 === 0 ? ['tank 1', 'tank 2'] : [`tank ${number % 5}`];
  return noteIn(store, note(number, { key, vessels, remark: 'x'.repeat(300) })).then(
    () => durable.push(key) > 0,
    (error: unknown) => {
      const { name, kind } = error as { name: string; kind?: string };
      faults.add(`${name} ${kind}`);
      refused.push(key);
      return false;
    },
  );
}

const noteSome = (store: CellarStore): Promise<boolean[]> =>
  Promise.all(Array.from({ length: AT_ONCE }, () => noteOne(store)));

writeFileSync('ballast', Buffer.alloc(BALLAST_bytes));
let store = await open(path);
// Smaller and smaller things still fit for a while.
while (refused.length < 50) await noteSome(store);
const readWhileFull = (await store.look('cellar 1', (view) => view.entries({ last: 3 }))).length;
rmSync('ballast');
const again = await noteSome(store);
await store.close();

store = await open(path);
const log = await store.look('cellar 1', (view) => view.entries({}));
const vessels = await store.look('cellar 1', (view) => view.vessels());
const { differed } = await store.rebuild('cellar 1');
await store.close();

const remounted = spawnSync('mount', ['-o', 'remount,ro', process.cwd()]).status === 0;
const whenReadOnly = await open(path).catch(String);

const keys = log.map(({ key }) => key);
process.stdout.write(
  JSON.stringify({
    faults: [...faults],
    readWhileFull,
    wentOn: again.every(Boolean),
    manyDurable: durable.length > 100,
    lost: durable.filter((key) => !keys.includes(key)),
    half: refused.filter((key) => keys.includes(key)),
    gaps: log.filter((entry, at) => entry.entry !== at + 1).length,
    vesselsDiffer: JSON.stringify(vessels) !== JSON.stringify(plainVessels(log)),
    differed,
    whenReadOnly: remounted ? whenReadOnly : 'not tried',
  }),
);
