/** A process that writes into a cellar file without end and says on stdout which keys it was told are durable. */
import { writeSync } from 'node:fs';
import type { NewEntry } from '../../../../src/core/cellar/entry.ts';
import { openSqliteStore } from '../../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { note, strike } from '../../../contracts/cellar-store/notes.ts';

const [path = '', run = ''] = process.argv.slice(2);
const STDOUT = 1;
const AT_ONCE = 3;

const store = await openSqliteStore(path, {
  now: () => Date.now(),
  report: (damage) => void process.exit(damage.exitStatus),
});

/** Readings and shared additions, some late, and every seventh takes back the one before the last. */
function next(number: number, key: string): NewEntry {
  const at = number * 1000 - (number % 5 === 0 ? 10_000 : 0);
  if (number % 7 === 0) return strike(at, number - 2, { key });
  if (number % 3 === 0)
    return note(at, { kind: 'addition', vessels: ['tank 4', 'tank 9'], mass_g: 100, key });
  return note(at, { vessels: [`tank ${number % 10}`], free_mg_L: number % 50, key });
}

async function write(lane: number): Promise<never> {
  for (let count = 0; ; count += 1) {
    const key = `${run}:${lane}:${count}`;
    await store.turn('cellar 1', async (view) => {
      const entry = next(await view.nextEntry(), key);
      const kept = { kind: 'keep', key: 'last', text: entry.key } as const;
      return { writes: [{ kind: 'entry', entry }, kept], result: undefined };
    });
    writeSync(STDOUT, `${key}\n`);
  }
}

await Promise.all(Array.from({ length: AT_ONCE }, (_, lane) => write(lane)));
