/**
 * `npm run fuzz`: 200,000 messages of every kind through the conversation.
 * `npm run fuzz -- --seed 7 --messages 5000` plays fewer, or the same ones again.
 */
import { parseArgs } from 'node:util';
import fc from 'fast-check';
import { anyTalk, play } from './conversation-of.ts';
import type { Talk } from './conversation-of.ts';
import { faults } from './faults.ts';

const { values } = parseArgs({
  options: { seed: { type: 'string' }, messages: { type: 'string', default: '200000' } },
});
const seed = Number(values.seed ?? Date.now() % 1_000_000);
const wanted = Number(values.messages);
const TALKS_A_ROUND = 500;
const FAULTS_SHOWN = 12;

let played = 0;
let slowest = { milliseconds: 0, text: '' };

async function judge(talk: Talk): Promise<string[]> {
  const found: string[] = [];
  try {
    for await (const turn of play(talk)) {
      played += 1;
      const text = turn.message.content.kind === 'text' ? turn.message.content.text : '';
      if (turn.milliseconds > slowest.milliseconds) slowest = { milliseconds: turn.milliseconds, text };
      found.push(...faults(turn));
    }
  } catch (error) {
    found.push(
      error instanceof Error ? `throws ${error.stack?.split('\n').slice(0, 3).join(' ')}` : 'throws',
    );
  }
  return found;
}

process.stdout.write(`seed ${seed}\n`);
const failed = new Map<string, Talk>();
for (let round = 0; played < wanted && failed.size < FAULTS_SHOWN; round += 1) {
  const details = await fc.check(
    // A fault that is known already does not stop the search for the next one.
    fc.asyncProperty(anyTalk, async (talk) =>
      (await judge(talk)).every((fault) => failed.has(kindOf(fault))),
    ),
    { seed: seed + round, numRuns: Math.min(TALKS_A_ROUND, wanted - played) },
  );
  const talk = details.counterexample?.[0];
  if (talk === undefined) continue;
  for (const fault of await judge(talk)) {
    if (failed.has(kindOf(fault))) continue;
    failed.set(kindOf(fault), talk);
    process.stdout.write(`${fault}\n  ${JSON.stringify(talk)}\n`);
  }
}

/** A fault without its figures, so that one fault is not reported a hundred times. */
function kindOf(fault: string): string {
  return fault.replaceAll(/[\d.]+/g, '#').slice(0, 200);
}

process.stdout.write(
  `${played} messages, ${failed.size} kinds of fault; slowest ${slowest.milliseconds.toFixed(1)} ms: ` +
    `${JSON.stringify(slowest.text.slice(0, 80))}\n`,
);
process.exitCode = failed.size > 0 ? 1 : 0;
