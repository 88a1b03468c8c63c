import type { Kysely } from 'kysely';
import { pastPrefix } from '../past-prefix.ts';
import type { Tables } from './tables.ts';

/** A text that is kept under a key, for ever or until a moment. */
export interface KeptText {
  readonly key: string;
  readonly text: string;
  readonly until?: number;
}

const unlapsed = (db: Kysely<Tables>, cellar: string, now: number) =>
  db
    .selectFrom('kept')
    .select(['key', 'text'])
    .where('cellar', '=', cellar)
    .where((eb) => eb.or([eb('until', 'is', null), eb('until', '>', now)]));

/** The text under a key, unless it has lapsed. */
export async function readKept(
  db: Kysely<Tables>,
  cellar: string,
  { key, now }: { readonly key: string; readonly now: number },
): Promise<string | undefined> {
  return (await unlapsed(db, cellar, now).where('key', '=', key).executeTakeFirst())?.text;
}

/** The texts under some keys that have not lapsed, by key. */
export async function readKeptOf(
  db: Kysely<Tables>,
  cellar: string,
  { keys, now }: { readonly keys: readonly string[]; readonly now: number },
): Promise<ReadonlyMap<string, string>> {
  if (keys.length === 0) return new Map();
  const rows = await unlapsed(db, cellar, now).where('key', 'in', keys).execute();
  return new Map(rows.map(({ key, text }) => [key, text]));
}

/** The texts under keys that begin so and have not lapsed, by key. */
export async function readKeptUnder(
  db: Kysely<Tables>,
  cellar: string,
  { begin, now }: { readonly begin: string; readonly now: number },
): Promise<readonly KeptText[]> {
  const past = pastPrefix(begin);
  const rows = await unlapsed(db, cellar, now)
    .where('key', '>=', begin)
    .$if(past !== undefined, (query) => query.where('key', '<', past ?? ''))
    .execute();
  return rows.toSorted((one, other) => (one.key < other.key ? -1 : 1));
}

/** Keeps a text in place of what was there. What has lapsed goes with it. */
export async function keepText(
  db: Kysely<Tables>,
  cellar: string,
  { key, text, until, now }: KeptText & { readonly now: number },
): Promise<void> {
  await db
    .insertInto('kept')
    .values({ cellar, key, text, until: until ?? null })
    .onConflict((on) =>
      on.columns(['cellar', 'key']).doUpdateSet((eb) => ({
        text: eb.ref('excluded.text'),
        until: eb.ref('excluded.until'),
      })),
    )
    .execute();
  if (until === undefined) return;
  await db.deleteFrom('kept').where('cellar', '=', cellar).where('until', '<=', now).execute();
}

/** Drops what is kept under a key, where there is anything. */
export async function dropText(db: Kysely<Tables>, cellar: string, key: string): Promise<void> {
  await db.deleteFrom('kept').where('cellar', '=', cellar).where('key', '=', key).execute();
}
