import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';
import { countTraces, readLog } from './count-traces.ts';
import { asTyped, roundOf, type Typed } from './stream.ts';

/** What came of lines that were fed again from the first one after each kill. */
export interface AskKillCounts {
  readonly lines: number;
  readonly answered: number;
  readonly missing: readonly string[];
  readonly doubled: readonly string[];
  readonly strange: readonly string[];
}

const ASK = fileURLToPath(new URL('../../../src/ask.ts', import.meta.url));
const AHEAD = 12;
const LONGEST_LIFE_ms = 1500;
const BEGIN = Date.UTC(2026, 9, 5, 6);

/**
 * Feeds the same lines to `ask --jsonl --data` again and again, each time from the first one, and kills it at some moment;
 * at last lets it come to the end. Every line has an id, so that all is there once, also what is undone and struck.
 */
export async function askKillRounds(
  file: string,
  { kills, rounds }: { readonly kills: number; readonly rounds: number },
): Promise<AskKillCounts> {
  const stream = Array.from({ length: rounds }, (_, round) => roundOf(round)).flat();
  let answered = 0;
  for (let kill = 1; kill <= kills; kill += 1)
    answered += await feed(file, stream, Math.random() * LONGEST_LIFE_ms);
  answered += await feed(file, stream);
  const traces = countTraces(await readLog(file));
  const sent = new Set(stream.map(({ trace }) => trace));
  return {
    lines: stream.length,
    answered,
    missing: [...sent].filter((trace) => !traces.has(trace)),
    doubled: [...traces].flatMap(([trace, count]) => (count > 1 ? [trace] : [])),
    strange: [...traces.keys()].filter((trace) => !sent.has(trace)),
  };
}

/** Feeds lines until all are answered, or for so long after the first answer; gives how many were answered. */
async function feed(file: string, stream: readonly Typed[], life_ms?: number): Promise<number> {
  const child = spawn(process.execPath, [ASK, '--jsonl', '--data', file], {
    stdio: ['pipe', 'pipe', 'inherit'],
  });
  child.stdin.on('error', () => undefined);
  const closed = once(child, 'close');
  const entries = new Map<number, number>();
  let fed = 0;
  let answered = 0;
  const feedMore = (): void => {
    for (; fed < stream.length && fed - answered < AHEAD; fed += 1) {
      const text = asTyped(stream[fed]!, entries);
      if (text === undefined) return;
      const at = new Date(BEGIN + fed * 1000).toISOString();
      child.stdin.write(`${JSON.stringify({ id: String(fed), chat: 'one', person: 'Ana', at, text })}\n`);
    }
    if (fed === stream.length) child.stdin.end();
  };
  feedMore();
  for await (const line of createInterface({ input: child.stdout })) {
    const { reply = '' } = JSON.parse(line) as { reply?: string };
    const [, mass_g] = /^added ([\d.]+) g/.exec(stream[answered]!.text) ?? [];
    const [, entry] = /oted (?:as )?(\d+)/.exec(reply) ?? [];
    if (mass_g !== undefined && entry !== undefined) entries.set(Number(mass_g), Number(entry));
    answered += 1;
    if (answered === 1 && life_ms !== undefined) setTimeout(() => child.kill('SIGKILL'), life_ms);
    feedMore();
  }
  await closed;
  return answered;
}
