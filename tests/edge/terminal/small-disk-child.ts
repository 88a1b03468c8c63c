/**
 * Somebody types to the program on a small disk of its own (the working directory), which fills up, has room
 * again, and fills up once more. Says on stdout as JSON what came of it.
 */
import { rmSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { readLog } from '../../soak/terminal/count-traces.ts';
import { runProgram, Typing } from '../../soak/terminal/typing.ts';

const BALLAST_bytes = 1_500_000;
const MOST_TYPED = 4000;
const file = resolve('cellar.db');
const ballast = resolve('ballast');
/** What people are told where nothing could be written. */
const REFUSED = /^Not noted.*$/m;

const kept: number[] = [];
const refused: number[] = [];
const sentences = new Set<string>();
let number = 0;

/** Types one addition and waits for its answer: each mass is another. */
async function add(typing: Typing): Promise<boolean> {
  number += 1;
  const mass_g = (2000 + number) / 10;
  typing.type(`added ${mass_g} g kmbs T${number % 5} note: ${'x'.repeat(300)}`);
  const noted = new RegExp(`^Noted \\d+: T\\d ${mass_g} g`, 'm');
  for (;;) {
    if (typing.hears(noted) !== undefined) return kept.push(mass_g) > 0;
    const sentence = typing.hears(REFUSED);
    if (sentence !== undefined) {
      sentences.add(sentence);
      refused.push(mass_g);
      return false;
    }
    if (typing.isOver) throw new Error(`it ended: ${typing.complaints}`);
    await typing.more();
  }
}

async function fillUp(typing: Typing): Promise<void> {
  // Smaller things may still fit for a while.
  for (const until = refused.length + 10; refused.length < until && number < MOST_TYPED;) await add(typing);
}

writeFileSync(ballast, Buffer.alloc(BALLAST_bytes));
const typing = new Typing(file);
await fillUp(typing);
const whileFull = kept.length;
rmSync(ballast);
const wentOn = await add(typing);
await fillUp(typing);
const status = await typing.end();

// A full disk is read, too.
const log = await readLog(file);
const rebuilt = await runProgram('main.ts', ['--rebuild'], { dataFile: file }).catch(String);
const masses = log.flatMap(({ mass_g }) => mass_g ?? []);
process.stdout.write(
  JSON.stringify({
    sentences: [...sentences],
    keptBefore: whileFull,
    keptAfter: kept.length - whileFull,
    refused: refused.length,
    wentOn,
    lost: kept.filter((mass_g) => !masses.includes(mass_g)),
    half: refused.filter((mass_g) => masses.includes(mass_g)),
    twice: masses.length - new Set(masses).size,
    rebuilt,
    status,
    toldOperator: /full/i.test(typing.complaints),
  }),
);
