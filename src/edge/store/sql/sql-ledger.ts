import type { Kysely } from 'kysely';
import type { Ledger } from '../projection/ledger.ts';
import { inParts } from './in-parts.ts';
import { placed } from './placed.ts';
import { readCounted, readCountedOf } from './read-counted.ts';
import { readEntry, readNextEntry } from './read-entries.ts';
import { toEntryRow, toTouched } from './entry-rows.ts';
import { saveProjection } from './save-projection.ts';
import { toStanding } from './standing-rows.ts';
import type { Tables } from './tables.ts';

/** The log of a cellar, and what is derived from it, in the tables. */
export function createSqlLedger(db: Kysely<Tables>, cellar: string): Ledger {
  const waypoints = () => db.selectFrom('waypoint').where('cellar', '=', cellar);
  return {
    nextEntry: () => readNextEntry(db, cellar),
    entry: (number) => readEntry(db, cellar, number),
    keysTaken: async (keys) => {
      const taken: string[] = [];
      for (const part of inParts(keys)) {
        const query = db
          .selectFrom('entry')
          .select('key')
          .where('cellar', '=', cellar)
          .where('key', 'in', part);
        taken.push(...(await query.execute()).map(({ key }) => key));
      }
      return taken;
    },
    insert: async (entries) => {
      for (const part of inParts(entries))
        await db
          .insertInto('entry')
          .values(part.map((entry) => toEntryRow(cellar, entry)))
          .execute();
      for (const part of inParts(entries.flatMap((entry) => toTouched(cellar, entry))))
        await db.insertInto('touched').values(part).execute();
    },
    countedOf: (vessel, range) => readCountedOf(db, { cellar, vessel }, range),
    counted: (after, most) => readCounted(db, cellar, { after, most }),
    standings: async (vessels) => {
      const rows = [];
      for (const part of inParts(vessels)) {
        const query = db.selectFrom('vessel').selectAll().where('cellar', '=', cellar);
        rows.push(...(await query.where('vessel', 'in', part).execute()));
      }
      return new Map(rows.map((row) => [row.vessel, toStanding(row)]));
    },
    allStandings: async () => {
      const rows = await db.selectFrom('vessel').selectAll().where('cellar', '=', cellar).execute();
      return rows.map(toStanding);
    },
    lastWaypoint: async (vessel, before) => {
      const row = await waypoints()
        .selectAll()
        .where('vessel', '=', vessel)
        .where(placed('waypoint', '<', before))
        .orderBy('at', 'desc')
        .orderBy('entry', 'desc')
        .limit(1)
        .executeTakeFirst();
      return row && toStanding(row);
    },
    waypointPlaces: () => waypoints().select(['vessel', 'at', 'entry']).execute(),
    waypoint: async ({ vessel, at, entry }) => {
      const query = waypoints().selectAll().where('vessel', '=', vessel).where('at', '=', at);
      const row = await query.where('entry', '=', entry).executeTakeFirst();
      return row && toStanding(row);
    },
    dropWaypoints: async (places) => {
      for (const { vessel, at, entry } of places) {
        const rows = db.deleteFrom('waypoint').where('cellar', '=', cellar).where('vessel', '=', vessel);
        await rows.where('at', '=', at).where('entry', '=', entry).execute();
      }
    },
    save: (change) => saveProjection(db, cellar, change),
  };
}
