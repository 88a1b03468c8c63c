import type { Kysely } from 'kysely';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import { readyQuery } from './ready-query.ts';
import { toVessel } from './standing-rows.ts';
import type { Tables } from './tables.ts';

const states = (db: Kysely<Tables>, cellar: string) =>
  db.selectFrom('vessel').select('state').where('cellar', '=', cellar);

const ofName = readyQuery((db, { cellar, vessel }: { readonly cellar: string; readonly vessel: string }) =>
  states(db, cellar).where('vessel', '=', vessel),
);

const all = readyQuery((db, { cellar }: { readonly cellar: string }) => states(db, cellar));

/** The vessel of that name. */
export async function readVessel(
  db: Kysely<Tables>,
  cellar: string,
  vessel: string,
): Promise<Vessel | undefined> {
  const [row] = (await ofName(db, { cellar, vessel })).rows;
  return toVessel(row?.state ?? null);
}

/** All vessels of a cellar, by name. */
export async function readVessels(db: Kysely<Tables>, cellar: string): Promise<readonly Vessel[]> {
  const { rows } = await all(db, { cellar });
  const vessels = rows.flatMap(({ state }) => toVessel(state) ?? []);
  // Sorted here and not by the database: each has an order of letters of its own.
  return vessels.sort((one, other) => (one.vessel < other.vessel ? -1 : 1));
}
