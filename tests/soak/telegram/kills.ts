/** `node tests/soak/telegram/kills.ts`: 25 kills under 5,000 updates, polling and with a webhook. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { killRounds } from './kill-rounds.ts';

const [kills = 25, updates = 5000] = process.argv.slice(2).map(Number);

for (const mode of ['polling', 'webhook'] as const) {
  const folder = mkdtempSync(join(tmpdir(), 'brimnote-kills-'));
  const begun = performance.now();
  const { broken, ...counts } = await killRounds(join(folder, 'cellar.db'), {
    kills,
    updates,
    chats: 50,
    mode,
  });
  const seconds = Math.round((performance.now() - begun) / 1000);
  process.stdout.write(
    `${mode}: ${kills} kills, ${updates} updates, ${seconds} s: ${JSON.stringify(counts)}\n`,
  );
  for (const line of broken) process.stdout.write(`  ${line}\n`);
  const { answered, entries, unanswered, doubled, left, differed, mostRepeated } = counts;
  const isRight = answered === updates && entries === updates && unanswered + doubled + left + differed === 0;
  if (!isRight || mostRepeated > 1 || broken.length > 0) process.exitCode = 1;
  rmSync(folder, { recursive: true });
}
