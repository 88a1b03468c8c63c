import { enableCompileCache } from 'node:module';

// As in main.ts: what was compiled is kept between runs.
enableCompileCache();
const { resolveOwnFiles } = await import('./edge/resolve-own-files.ts');
resolveOwnFiles();

const { runAsk } = await import('./edge/ask/run-ask.ts');

process.exitCode = await runAsk({
  args: process.argv.slice(2),
  input: process.stdin,
  output: process.stdout,
  tell: (sentence) => void process.stderr.write(`${sentence}\n`),
  now: () => Date.now(),
});
