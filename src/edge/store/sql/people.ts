import type { Kysely } from 'kysely';
import type { Person } from '../../../core/cellar/cellar-store.ts';
import type { Tables } from './tables.ts';

const toPerson = ({ number, name }: { number: number; name: string | null }): Person =>
  name === null ? { number } : { number, name };

/** The person whom the platform knows by this id. */
export async function readPerson(
  db: Kysely<Tables>,
  cellar: string,
  id: string,
): Promise<Person | undefined> {
  const query = db.selectFrom('person').select(['number', 'name']).where('cellar', '=', cellar);
  const row = await query.where('id', '=', id).executeTakeFirst();
  return row && toPerson(row);
}

/** All people of a cellar, by number. */
export async function readPeople(db: Kysely<Tables>, cellar: string): Promise<readonly Person[]> {
  const query = db.selectFrom('person').select(['number', 'name']).where('cellar', '=', cellar);
  return (await query.orderBy('number').execute()).map(toPerson);
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
  await db
    .insertInto('person')
    .values({ cellar, number, id, name: name ?? null })
    .onConflict((on) =>
      on.columns(['cellar', 'number']).doUpdateSet((eb) => ({
        id: eb.ref('excluded.id'),
        name: eb.ref('excluded.name'),
      })),
    )
    .execute();
}
