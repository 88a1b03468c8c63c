/**
 * `npm run bench:telegram`: our bot beside the barest one (R) on a Bot API of this machine; medians of five runs of
 * each, one after the other. Aims are no tests: machines differ. `--quick` makes one run of each with fewer updates.
 */
import { median } from '../timing.ts';
import { startBot, type BotName } from './running.ts';

const quick = process.argv.includes('--quick');
const RUNS = quick ? 1 : 5;
const FLOOD = quick ? 2000 : 5000;
const LONG = quick ? 20_000 : 200_000;
const FULL = Array.from(
  { length: 40 },
  (_, at) => `T${1 + at} ${1400 + at} gal pH 3.${40 + at} free ${10 + at}`,
);
const SHORT = ['thanks'];
const CHATS = 500;

type Figures = Readonly<Record<string, number>>;

async function measure(name: BotName): Promise<Figures> {
  const bot = await startBot(name);
  await bot.offer({ updates: 500, chats: CHATS, texts: FULL });
  const full = await bot.offer({ updates: FLOOD, chats: CHATS, texts: FULL });
  const short = await bot.offer({ updates: FLOOD, chats: CHATS, texts: SHORT });
  const steady = await bot.offer({ updates: quick ? 300 : 500, chats: CHATS, texts: FULL, perSecond: 100 });
  await bot.stop();
  return {
    cold: bot.cold_ms,
    full: FLOOD / (full.took_ms / 1000),
    short: FLOOD / (short.took_ms / 1000),
    cpu: full.cpu_ms / FLOOD,
    p50: steady.p50_ms,
  };
}

function row(what: string, [ours, bare]: readonly [number, number], aim: string): void {
  const figures = [ours, bare, ours / bare].map((figure) => figure.toPrecision(3).padStart(9)).join('');
  process.stdout.write(`${what.padEnd(36)}${figures}   ${aim}\n`);
}

const runs: { readonly ours: Figures; readonly bare: Figures }[] = [];
for (let i = 0; i < RUNS; i += 1) runs.push({ bare: await measure('bare'), ours: await measure('ours') });
const both = (figure: string): readonly [number, number] => [
  median(runs.map(({ ours }) => ours[figure] ?? Number.NaN)),
  median(runs.map(({ bare }) => bare[figure] ?? Number.NaN)),
];
process.stdout.write(`${'what'.padEnd(36)}     ours        R    ours/R   aim\n`);
row('updates/s, full dose messages', both('full'), 'at least 0.5');
row('updates/s, short ones', both('short'), 'at least 0.8');
row('CPU per update, full, ms', both('cpu'), 'at most 2');
row('p50 at 100 updates/s, ms', both('p50'), 'at most 1.5');
row('cold start to first reply, ms', both('cold'), 'at most 3');

const memory = { bare: [] as number[], ours: [] as number[] };
for (const name of ['bare', 'ours'] as const) {
  const bot = await startBot(name);
  const parts = 10;
  for (let part = 0; part < parts; part += 1)
    memory[name].push((await bot.offer({ updates: LONG / parts, chats: 2000, texts: FULL })).memory_MB);
  await bot.stop();
}
const last = (list: readonly number[]): number => list.at(-1) ?? Number.NaN;
row(`memory after ${LONG} updates, MB`, [last(memory.ours), last(memory.bare)], 'at most 1.0');
const half = memory.ours[memory.ours.length / 2] ?? Number.NaN;
row('… ours at the end against the middle', [last(memory.ours), half], 'flat');

const bot = await startBot('ours within limits');
const queued = quick ? 150 : 600;
const kept = await bot.offer({ updates: queued, chats: 100, texts: FULL, mostPerSecond: 30 });
await bot.stop();
row(`${queued} waiting, messages/s`, [queued / (kept.took_ms / 1000), 30], 'at least 0.9');
process.stdout.write(`429 earned: ${kept.tooFast}\n`);
