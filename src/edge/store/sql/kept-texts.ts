import type { Kysely } from 'kysely';
import { pastPrefix } from '../past-prefix.ts';
import { readyQuery } from './ready-query.ts';
import type { Tables } from './tables.ts';

/** A text that is kept under a key, for ever or until a moment. */
export interface KeptText {
  readonly key: string;
  readonly text: string;
  readonly until?: number;
}

const unlapsed = (db: Kysely<Tables>, { cellar, now }: { readonly cellar: string; readonly now: number }) =>
  db
    .selectFrom('kept')
    .select(['key', 'text'])
    .where('cellar', '=', cellar)
    .where((eb) => eb.or([eb('until', 'is', null), eb('until', '>', now)]));

type OfCellar = { readonly cellar: string; readonly now: number };

const underKey = readyQuery((db, { key, ...of }: OfCellar & { readonly key: string }) =>
  unlapsed(db, of).where('key', '=', key),
);

const underKeys = readyQuery((db, { keys, ...of }: OfCellar & { readonly keys: readonly string[] }) =>
  unlapsed(db, of).where('key', 'in', keys),
);

const between = readyQuery(
  (db, { begin, past, ...of }: OfCellar & { readonly begin: string; readonly past: string | undefined }) =>
    unlapsed(db, of)
      .where('key', '>=', begin)
      .$if(past !== undefined, (query) => query.where('key', '<', past ?? '')),
);

/** The text under a key, unless it has lapsed. */
export async function readKept(
  db: Kysely<Tables>,
  cellar: string,
  { key, now }: { readonly key: string; readonly now: number },
): Promise<string | undefined> {
  return (await underKey(db, { cellar, now, key })).rows[0]?.text;
}

/** The texts under some keys that have not lapsed, by key. */
export async function readKeptOf(
  db: Kysely<Tables>,
  cellar: string,
  { keys, now }: { readonly keys: readonly string[]; readonly now: number },
): Promise<ReadonlyMap<string, string>> {
  if (keys.length === 0) return new Map();
  const { rows } = await underKeys(db, { cellar, now, keys });
  return new Map(rows.map(({ key, text }) => [key, text]));
}

/** The texts under keys that begin so and have not lapsed, by key. */
export async function readKeptUnder(
  db: Kysely<Tables>,
  cellar: string,
  { begin, now }: { readonly begin: string; readonly now: number },
): Promise<readonly KeptText[]> {
  const { rows } = await between(db, { cellar, now, begin, past: pastPrefix(begin) });
  return rows.toSorted((one, other) => (one.key < other.key ? -1 : 1));
}

const keep = readyQuery((db, row: Tables['kept']) =>
  db
    .insertInto('kept')
    .values(row)
    .onConflict((on) =>
      on.columns(['cellar', 'key']).doUpdateSet((eb) => ({
        text: eb.ref('excluded.text'),
        until: eb.ref('excluded.until'),
      })),
    ),
);

const dropLapsed = readyQuery((db, { cellar, now }: OfCellar) =>
  db.deleteFrom('kept').where('cellar', '=', cellar).where('until', '<=', now),
);

const drop = readyQuery((db, { cellar, key }: { readonly cellar: string; readonly key: string }) =>
  db.deleteFrom('kept').where('cellar', '=', cellar).where('key', '=', key),
);

/** Keeps a text in place of what was there. */
export async function keepText(
  db: Kysely<Tables>,
  cellar: string,
  { key, text, until }: KeptText,
): Promise<void> {
  await keep(db, { cellar, key, text, until: until ?? null });
}

/** Drops the texts of a cellar that have lapsed. */
export async function dropLapsedTexts(db: Kysely<Tables>, cellar: string, now: number): Promise<void> {
  await dropLapsed(db, { cellar, now });
}

/** Drops what is kept under a key, where there is anything. */
export async function dropText(db: Kysely<Tables>, cellar: string, key: string): Promise<void> {
  await drop(db, { cellar, key });
}
