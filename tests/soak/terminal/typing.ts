import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as wait } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';

/** Whoever says nothing for so long is at fault. */
const SILENCE_ms = 20_000;

const path = (name: string): string => fileURLToPath(new URL(`../../../src/${name}`, import.meta.url));

/** The program in a pipe: what is typed goes in, and what it says can be waited for. */
export class Typing {
  readonly #child: ChildProcess;
  readonly #ended: Promise<unknown>;
  #said = '';
  #seen = 0;
  #wake = (): void => undefined;
  /** Whether it has ended and all that it said was heard. */
  isOver = false;
  /** What it tells whoever runs it. */
  complaints = '';

  /** @param file the cellar's file */
  constructor(file: string, cwd = process.cwd()) {
    const env = { PATH: process.env['PATH'], DATA_FILE: file };
    this.#child = spawn(process.execPath, [path('main.ts')], { stdio: 'pipe', env, cwd });
    this.#ended = once(this.#child, 'close').then(() => {
      this.isOver = true;
      this.#wake();
    });
    this.#child.stdout?.on('data', (chunk: Buffer) => {
      this.#said += chunk.toString();
      this.#wake();
    });
    this.#child.stderr?.on('data', (chunk: Buffer) => (this.complaints += chunk.toString()));
    // Whoever is killed reads no more.
    this.#child.stdin?.on('error', () => undefined);
  }

  type(text: string): void {
    this.#child.stdin?.write(`${text}\n\n`);
  }

  /** What was said since the last thing that was heard; undefined while it was not. */
  hears(what: RegExp): string | undefined {
    const rest = this.#said.slice(this.#seen).replaceAll('\u202f', ' ');
    const match = what.exec(rest);
    if (match === null) return undefined;
    this.#seen += match.index + match[0].length;
    return match[0];
  }

  /**
   * Resolves when something more was said, or all is over.
   *
   * @throws Error where nothing is said for long
   */
  async more(): Promise<void> {
    if (this.isOver) return;
    const said = new Promise<boolean>((resolve) => (this.#wake = () => resolve(true)));
    if (await Promise.race([said, wait(SILENCE_ms, false, { ref: false })])) return;
    await this.kill();
    throw new Error(`silence after: ${this.#said.slice(this.#seen)}`);
  }

  async kill(): Promise<void> {
    this.#child.kill('SIGKILL');
    await this.#ended;
  }

  /** Ends the input, and gives the exit status. */
  async end(): Promise<number | null> {
    this.#child.stdin?.end();
    await this.#ended;
    return this.#child.exitCode;
  }
}

/** Runs a program of ours to its end; gives what it says. */
export async function runProgram(
  name: 'main.ts' | 'ask.ts',
  args: readonly string[],
  { dataFile, input = '' }: { readonly dataFile?: string; readonly input?: string } = {},
): Promise<string> {
  const env = { PATH: process.env['PATH'], ...(dataFile !== undefined && { DATA_FILE: dataFile }) };
  const child = spawn(process.execPath, [path(name), ...args], { stdio: ['pipe', 'pipe', 'inherit'], env });
  let said = '';
  child.stdout.on('data', (chunk: Buffer) => (said += chunk.toString()));
  child.stdin.end(input);
  const [status] = (await once(child, 'close')) as [number | null];
  if (status !== 0) throw new Error(`${name} ${args.join(' ')} ended with ${status}: ${said}`);
  return said;
}
