/** `node tests/soak/terminal/kills.ts [KILLS]`: the program in a pipe, killed while somebody types. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { askKillRounds } from './ask-kill-rounds.ts';
import { killRounds } from './kill-rounds.ts';

const [kills = 50] = process.argv.slice(2).map(Number);
const folder = mkdtempSync(join(tmpdir(), 'brimnote-kills-'));
const ROUNDS_ASKED = 40;
const begun = performance.now();
const counts = await killRounds(join(folder, 'cellar.db'), kills);
const seconds = Math.round((performance.now() - begun) / 1000);
const { acknowledged, durableUnsaid, ...wrong } = counts;
process.stdout.write(
  `terminal: ${kills} kills, ${acknowledged} acknowledged, ${durableUnsaid} durable but unsaid, ` +
    `${wrong.lost.length} lost, ${wrong.doubled.length} doubled, ${wrong.strange.length} strange, ` +
    `${wrong.differed.length} rebuilds that differed, ${seconds} s\n`,
);
const found = [...wrong.lost, ...wrong.doubled, ...wrong.strange, ...wrong.differed];

const asked = await askKillRounds(join(folder, 'asked.db'), { kills, rounds: ROUNDS_ASKED });
const { missing, doubled, strange } = asked;
process.stdout.write(
  `ask --jsonl: ${kills} kills, ${asked.lines} lines from the first one each time, ${asked.answered} answered, ` +
    `${missing.length} missing, ${doubled.length} doubled, ${strange.length} strange\n`,
);
found.push(...missing, ...doubled, ...strange);
rmSync(folder, { recursive: true });
for (const one of found) process.stdout.write(`  ${one}\n`);
process.exitCode = found.length === 0 && acknowledged > kills ? 0 : 1;
