import { spawn } from 'node:child_process';
import { delimiter, dirname, join, resolve } from 'node:path';

/** One part of the gate: a name, a command of `node_modules/.bin` and its arguments. */
export interface Part {
  readonly name: string;
  readonly command: string;
  readonly args: readonly string[];
  /** Where a run of vitest writes its counts; a part without one counts as a single check. */
  readonly countsFile?: string;
}

/** How a part ended. */
export interface Outcome {
  readonly status: number;
  readonly output: string;
  readonly seconds: number;
}

const BIN = resolve('node_modules/.bin');
// The node that runs this file also runs every part, whatever the machine's own node is.
const PATH = [BIN, dirname(process.execPath), process.env['PATH'] ?? ''].join(delimiter);

/** Runs one part without a keyboard and keeps what it prints. */
export function runPart(part: Part): Promise<Outcome> {
  const begun = performance.now();
  return new Promise((done) => {
    const child = spawn(join(BIN, part.command), part.args, {
      env: { ...process.env, PATH, NO_COLOR: '1', FORCE_COLOR: undefined },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    const end = (status: number): void =>
      done({ status, output, seconds: (performance.now() - begun) / 1000 });
    child.stdout.on('data', (chunk: Buffer) => (output += chunk.toString()));
    child.stderr.on('data', (chunk: Buffer) => (output += chunk.toString()));
    child.on('error', (error) => {
      output += `${part.command}: ${error.message}\n`;
      end(1);
    });
    child.on('close', (code) => end(code ?? 1));
  });
}
