import type { Kysely } from 'kysely';
import type { KeptShelf } from '../projection/kept-shelf.ts';
import { readyQuery } from './ready-query.ts';
import type { Tables } from './tables.ts';

const ofCellar = readyQuery((db, { cellar }: { readonly cellar: string }) =>
  db.selectFrom('shelf').select('state').where('cellar', '=', cellar),
);

/** The shelves of a cellar's chemical store, by name. */
export async function readShelves(db: Kysely<Tables>, cellar: string): Promise<readonly KeptShelf[]> {
  const { rows } = await ofCellar(db, { cellar });
  const shelves = rows.map(({ state }) => JSON.parse(state) as KeptShelf);
  return shelves.sort((one, other) => (one.shelf < other.shelf ? -1 : 1));
}

/** Keeps shelves as they are now; those that are undefined go. */
export async function keepShelves(
  db: Kysely<Tables>,
  cellar: string,
  shelves: ReadonlyMap<string, KeptShelf | undefined>,
): Promise<void> {
  for (const [shelf, state] of shelves)
    if (state === undefined)
      await db.deleteFrom('shelf').where('cellar', '=', cellar).where('shelf', '=', shelf).execute();
    else
      await db
        .insertInto('shelf')
        .values({ cellar, shelf, state: JSON.stringify(state) })
        .onConflict((on) =>
          on.columns(['cellar', 'shelf']).doUpdateSet((eb) => ({ state: eb.ref('excluded.state') })),
        )
        .execute();
}
