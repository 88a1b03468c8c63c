import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, test } from 'vitest';
import { askKillRounds } from '../../soak/terminal/ask-kill-rounds.ts';
import { killRounds } from '../../soak/terminal/kill-rounds.ts';

const folder = mkdtempSync(join(tmpdir(), 'brimnote-kills-'));
afterAll(() => rmSync(folder, { recursive: true }));

test('a program in a pipe that is killed while somebody types loses nothing it acknowledged, and going on doubles nothing', async () => {
  const { acknowledged, durableUnsaid, ...wrong } = await killRounds(join(folder, 'cellar.db'), 4);
  expect(wrong).toEqual({ kills: 4, lost: [], doubled: [], strange: [], differed: [] });
  expect(acknowledged).toBeGreaterThan(0);
  expect(durableUnsaid).toBeLessThanOrEqual(4);
}, 60_000);

test('lines with an id that are fed again from the first one after each kill are noted once each', async () => {
  const { lines, answered, ...wrong } = await askKillRounds(join(folder, 'asked.db'), {
    kills: 3,
    rounds: 10,
  });
  expect(wrong).toEqual({ missing: [], doubled: [], strange: [] });
  expect(answered).toBeGreaterThanOrEqual(lines);
}, 60_000);
