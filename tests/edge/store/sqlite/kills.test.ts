import { join } from 'node:path';
import { expect, test } from 'vitest';
import { killRounds } from './kill-rounds.ts';
import { temporaryFolder } from './temporary-folder.ts';

test('a process that is killed while it writes loses no acknowledged entry, doubles none, and leaves no lock', async () => {
  expect(await killRounds(join(temporaryFolder(), 'cellar.db'), 4)).toBeGreaterThan(0);
});
