import { fork, spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

import type { Offer, Outcome } from './platform-process.ts';

/** Which bot. */
export type BotName = 'bare' | 'ours' | 'ours within limits';

/** A platform and a bot, each a process of its own. */
export interface Running {
  /** From the start of the process to its first answer. */
  readonly cold_ms: number;
  readonly offer: (
    offer: Offer,
  ) => Promise<Outcome & { readonly cpu_ms: number; readonly memory_MB: number }>;
  /** Lines of the bot's log so far. */
  readonly logged: string[];
  /** Ends both; `look` may read the cellar's file in between. */
  readonly stop: (look?: (file: string) => Promise<void>) => Promise<void>;
}

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));
/** As `npm start` does. */
const AS_STARTED = ['--max-semi-space-size=8'];
const WARM_UP: Offer = { updates: 1, chats: 1, texts: ['thanks'] };
/** The kernel counts processor time in hundredths of a second. */
const TICK_MS = 10;

/** Starts both, and waits for the first answer. */
export async function startBot(name: BotName): Promise<Running> {
  const platform = fork(here('platform-process.ts'));
  const [port] = (await once(platform, 'message')) as [number];
  const folder = mkdtempSync(join(tmpdir(), 'brimnote-bench-'));
  const root = `http://127.0.0.1:${port}`;
  const ask = async (offer: Offer): Promise<Outcome> => {
    platform.send(offer);
    const [outcome] = (await once(platform, 'message')) as [Outcome];
    return outcome;
  };
  const first = ask(WARM_UP);
  const begun = performance.now();
  const args =
    name === 'bare'
      ? [here('bare-bot.ts'), root]
      : [...AS_STARTED, here('../../soak/telegram/bot-child.ts'), root, join(folder, 'cellar.db')];
  const env = { ...process.env, ...(name === 'ours within limits' && { LIMITS: 'usual' }) };
  const bot = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'inherit'], env });
  const logged: string[] = [];
  bot.stdout.on('data', (lines: Buffer) => logged.push(...lines.toString().trim().split('\n')));
  await first;
  const cold_ms = performance.now() - begun;
  return {
    cold_ms,
    logged,
    offer: async (offer) => {
      const before = cpuOf(bot);
      const outcome = await ask(offer);
      return { ...outcome, cpu_ms: cpuOf(bot) - before, memory_MB: memoryOf(bot) };
    },
    stop: async (look) => {
      bot.kill('SIGTERM');
      await once(bot, 'close');
      platform.kill();
      await once(platform, 'close');
      await look?.(join(folder, 'cellar.db'));
      rmSync(folder, { recursive: true });
    },
  };
}

/** Processor time of a process so far, by Linux. */
function cpuOf({ pid }: ChildProcess): number {
  const fields = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')[1]?.split(' ') ?? [];
  return TICK_MS * (Number(fields[11]) + Number(fields[12]));
}

function memoryOf({ pid }: ChildProcess): number {
  const status = readFileSync(`/proc/${pid}/status`, 'utf8');
  return Number(/VmRSS:\s+(\d+)/.exec(status)?.[1]) / 1024;
}
