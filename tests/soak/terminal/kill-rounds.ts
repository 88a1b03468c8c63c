import { existsSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import { countTraces, readLog } from './count-traces.ts';
import { asTyped, ROUND_LENGTH, roundOf, type LogLine, type Typed } from './stream.ts';
import { runProgram, Typing } from './typing.ts';

/** What came of a stream of messages to a program that was killed again and again. */
export interface KillCounts {
  readonly kills: number;
  readonly acknowledged: number;
  /** Durable, and killed before it could be said. */
  readonly durableUnsaid: number;
  readonly lost: readonly string[];
  readonly doubled: readonly string[];
  /** Entries that no message accounts for. */
  readonly strange: readonly string[];
  /** What a rebuild says where it found a difference. */
  readonly differed: readonly string[];
}

/** So many messages are on their way at a time, as when somebody types ahead. */
const AHEAD = 12;
/** From the first answer of a process to its end, at most; some are killed while they still begin. */
const LONGEST_LIFE_ms = 1000;
const LONGEST_BEGINNING_ms = 500;
const KILLED_EARLY_share = 0.2;

/** The stream, as far as it was needed. */
class Stream {
  readonly #messages: Typed[] = [];

  at(place: number): Typed {
    while (this.#messages.length <= place)
      this.#messages.push(...roundOf(this.#messages.length / ROUND_LENGTH));
    return this.#messages[place]!;
  }

  before(place: number): readonly Typed[] {
    return this.#messages.slice(0, place);
  }
}

/**
 * Kills the program in the terminal again and again while somebody types, and looks at the file through the other
 * programs each time. After a kill the stream goes on with the first message that left nothing in the log, as a person
 * goes on who has looked at the day's sheet.
 */
export async function killRounds(file: string, kills: number): Promise<KillCounts> {
  const stream = new Stream();
  const differed: string[] = [];
  const lost = new Set<string>();
  let acknowledged = 0;
  let durableUnsaid = 0;
  let next = 0;
  let log: readonly LogLine[] = [];
  for (let kill = 1; kill <= kills; kill += 1) {
    const heard = await lifeOf(new Typing(file), { next, stream, log });
    acknowledged += heard - next;
    if (!existsSync(file)) continue;
    log = await readLog(file);
    const rebuilt = await runProgram('main.ts', ['--rebuild'], { dataFile: file });
    if (!rebuilt.includes('none differed') && log.length > 0) differed.push(rebuilt.trim());
    const traces = countTraces(log);
    for (const { text, trace } of stream.before(heard)) if (!traces.has(trace)) lost.add(text);
    // What the killed one has noted and could not say any more.
    for (next = heard; traces.has(stream.at(next).trace); next += 1) durableUnsaid += 1;
  }
  const traces = countTraces(log);
  const sent = new Set(stream.before(next).map(({ trace }) => trace));
  return {
    kills,
    acknowledged,
    durableUnsaid,
    lost: [...lost],
    doubled: [...traces].flatMap(([trace, count]) => (count > 1 ? [trace] : [])),
    strange: [...traces.keys()].filter((trace) => !sent.has(trace)),
    differed,
  };
}

/** Types ahead until the program is killed; gives which message is the first that was not acknowledged. */
async function lifeOf(
  typing: Typing,
  { next, stream, log }: { readonly next: number; readonly stream: Stream; readonly log: readonly LogLine[] },
): Promise<number> {
  const entries = new Map(log.map(({ mass_g = 0, entry }) => [mass_g, entry]));
  let typed = next;
  let heard = next;
  let killed: Promise<void> | undefined;
  const killAfter = (most_ms: number): Promise<void> =>
    wait(Math.random() * most_ms).then(() => typing.kill());
  if (Math.random() < KILLED_EARLY_share) killed = killAfter(LONGEST_BEGINNING_ms);
  for (;;) {
    for (let text; typed - heard < AHEAD; typed += 1) {
      // An entry is struck by its number, which is known once its answer came.
      text = asTyped(stream.at(typed), entries);
      if (text === undefined) break;
      typing.type(text);
    }
    for (let answer; heard < typed; heard += 1) {
      answer = typing.hears(stream.at(heard).acknowledged);
      if (answer === undefined) break;
      const [, entry, mass_g] = /^Noted (\d+): \S+ ([\d.]+) g/.exec(answer) ?? [];
      if (entry !== undefined) entries.set(Number(mass_g), Number(entry));
      killed ??= killAfter(LONGEST_LIFE_ms);
    }
    if (typing.isOver) break;
    await typing.more();
  }
  await killed;
  return heard;
}
