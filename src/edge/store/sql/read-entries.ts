import { sql, type Kysely } from 'kysely';
import type { EntryQuery } from '../../../core/cellar/cellar-store.ts';
import type { LoggedEntry } from '../../../core/cellar/entry.ts';
import { comparePoints } from '../projection/point.ts';
import { pastPrefix } from '../past-prefix.ts';
import { readyQuery } from './ready-query.ts';
import { toLoggedEntry } from './entry-rows.ts';
import type { Tables } from './tables.ts';

const COLUMNS = [
  'entry.entry',
  'entry.key',
  'entry.at',
  'entry.noted_at',
  'entry.person',
  'entry.content',
] as const;
const STRUCK = ['struck.entry as struck_entry', 'struck.content as struck_content'] as const;

/** Entries of a cellar, each with the correction that takes it back. */
const selectLogged = (db: Kysely<Tables>, cellar: string) =>
  db
    .selectFrom('entry')
    .leftJoin('entry as struck', (on) =>
      on.onRef('struck.cellar', '=', 'entry.cellar').onRef('struck.corrects', '=', 'entry.entry'),
    )
    .select([...COLUMNS, ...STRUCK])
    .where('entry.cellar', '=', cellar);

type OfCellar = { readonly cellar: string };

const last = readyQuery((db, { cellar }: OfCellar) =>
  db
    .selectFrom('entry')
    .select('entry')
    .where('cellar', '=', cellar)
    .orderBy('entry', 'desc')
    .limit(sql.lit(1)),
);

const ofNumber = readyQuery((db, { cellar, entry }: OfCellar & { readonly entry: number }) =>
  selectLogged(db, cellar).where('entry.entry', '=', entry),
);

const ofKey = readyQuery((db, { cellar, key }: OfCellar & { readonly key: string }) =>
  selectLogged(db, cellar).where('entry.key', '=', key),
);

const ofKeys = readyQuery(
  (db, { cellar, begin, past }: OfCellar & { readonly begin: string; readonly past: string | undefined }) =>
    selectLogged(db, cellar)
      .where('entry.key', '>=', begin)
      .$if(past !== undefined, (query) => query.where('entry.key', '<', past ?? '')),
);

const lastBy = readyQuery((db, { cellar, person }: OfCellar & { readonly person: number }) =>
  selectLogged(db, cellar)
    .where('entry.person', '=', person)
    // As a literal: an index of some rows serves only a query that says so itself.
    .where('entry.kind', '<>', sql.lit('correction'))
    .where('struck.entry', 'is', null)
    .orderBy('entry.entry', 'desc')
    .limit(sql.lit(1)),
);

/** The number that the next entry gets. */
export async function readNextEntry(db: Kysely<Tables>, cellar: string): Promise<number> {
  return ((await last(db, { cellar })).rows[0]?.entry ?? 0) + 1;
}

/** The entry of that number. */
export async function readEntry(
  db: Kysely<Tables>,
  cellar: string,
  entry: number,
): Promise<LoggedEntry | undefined> {
  const [row] = (await ofNumber(db, { cellar, entry })).rows;
  return row && toLoggedEntry(row);
}

/** The entry of that key. */
export async function readEntryOfKey(
  db: Kysely<Tables>,
  cellar: string,
  key: string,
): Promise<LoggedEntry | undefined> {
  const [row] = (await ofKey(db, { cellar, key })).rows;
  return row && toLoggedEntry(row);
}

/** The entries whose keys begin so, oldest first. */
export async function readEntriesOfKeys(
  db: Kysely<Tables>,
  cellar: string,
  begin: string,
): Promise<readonly LoggedEntry[]> {
  const { rows } = await ofKeys(db, { cellar, begin, past: pastPrefix(begin) });
  return rows.map(toLoggedEntry).toSorted(comparePoints);
}

/** The newest entry of a person that nobody took back and that takes back none. */
export async function readLastEntryBy(
  db: Kysely<Tables>,
  cellar: string,
  person: number,
): Promise<LoggedEntry | undefined> {
  const [row] = (await lastBy(db, { cellar, person })).rows;
  return row && toLoggedEntry(row);
}

/** Undefined: without that bound. */
type Asked = { readonly [name in keyof EntryQuery]-?: EntryQuery[name] | undefined };

const asked = readyQuery((db, { cellar, vessel, from, to, last: most }: OfCellar & Asked) => {
  const found =
    vessel === undefined
      ? db.selectFrom('entry as place').where('place.cellar', '=', cellar)
      : db
          .selectFrom('touched as place')
          .where('place.cellar', '=', cellar)
          .where('place.vessel', '=', vessel);
  const places = found
    .select(['place.entry', 'place.at'])
    .$if(from !== undefined, (query) => query.where('place.at', '>=', from ?? 0))
    .$if(to !== undefined, (query) => query.where('place.at', '<', to ?? 0))
    .orderBy('place.at', 'desc')
    .orderBy('place.entry', 'desc')
    .$if(most !== undefined, (query) => query.limit(most ?? 0));
  return db
    .selectFrom(places.as('found'))
    .innerJoin('entry', (on) => on.onRef('entry.entry', '=', 'found.entry').on('entry.cellar', '=', cellar))
    .leftJoin('entry as struck', (on) =>
      on.onRef('struck.cellar', '=', 'entry.cellar').onRef('struck.corrects', '=', 'entry.entry'),
    )
    .select([...COLUMNS, ...STRUCK]);
});

/** The entries that were asked for, oldest first. Where only the last are wanted they are read from the end. */
export async function readEntries(
  db: Kysely<Tables>,
  cellar: string,
  { vessel, from, to, last: most }: EntryQuery,
): Promise<readonly LoggedEntry[]> {
  if (most !== undefined && most <= 0) return [];
  const { rows } = await asked(db, { cellar, vessel, from, to, last: most });
  return rows.map(toLoggedEntry).toSorted(comparePoints);
}
