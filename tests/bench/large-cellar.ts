import { DatabaseSync } from 'node:sqlite';
import { join } from 'node:path';
import { handle } from '../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS } from '../../src/chat/conversation/settings.ts';
import type { Write } from '../../src/core/cellar/cellar-store.ts';
import { makeServe } from '../../src/edge/serve-message.ts';
import { openSqliteStore } from '../../src/edge/store/sqlite/open-sqlite-store.ts';
import { say } from '../fuzz/say.ts';
import { median } from './timing.ts';

/** What answers cost in a cellar of so many entries, in milliseconds (medians). */
export interface LargeCellar {
  readonly known_ms: number;
  readonly sheet_ms: number;
  readonly noted_ms: number;
  readonly commit_ms: number;
}

const CELLAR = 'c';
const VESSELS = 200;
const A_TURN = 1000;
/** A program that serves a cellar has long been warm. */
const WARM_UP = 1000;
const TIMES = 500;
/** Entries a day: a sheet is as long in a small cellar as in a large one. */
const A_DAY = 20;
const DAY_ms = 86_400_000;
const NOW = Date.UTC(2026, 10, 12, 12);

/** Fills a file with readings and additions up to yesterday, and one day's worth today; then times answers in it. */
export async function timeLargeCellar(folder: string, entries: number): Promise<LargeCellar> {
  let now = NOW;
  const open = () => openSqliteStore(join(folder, `of-${entries}.db`), { now: () => now, report: throwIt });
  const filling = await open();
  try {
    for (let from = 0; from < entries; from += A_TURN) {
      const writes = Array.from({ length: Math.min(A_TURN, entries - from) }, (_, k) =>
        entryAt(from + k, entries),
      );
      const people: Write[] = from === 0 ? [{ kind: 'person', id: 'p', number: 1, name: 'Ana' }] : [];
      await filling.turn(CELLAR, async () => ({ writes: [...people, ...writes], result: undefined }));
    }
  } finally {
    await filling.close();
  }
  // Opened anew: what the filling left to be written to the disk is not the answers'.
  const store = await open();
  try {
    const serve = makeServe({ handle, say, store, settings: DEFAULT_SETTINGS, report: throwIt });
    let count = 0;
    const timed = async (textOf: (i: number) => string): Promise<number> => {
      const seen: number[] = [];
      for (let i = 0; i < WARM_UP + TIMES; i += 1) {
        count += 1;
        now += 1000;
        const who = { cellar: CELLAR, chat: 'c', person: 'p', name: 'Ana', trusted: true } as const;
        const content = { kind: 'text', text: textOf(i) } as const;
        const begun = performance.now();
        await serve({ ...who, id: String(count), at: now, language: 'en', content });
        seen.push(performance.now() - begun);
      }
      return median(seen.slice(WARM_UP));
    };
    const sheet_ms = await timed(() => 'today');
    // Each time another vessel: none has a hundred additions and no reading.
    const noted_ms = await timed((i) => `added 82 g kmbs T${1 + (i % VESSELS)}`);
    const known_ms = await timed((i) => `T${1 + ((i * 7) % VESSELS)} pH 3.5`);
    return { known_ms, sheet_ms, noted_ms, commit_ms: bareCommit(folder) };
  } finally {
    await store.close();
  }
}

/** Entry `k` of so many: the last of them are of today, the others lie before. */
function entryAt(k: number, entries: number): Write {
  const age = entries - k;
  const at =
    age <= A_DAY
      ? NOW - age * 60_000
      : NOW - DAY_ms - Math.floor(age / A_DAY) * (DAY_ms / 100) - (age % A_DAY);
  const vessels = [`tank ${(k % VESSELS) + 1}`];
  const noting = { key: `k${k}`, at, noted_at: at, by: 1 };
  if (k % 3 === 0)
    return {
      kind: 'entry',
      entry: { ...noting, kind: 'addition', vessels, mass_g: 100, added_mg_L: 12, volume_L: 5000 },
    };
  return {
    kind: 'entry',
    entry: { ...noting, kind: 'reading', vessels, ph: 3.5, free_mg_L: 20 + (k % 7), volume_L: 5000 },
  };
}

/** One durable row of SQLite by itself, with the same promises of durability. */
function bareCommit(folder: string): number {
  const bare = new DatabaseSync(join(folder, `bare-${process.hrtime.bigint()}.db`));
  bare.exec(
    'pragma journal_mode = wal; pragma synchronous = full; create table t (id integer primary key, text)',
  );
  const insert = bare.prepare('insert into t (text) values (?)');
  const seen: number[] = [];
  for (let i = 0; i < 200; i += 1) {
    const begun = performance.now();
    insert.run('x'.repeat(300));
    seen.push(performance.now() - begun);
  }
  bare.close();
  return median(seen.slice(40));
}

function throwIt(fault: unknown): never {
  throw fault;
}
