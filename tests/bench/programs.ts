import { spawn } from 'node:child_process';

/** How a run of `ask` went. */
export interface Run {
  readonly milliseconds: number;
  readonly lines: number;
}

/** Runs `ask` with some arguments and an input, and counts the lines it answers with. */
export function runAsk(args: readonly string[], input = ''): Promise<Run> {
  const begun = performance.now();
  return new Promise((done, fail) => {
    const child = spawn(process.execPath, ['src/ask.ts', ...args], { stdio: ['pipe', 'pipe', 'inherit'] });
    let lines = 0;
    child.stdout.on('data', (chunk: Buffer) => (lines += chunk.toString().split('\n').length - 1));
    child.on('error', fail);
    child.on('close', (status) => {
      if (status === 0) done({ milliseconds: performance.now() - begun, lines });
      else fail(new Error(`ask ended with status ${status}`));
    });
    child.stdin.end(input);
  });
}
