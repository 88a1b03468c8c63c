import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from 'vitest';

import { killRounds } from '../../soak/telegram/kill-rounds.ts';

test.each(['polling', 'webhook'] as const)(
  'a bot that is killed again and again while it works by %s answers everything, notes everything once, and repeats in a chat at most what was on its way',
  async (mode) => {
    const folder = mkdtempSync(join(tmpdir(), 'brimnote-kills-'));
    try {
      const plan = { kills: 3, updates: 200, chats: 10, mode };
      const { repeated, mostRepeated, ...counts } = await killRounds(join(folder, 'cellar.db'), plan);
      const fine = { unanswered: 0, doubled: 0, left: 0, differed: 0, broken: [] };
      expect(counts).toEqual({ answered: 200, entries: 200, ...fine });
      expect(mostRepeated).toBeLessThanOrEqual(1);
      expect(repeated).toBeLessThanOrEqual(plan.kills * plan.chats);
    } finally {
      rmSync(folder, { recursive: true });
    }
  },
  // Each process takes a while to start on a machine that has other things to do.
  240_000,
);
