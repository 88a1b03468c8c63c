import { join } from 'node:path';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { temporaryFolder } from '../edge/store/sqlite/temporary-folder.ts';
import { anyLife } from './cellar-model/commands.ts';
import { playLife } from './cellar-model/play-life.ts';

const RUNS = 150;

test('whatever is noted, struck, moved, read, claimed, ordered or delivered again, the cellar is as the plain rules have it', async () => {
  await fc.assert(
    fc.asyncProperty(anyLife, (life) => playLife(life)),
    // The same lives every time: the gate does not wander, `npm run soak` does.
    { numRuns: RUNS, seed: 20_261_201 },
  );
});

test('so it is where the cellar is a file and the program is ended and begun again', async () => {
  const file = join(temporaryFolder(), 'cellar.db');
  await fc.assert(
    fc.asyncProperty(anyLife, (life) => playLife(life, file)),
    { numRuns: RUNS / 10, seed: 20_261_202 },
  );
  expect(true).toBe(true);
});
