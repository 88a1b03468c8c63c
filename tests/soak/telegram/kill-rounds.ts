import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as wait } from 'node:timers/promises';
import { fileURLToPath } from 'node:url';

import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { bringUpdates } from '../../edge/telegram/bring-updates.ts';
import { FakeBotApi } from '../../edge/telegram/fake-bot-api.ts';
import { Person } from '../../edge/telegram/person.ts';
import { freePort } from './free-port.ts';

/** What is done to a bot. */
export interface KillPlan {
  readonly kills: number;
  readonly updates: number;
  readonly chats: number;
  readonly mode: 'polling' | 'webhook';
}

/** What came of it. */
export interface KillCounts {
  readonly answered: number;
  readonly unanswered: number;
  /** Answers that came again, and the most of them in one chat after one kill. */
  readonly repeated: number;
  readonly mostRepeated: number;
  readonly entries: number;
  readonly doubled: number;
  /** What is left in the inbox and outbox at the end, and vessels that differ from their rebuild. */
  readonly left: number;
  readonly differed: number;
  /** Calls that the platform forbids, and lines of the log that tell of a fault. */
  readonly broken: readonly string[];
}

const CHILD = fileURLToPath(new URL('bot-child.ts', import.meta.url));
const FIRST_CHAT = 7001;
const LEAST_MASS_g = 100;
/** From the first answer of a process to its end, at most. */
const LONGEST_LIFE_ms = 400;

/**
 * Kills a bot again and again while people write `added 137 g kmbs T12`, each mass once in its chat, and looks at what
 * they got and at the file afterwards.
 */
export async function killRounds(file: string, plan: KillPlan): Promise<KillCounts> {
  const { kills, updates, chats, mode } = plan;
  await using api = await FakeBotApi.start();
  const port = mode === 'webhook' ? await freePort() : undefined;
  const bringing =
    port === undefined ? undefined : bringUpdates(api, { root: () => `http://127.0.0.1:${port}` });
  const begun_s = Math.floor(Date.now() / 1000);
  const people = Array.from({ length: chats }, (_, at) => new Person(api, FIRST_CHAT + at, { begun_s }));
  const broken: string[] = [];
  const start = (): ChildProcess => {
    const args = [CHILD, api.root, file, ...(port === undefined ? [] : [String(port)])];
    const child = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'inherit'] });
    child.stdout?.on('data', (lines: Buffer) => {
      for (const line of lines.toString().split('\n')) if (/"level":[56]0/.test(line)) broken.push(line);
    });
    return child;
  };

  let sent = 0;
  const write = (until: number): void => {
    for (; sent < Math.min(until, updates); sent += 1) {
      const nth = Math.floor(sent / chats);
      people[sent % chats]?.sends(`added ${LEAST_MASS_g + nth} g kmbs T${1 + (nth % 40)}`);
    }
  };
  const killedAt: number[] = [];
  for (let kill = 1; kill <= kills; kill += 1) {
    const child = start();
    write(Math.floor((updates * (kill - 0.5)) / kills));
    const before = api.delivered.length;
    await api.until(() => api.delivered.length > before);
    write(Math.floor((updates * kill) / kills));
    await wait(Math.random() * LONGEST_LIFE_ms);
    child.kill('SIGKILL');
    await once(child, 'close');
    killedAt.push(api.delivered.length);
  }
  const last = start();
  write(updates);
  const expected = people.flatMap(({ id }, at) =>
    Array.from({ length: Math.ceil((updates - at) / chats) }, (_, nth) => `${id} ${LEAST_MASS_g + nth}`),
  );
  await api.until(() => new Set(answersOf(api)).size >= expected.length);
  last.kill('SIGTERM');
  const [status] = (await once(last, 'close')) as [number | null];
  if (status !== 0) broken.push(`the last process ended with ${status}`);
  await bringing?.stop();
  return {
    ...countAnswers(answersOf(api), { expected, killedAt }),
    ...(await countEntries(file)),
    broken: [...broken, ...api.broken],
  };
}

/** Which message each delivered text answers, as `chat mass`. */
function answersOf(api: FakeBotApi): string[] {
  return api.delivered.map(({ chat_id, text }) => `${chat_id} ${/(\d+) g/.exec(text)?.[1]}`);
}

function countAnswers(
  answers: readonly string[],
  { expected, killedAt }: { readonly expected: readonly string[]; readonly killedAt: readonly number[] },
): Pick<KillCounts, 'answered' | 'unanswered' | 'repeated' | 'mostRepeated'> {
  const seen = new Set<string>();
  const again = new Map<string, number>();
  let repeated = 0;
  for (const [at, answer] of answers.entries()) {
    if (seen.has(answer)) {
      repeated += 1;
      const process = `${killedAt.filter((killed) => killed <= at).length} ${answer.split(' ')[0]}`;
      again.set(process, (again.get(process) ?? 0) + 1);
    }
    seen.add(answer);
  }
  const answered = expected.filter((one) => seen.has(one)).length;
  return {
    answered,
    unanswered: expected.length - answered,
    repeated,
    mostRepeated: Math.max(0, ...again.values()),
  };
}

async function countEntries(
  file: string,
): Promise<Pick<KillCounts, 'entries' | 'doubled' | 'left' | 'differed'>> {
  const store = await openSqliteStore(file, { now: Date.now, report: () => undefined });
  let [entries, doubled, differed] = [0, 0, 0];
  for (const cellar of await store.cellars()) {
    const log = await store.look(cellar, (view) => view.entries({}));
    const masses = log.flatMap((entry) => (entry.kind === 'addition' ? [entry.mass_g] : []));
    entries += masses.length;
    doubled += masses.length - new Set(masses).size;
    differed += (await store.rebuild(cellar)).differed.length;
  }
  const left = (await store.waiting('telegram')).length + (await store.posts('telegram')).length;
  await store.close();
  return { entries, doubled, left, differed };
}
