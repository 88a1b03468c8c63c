import type { Kysely } from 'kysely';
import type { Person } from '../../../core/cellar/cellar-store.ts';
import { readyQuery } from './ready-query.ts';
import type { Tables } from './tables.ts';

const toPerson = ({ number, name }: { number: number; name: string | null }): Person =>
  name === null ? { number } : { number, name };

const ofCellar = (db: Kysely<Tables>, cellar: string) =>
  db.selectFrom('person').select(['number', 'name']).where('cellar', '=', cellar);

const ofId = readyQuery((db, { cellar, id }: { readonly cellar: string; readonly id: string }) =>
  ofCellar(db, cellar).where('id', '=', id),
);

const all = readyQuery((db, { cellar }: { readonly cellar: string }) =>
  ofCellar(db, cellar).orderBy('number'),
);

const keep = readyQuery((db, row: Tables['person']) =>
  db
    .insertInto('person')
    .values(row)
    .onConflict((on) =>
      on.columns(['cellar', 'number']).doUpdateSet((eb) => ({
        id: eb.ref('excluded.id'),
        name: eb.ref('excluded.name'),
      })),
    ),
);

/** The person whom the platform knows by this id. */
export async function readPerson(
  db: Kysely<Tables>,
  cellar: string,
  id: string,
): Promise<Person | undefined> {
  const [row] = (await ofId(db, { cellar, id })).rows;
  return row && toPerson(row);
}

/** All people of a cellar, by number. */
export async function readPeople(db: Kysely<Tables>, cellar: string): Promise<readonly Person[]> {
  return (await all(db, { cellar })).rows.map(toPerson);
}

/**
 * Keeps who has a number, in place of what was known of it; `id` is null for one who is forgotten.
 *
 * @throws RangeError where the id is another's
 */
export async function keepPerson(
  db: Kysely<Tables>,
  cellar: string,
  { number, id, name }: Person & { readonly id: string | null },
): Promise<void> {
  const known = id === null ? undefined : await readPerson(db, cellar, id);
  if (known !== undefined && known.number !== number)
    throw new RangeError(`person ${number} is number ${known.number} already`);
  await keep(db, { cellar, number, id, name: name ?? null });
}
