import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from 'vitest';

import { runStorm } from '../../soak/telegram/run-storm.ts';
import { TOKEN } from './token.ts';

test('a storm with two minutes without the platform: all is answered in order, noted once, and said twice only where a receipt was lost', async () => {
  const folder = mkdtempSync(join(tmpdir(), 'brimnote-storm-'));
  try {
    const plan = { updates: 240, chats: 24, second_ms: 10 };
    const { repeated, receiptsLost, logged, ...counts } = await runStorm(join(folder, 'cellar.db'), plan);
    const fine = { unanswered: 0, outOfOrder: 0, doubled: 0, left: 0, broken: [] };
    expect(counts).toEqual({ answered: 240, entries: 240, ...fine });
    expect(receiptsLost).toBeGreaterThan(0);
    expect(repeated).toBeLessThanOrEqual(receiptsLost);
    expect(logged).not.toContain(TOKEN.slice(TOKEN.indexOf(':') + 1));
  } finally {
    rmSync(folder, { recursive: true });
  }
}, 60_000);
