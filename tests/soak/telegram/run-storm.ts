import { handle } from '../../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS as settings } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { systemClock, type Clock } from '../../../src/edge/clock.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { joinConversation } from '../../../src/edge/telegram/join-conversation.ts';
import { USUAL_LIMITS } from '../../../src/edge/telegram/pace.ts';
import { serveTelegram } from '../../../src/edge/telegram/serve-telegram.ts';
import { FakeBotApi, TOKEN, type Fault } from '../../edge/telegram/fake-bot-api.ts';
import { SERVER_ERROR, SLOW_DOWN } from '../../edge/telegram/fault.ts';
import { Person } from '../../edge/telegram/person.ts';

/** A storm: how much of it, and how fast its time runs. */
export interface StormPlan {
  readonly updates: number;
  readonly chats: number;
  /** A second of the storm, in milliseconds of ours. */
  readonly second_ms: number;
}

/** What came of it. */
export interface StormCounts {
  readonly answered: number;
  readonly unanswered: number;
  readonly outOfOrder: number;
  readonly repeated: number;
  /** Answers in messages whose receipt was lost. */
  readonly receiptsLost: number;
  readonly entries: number;
  readonly doubled: number;
  readonly left: number;
  readonly broken: readonly string[];
  /** The lines of the log, in which the token may not stand. */
  readonly logged: string;
}

const AWAY_s = 120;
const LEAST_MASS_g = 100;
const FIRST_CHAT = 9001;

/** Faults in the shares of a bad day: 10 % 429, 10 % 5xx, 5 % cut, 5 % receipts lost; always the same ones. */
function faults(count: number): Fault[] {
  const kinds: readonly Fault[] = [
    ...Array<Fault>(2).fill(SLOW_DOWN),
    ...Array<Fault>(2).fill(SERVER_ERROR),
    'reset',
    'receipt lost',
    ...Array<Fault>(14).fill('none'),
  ];
  let state = 7;
  return Array.from({ length: count }, () => {
    state = (state * 48_271) % 2_147_483_647;
    return kinds[state % kinds.length] ?? 'none';
  });
}

/** People write additions through a storm, in the middle of which the platform is away for two minutes. */
export async function runStorm(file: string, { updates, chats, second_ms }: StormPlan): Promise<StormCounts> {
  await using api = await FakeBotApi.start();
  api.second_ms = second_ms;
  const storm = faults(20 * updates);
  api.fail('sendMessage', ...storm);
  api.fail('getUpdates', ...storm.slice(0, updates).map((fault) => (fault === SLOW_DOWN ? 'none' : fault)));
  const begun = performance.now();
  const start = Date.now();
  const clock: Clock = {
    now: () => Math.round(start + (1000 / second_ms) * (performance.now() - begun)),
    wait: (ms, signal) => systemClock.wait((ms / 1000) * second_ms, signal),
  };
  const lines: string[] = [];
  const store = await openSqliteStore(file, { now: clock.now, report: () => undefined });
  const say = makeSay(loadLocales());
  const log = createLog({ level: 'trace', secret: TOKEN, to: { write: (line) => void lines.push(line) } });
  const conversation = joinConversation({
    handle,
    say,
    store,
    settings,
    rule: { is: 'open' },
    paceOf: () => 'fine',
    clock,
    log,
  });
  const stopping = new AbortController();
  const ended = serveTelegram({
    ...conversation,
    say,
    store,
    log,
    clock,
    config: { botToken: TOKEN, botApiRoot: api.root },
    tell: (sentence) => void lines.push(sentence),
    signal: stopping.signal,
    limits: USUAL_LIMITS,
    times: { watchdog_s: 1e6, finish_s: 1e4, confirm_s: 1e4 },
  });
  const begun_s = Math.floor(start / 1000);
  const people = Array.from({ length: chats }, (_, at) => new Person(api, FIRST_CHAT + at, { begun_s }));
  for (let sent = 0; sent < updates; sent += 1) {
    const nth = Math.floor(sent / chats);
    const text = `added ${LEAST_MASS_g + nth} g kmbs T${1 + (nth % 40)}`;
    people[sent % chats]?.sends(text, { twice: sent % 10 === 0 });
    if (sent === Math.floor(updates / 2)) {
      api.away = true;
      await systemClock.wait(AWAY_s * second_ms);
      api.away = false;
    }
    if (sent % 50 === 0) await systemClock.wait(second_ms);
  }
  const expected = new Set(
    people.flatMap(({ id }, at) =>
      Array.from({ length: Math.ceil((updates - at) / chats) }, (_, nth) => `${id} ${LEAST_MASS_g + nth}`),
    ),
  );
  const answers = (): string[] =>
    api.delivered.flatMap(({ chat_id, text }) => massesIn(text).map((mass_g) => `${chat_id} ${mass_g}`));
  await api.until(() => new Set(answers()).size >= expected.size);
  stopping.abort();
  await ended;
  const got = answers();
  const seen = new Set(got);
  const lost = api.callsOf('sendMessage').filter((_, at) => storm[at] === 'receipt lost');
  const masses: string[] = [];
  for (const cellar of await store.cellars())
    for (const entry of await store.look(cellar, (view) => view.entries({})))
      if (entry.kind === 'addition') masses.push(`${cellar} ${entry.mass_g}`);
  const left = (await store.waiting('telegram')).length + (await store.posts('telegram')).length;
  await store.close();
  return {
    answered: [...expected].filter((one) => seen.has(one)).length,
    unanswered: [...expected].filter((one) => !seen.has(one)).length,
    outOfOrder: people.filter(({ id }) => !isInOrder(got, `${id} `)).length,
    repeated: got.length - seen.size,
    receiptsLost: lost.flatMap(({ text }) => massesIn(String(text))).length,
    entries: masses.length,
    doubled: masses.length - new Set(masses).size,
    left,
    broken: api.broken,
    logged: lines.join(''),
  };
}

/** What a message answers: several that waited may have become one. */
function massesIn(text: string): string[] {
  return Array.from(text.matchAll(/^Noted \d+: T\d+ (\d+) g/gm), ([, mass_g]) => mass_g ?? '');
}

/** Whether the answers in a chat come in the order of the messages; one that comes again comes at once. */
function isInOrder(answers: readonly string[], chat: string): boolean {
  const masses = answers.filter((one) => one.startsWith(chat)).map((one) => Number(one.split(' ')[1]));
  return masses.every((mass, at) => at === 0 || mass >= (masses[at - 1] ?? 0));
}
