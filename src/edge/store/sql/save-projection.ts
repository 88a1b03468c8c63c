import type { Kysely } from 'kysely';
import type { ProjectionChange } from '../projection/ledger.ts';
import { inParts } from './in-parts.ts';
import { placed } from './placed.ts';
import { toStandingRow } from './standing-rows.ts';
import type { Tables } from './tables.ts';

/** Keeps what changed in what is derived from the log of a cellar. */
export async function saveProjection(
  db: Kysely<Tables>,
  cellar: string,
  { voidFrom, waypoints, standings }: ProjectionChange,
): Promise<void> {
  for (const [vessel, from] of voidFrom)
    await db
      .deleteFrom('waypoint')
      .where('cellar', '=', cellar)
      .where('vessel', '=', vessel)
      .where(placed('waypoint', '>=', from))
      .execute();

  for (const part of inParts(waypoints.map((waypoint) => toStandingRow(cellar, waypoint))))
    await db
      .insertInto('waypoint')
      .values(part)
      .onConflict((on) =>
        on.columns(['cellar', 'vessel', 'at', 'entry']).doUpdateSet((eb) => ({
          run: eb.ref('excluded.run'),
          state: eb.ref('excluded.state'),
        })),
      )
      .execute();

  const gone = [...standings].flatMap(([vessel, standing]) => (standing === undefined ? [vessel] : []));
  for (const part of inParts(gone))
    await db.deleteFrom('vessel').where('cellar', '=', cellar).where('vessel', 'in', part).execute();

  const known = [...standings.values()].filter((standing) => standing !== undefined);
  for (const part of inParts(known.map((standing) => toStandingRow(cellar, standing))))
    await db
      .insertInto('vessel')
      .values(part)
      .onConflict((on) =>
        on.columns(['cellar', 'vessel']).doUpdateSet((eb) => ({
          at: eb.ref('excluded.at'),
          entry: eb.ref('excluded.entry'),
          run: eb.ref('excluded.run'),
          state: eb.ref('excluded.state'),
        })),
      )
      .execute();
}
