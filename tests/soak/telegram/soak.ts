/**
 * `npm run soak:telegram`: 25 kills under 5,000 updates by polling and by webhook, a storm over 5,000 updates, and
 * 200,000 updates over 2,000 chats in mixed use. `npm run soak:telegram -- mixed` runs one part.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { startBot } from '../../bench/telegram/running.ts';
import { TOKEN } from '../../edge/telegram/token.ts';
import { killRounds } from './kill-rounds.ts';
import { runStorm } from './run-storm.ts';

const [part = 'all', size = '1'] = process.argv.slice(2);
const folder = mkdtempSync(join(tmpdir(), 'brimnote-soak-'));
const scale = Number(size);

function tell(name: string, counts: object, isRight: boolean): void {
  process.stdout.write(`${isRight ? 'ok  ' : 'FAIL'} ${name}: ${JSON.stringify(counts)}\n`);
  if (!isRight) process.exitCode = 1;
}

async function kill(mode: 'polling' | 'webhook'): Promise<void> {
  const [kills, updates] = [25 * scale, 5000 * scale];
  const counts = await killRounds(join(folder, `${mode}.db`), { kills, updates, chats: 50, mode });
  const { answered, entries, unanswered, doubled, left, differed, mostRepeated, broken } = counts;
  const isRight = answered === updates && entries === updates && unanswered + doubled + left + differed === 0;
  tell(`${kills} kills, ${mode}`, counts, isRight && mostRepeated <= 1 && broken.length === 0);
}

async function storm(): Promise<void> {
  const updates = 5000 * scale;
  const { logged, ...counts } = await runStorm(join(folder, 'storm.db'), {
    updates,
    chats: 250,
    second_ms: 50,
  });
  const { answered, entries, outOfOrder, doubled, left, repeated, receiptsLost, broken } = counts;
  const isRight = answered === updates && entries === updates && outOfOrder + doubled + left === 0;
  const isQuiet = !logged.includes(TOKEN.slice(TOKEN.indexOf(':') + 1));
  tell('storm', counts, isRight && repeated <= receiptsLost && broken.length === 0 && isQuiet);
}

/** What people write in mixed use; each gets one reply. */
const TEXTS = Array.from({ length: 40 }, (_, at) => [
  `T${1 + at} ${1400 + at} gal pH 3.${40 + at} free ${10 + at}`,
  'thanks',
  `added ${100 + at} g kmbs T${1 + at}`,
  `T${1 + at} now free 38 total 96 pH 3.6`,
  'today',
  `T${1 + at}?`,
]).flat();

async function mixed(): Promise<void> {
  const parts = 20;
  const updates = (200_000 * scale) / parts;
  const bot = await startBot('ours');
  const memory_MB: number[] = [];
  const perSecond: number[] = [];
  for (let nth = 0; nth < parts; nth += 1) {
    const outcome = await bot.offer({ updates, chats: 2000, texts: TEXTS });
    memory_MB.push(Math.round(outcome.memory_MB));
    perSecond.push(Math.round(updates / (outcome.took_ms / 1000)));
  }
  let [cellars, entries, differed] = [0, 0, 0];
  await bot.stop(async (file) => {
    const store = await openSqliteStore(file, { now: Date.now, report: () => undefined });
    for (const cellar of await store.cellars()) {
      cellars += 1;
      entries += (await store.look(cellar, (view) => view.nextEntry())) - 1;
      differed += (await store.rebuild(cellar)).differed.length;
    }
    await store.close();
  });
  const half = memory_MB.slice(parts / 2);
  const isFlat = (half.at(-1) ?? 0) <= 1.1 * (half[0] ?? 0);
  const counts = { memory_MB, perSecond, logged: bot.logged.length, cellars, entries, differed };
  tell(`${updates * parts} updates over 2000 chats`, counts, isFlat && bot.logged.length + differed === 0);
  for (const line of bot.logged.slice(0, 5)) process.stdout.write(`  ${line}\n`);
}

if (part === 'all' || part === 'polling') await kill('polling');
if (part === 'all' || part === 'webhook') await kill('webhook');
if (part === 'all' || part === 'storm') await storm();
if (part === 'all' || part === 'mixed') await mixed();
rmSync(folder, { recursive: true });
