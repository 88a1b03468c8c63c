/** The gate: format, lint, types, house rules and tests. Its last line is `N passed, N failed`. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { count } from './count.ts';
import type { Count } from './count.ts';
import { runPart } from './part.ts';
import type { Part } from './part.ts';

const reports = mkdtempSync(join(tmpdir(), 'brimnote-gate-'));

function vitest(name: string, ...chosen: string[]): Part {
  const countsFile = join(reports, `${name.replace(' ', '-')}.json`);
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${countsFile}`];
  const args = ['run', '--config', '.ci/vitest.config.ts', '--root', '.', ...reporters, ...chosen];
  return { name, command: 'vitest', args, countsFile };
}

// Two lanes side by side, for two cores; the second is the long one.
const LANES: readonly (readonly Part[])[] = [
  [
    { name: 'format', command: 'prettier', args: ['--check', '--log-level', 'warn', '.'] },
    { name: 'lint', command: 'oxlint', args: ['--deny-warnings', 'src', 'tests', '.ci'] },
    { name: 'types', command: 'tsc', args: ['-p', '.'] },
    vitest('house rules', 'tests/house/'),
  ],
  [vitest('tests', '--exclude', 'tests/house/**')],
];

async function runLane(lane: readonly Part[]): Promise<Count[]> {
  const counts: Count[] = [];
  for (const part of lane) {
    const outcome = await runPart(part);
    const { passed, failed } = count(part, outcome);
    const mark = failed === 0 ? 'ok  ' : 'FAIL';
    const tests = part.countsFile === undefined ? '' : `  ${passed} passed, ${failed} failed`;
    process.stdout.write(
      `${mark} ${part.name.padEnd(12)} ${outcome.seconds.toFixed(1).padStart(6)} s${tests}\n`,
    );
    if (failed > 0) process.stdout.write(`${outcome.output.trimEnd()}\n\n`);
    counts.push({ passed, failed });
  }
  return counts;
}

const counts = (await Promise.all(LANES.map(runLane))).flat();
rmSync(reports, { recursive: true, force: true });
const passed = counts.reduce((sum, one) => sum + one.passed, 0);
const failed = counts.reduce((sum, one) => sum + one.failed, 0);
process.stdout.write(`${passed} passed, ${failed} failed\n`);
process.exitCode = failed > 0 ? 1 : 0;
