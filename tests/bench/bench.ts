/** `npm run bench`: what a message costs, beside what was aimed at. Aims are no tests: machines differ. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { handle } from '../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import { readMessage } from '../../src/chat/reader/read-message.ts';
import { makeServe } from '../../src/edge/serve-message.ts';
import { createMemoryCellars } from '../../src/edge/store/memory-cellars.ts';
import { say } from '../fuzz/say.ts';
import { writtenMessages } from '../fuzz/written-messages.ts';
import { timeForecast } from './forecast-round.ts';
import { HARD_TEXTS } from './hard-texts.ts';
import { runAsk } from './programs.ts';
import { timeLargeCellar } from './large-cellar.ts';
import { roundOf } from './rounds.ts';
import { median, timeOf } from './timing.ts';

const TYPICAL = 'T4 1450 gal pH 3.58 free 21';
const JSONL_LINES = 10_000;

function row(name: string, seen: string, aim = ''): void {
  process.stdout.write(`${name.padEnd(46)} ${seen.padStart(12)}   ${aim}\n`);
}

const ms = (milliseconds: number): string =>
  `${milliseconds >= 100 ? Math.round(milliseconds) : milliseconds.toPrecision(3)} ms`;

const store = createMemoryCellars({ now: () => 0 });
const serve = makeServe({ handle, say, store, settings: DEFAULT_SETTINGS, report: throwIt });

function throwIt(fault: unknown): never {
  throw fault;
}

let messages = 0;

/** From the bytes of a message to the text of its replies, by somebody who never wrote. */
async function answer(body: string): Promise<string> {
  const { text } = JSON.parse(body) as { readonly text: string };
  messages += 1;
  const who = { cellar: `c${messages}`, chat: 'c', person: 'p' };
  const message = { ...who, id: '1', at: 0, language: 'en', content: { kind: 'text', text } } as const;
  const { said } = await serve(message);
  return said.map((one) => one.text).join('\n');
}

/** The barest bot: the same bytes in, their text out. */
function echo(body: string): string {
  return (JSON.parse(body) as { readonly text: string }).text;
}

function bytesOf(text: string): string {
  return JSON.stringify({ text });
}

row('what', 'seen', 'aim');

const typical = bytesOf(TYPICAL);
const answered = await timeOf(() => answer(typical), { times: 4000, warmUp: 2000 });
const manyEchoes = await timeOf(() => Array.from({ length: 1000 }, () => echo(typical)), {
  times: 200,
  warmUp: 50,
});
row('answer to one reading', ms(answered), 'at most 0.3 ms, wished 0.15 ms');
row('… against echoing it', `${Math.round(answered / (manyEchoes / 1000))} ×`);
row(
  'reading of it alone',
  ms(await timeOf(() => readMessage(TYPICAL, DEFAULT_SETTINGS), { times: 4000, warmUp: 500 })),
);

const perLine: number[] = [];
for (const vessels of [10, 200]) {
  const body = bytesOf(roundOf(vessels));
  const once = await timeOf(() => answer(body), { times: 100, warmUp: 20 });
  if (vessels === 200) row('round of 200', ms(once), 'at most 40 ms');
  row(`round of ${vessels}, a line`, ms(once / vessels));
  perLine.push(once / vessels);
}
row(
  '… a line of 200 against a line of 10',
  `${((perLine[1] ?? 0) / (perLine[0] ?? 1)).toFixed(2)} ×`,
  'at most 1.2 ×',
);

const read = (text: string): Promise<number> =>
  timeOf(() => readMessage(text, DEFAULT_SETTINGS), { times: 15, warmUp: 5 });
const written: (readonly [string, number])[] = [];
for (const text of writtenMessages()) written.push([text, await read(text)]);
const [worstText, worst] = written.toSorted(([, a], [, b]) => b - a)[0] ?? ['', 0];
row(`reading ${written.length} written messages, median`, ms(median(written.map(([, time]) => time))));
row('… the slowest', ms(worst), `at most 5 ms: ${JSON.stringify(worstText.slice(0, 40))}`);

const hard: (readonly [string, number])[] = [];
for (const [name, text] of HARD_TEXTS) hard.push([name, await read(text)]);
hard.sort(([, a], [, b]) => b - a);
row(`reading ${hard.length} texts of 4,096 characters, median`, ms(median(hard.map(([, time]) => time))));
for (const [name, time] of hard.slice(0, 3)) row(`… ${name}`, ms(time), 'at most 5 ms');

row('forecast over 10,000 readings', ms(await timeForecast()), 'under 20 ms');

const starts: number[] = [];
for (let i = 0; i < 7; i += 1) starts.push((await runAsk([TYPICAL])).milliseconds);
row('start to first answer', ms(median(starts)), 'at most 600 ms');

const texts = writtenMessages();
const lines = Array.from({ length: JSONL_LINES }, (_, at) =>
  JSON.stringify({ id: String(at), language: 'en', text: texts[at % texts.length] }),
);
const jsonl = await runAsk(['--jsonl'], `${lines.join('\n')}\n`);
row(`${JSONL_LINES} lines through ask --jsonl`, `${(jsonl.milliseconds / 1000).toFixed(1)} s`, 'under 15 s');
row('… lines answered', String(jsonl.lines), String(JSONL_LINES));

if (process.env['BENCH_QUICK'] === undefined) {
  const folder = mkdtempSync(join(tmpdir(), 'brimnote-bench-'));
  try {
    await timeLargeCellar(folder, 999); // warms up
    const [small, large] = [await timeLargeCellar(folder, 1000), await timeLargeCellar(folder, 1_000_000)];
    row('known vessel, of 1,000 entries', ms(small.known_ms));
    row(
      '… of 1,000,000',
      ms(large.known_ms),
      `at most twice: ${(large.known_ms / small.known_ms).toFixed(2)} ×`,
    );
    row('sheet of a day, of 1,000 entries', ms(small.sheet_ms));
    row(
      '… of 1,000,000',
      ms(large.sheet_ms),
      `at most twice: ${(large.sheet_ms / small.sheet_ms).toFixed(2)} ×`,
    );
    row('"noted", durable', ms(small.noted_ms));
    row('… above a bare commit', ms(small.noted_ms - small.commit_ms), 'at most 1.5 ms');
  } finally {
    rmSync(folder, { recursive: true });
  }
}
