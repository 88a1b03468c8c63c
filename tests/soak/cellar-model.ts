/**
 * `node tests/soak/cellar-model.ts [RUNS] [SEED]`: a cellar's life played by the program and by the plain rules; every
 * twentieth in a file. Stops at the first that differs, made as short as it goes.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import fc from 'fast-check';
import { anyLife } from '../properties/cellar-model/commands.ts';
import { playLife } from '../properties/cellar-model/play-life.ts';

const [runs = 10_000, seed = Date.now() % 1_000_000] = process.argv.slice(2).map(Number);
const IN_A_FILE = 20;

const folder = mkdtempSync(join(tmpdir(), 'brimnote-model-'));
const file = join(folder, 'cellar.db');
const inFiles = Math.floor(runs / IN_A_FILE);
const begun = performance.now();
let isFine = true;
for (const [where, numRuns] of [
  [undefined, runs - inFiles],
  [file, inFiles],
] as const) {
  if (!isFine || numRuns === 0) continue;
  const details = await fc.check(
    fc.asyncProperty(anyLife, (life) => playLife(life, where)),
    { numRuns, seed },
  );
  isFine = !details.failed;
  if (!details.failed) continue;
  const { errorInstance: error } = details;
  process.stdout.write(
    `${fc.defaultReportMessage(details)}\n${error instanceof Error ? error.message : ''}\n`,
  );
}
rmSync(folder, { recursive: true });
const seconds = Math.round((performance.now() - begun) / 1000);
const result = isFine ? 'no difference' : 'a difference';
process.stdout.write(
  `model: seed ${seed}, ${runs} runs, ${inFiles} of them in a file, ${seconds} s: ${result}\n`,
);
process.exitCode = isFine ? 0 : 1;
