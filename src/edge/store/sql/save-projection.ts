import type { Kysely } from 'kysely';
import type { ProjectionChange } from '../projection/ledger.ts';
import { inParts } from './in-parts.ts';
import { placed } from './placed.ts';
import { readyQuery } from './ready-query.ts';
import { toStandingRow } from './standing-rows.ts';
import type { StandingRow, Tables } from './tables.ts';

const keepWaypoint = readyQuery((db, row: StandingRow) =>
  db
    .insertInto('waypoint')
    .values(row)
    .onConflict((on) =>
      on.columns(['cellar', 'vessel', 'at', 'entry']).doUpdateSet((eb) => ({
        run: eb.ref('excluded.run'),
        state: eb.ref('excluded.state'),
      })),
    ),
);

const keepStanding = readyQuery((db, row: StandingRow) =>
  db
    .insertInto('vessel')
    .values(row)
    .onConflict((on) =>
      on.columns(['cellar', 'vessel']).doUpdateSet((eb) => ({
        at: eb.ref('excluded.at'),
        entry: eb.ref('excluded.entry'),
        run: eb.ref('excluded.run'),
        state: eb.ref('excluded.state'),
      })),
    ),
);

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

  for (const waypoint of waypoints) await keepWaypoint(db, toStandingRow(cellar, waypoint));

  const gone = [...standings].flatMap(([vessel, standing]) => (standing === undefined ? [vessel] : []));
  for (const part of inParts(gone))
    await db.deleteFrom('vessel').where('cellar', '=', cellar).where('vessel', 'in', part).execute();

  for (const standing of standings.values())
    if (standing !== undefined) await keepStanding(db, toStandingRow(cellar, standing));
}
