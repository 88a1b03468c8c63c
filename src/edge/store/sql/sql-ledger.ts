import type { Kysely } from 'kysely';
import type { Ledger } from '../projection/ledger.ts';
import { inParts } from './in-parts.ts';
import { placed } from './placed.ts';
import { readCounted, readCountedOf, readMovesOf } from './read-counted.ts';
import { readEntry, readNextEntry } from './read-entries.ts';
import { toEntryRow, toTouched } from './entry-rows.ts';
import { readyQuery } from './ready-query.ts';
import { saveProjection } from './save-projection.ts';
import { keepShelves, readShelves } from './shelves.ts';
import { toStanding } from './standing-rows.ts';
import type { EntryRow, Tables } from './tables.ts';

type OfCellar = { readonly cellar: string };

const insertEntry = readyQuery((db, row: EntryRow) => db.insertInto('entry').values(row));

const insertTouched = readyQuery((db, row: Tables['touched']) => db.insertInto('touched').values(row));

const ofKeys = readyQuery((db, { cellar, keys }: OfCellar & { readonly keys: readonly string[] }) =>
  db.selectFrom('entry').select('key').where('cellar', '=', cellar).where('key', 'in', keys),
);

const ofVessels = readyQuery((db, { cellar, vessels }: OfCellar & { readonly vessels: readonly string[] }) =>
  db.selectFrom('vessel').selectAll().where('cellar', '=', cellar).where('vessel', 'in', vessels),
);

/** The log of a cellar, and what is derived from it, in the tables. */
export function createSqlLedger(db: Kysely<Tables>, cellar: string): Ledger {
  const waypoints = () => db.selectFrom('waypoint').where('cellar', '=', cellar);
  return {
    nextEntry: () => readNextEntry(db, cellar),
    entry: (number) => readEntry(db, cellar, number),
    keysTaken: async (keys) => {
      const taken: string[] = [];
      for (const part of inParts(keys))
        taken.push(...(await ofKeys(db, { cellar, keys: part })).rows.map(({ key }) => key));
      return taken;
    },
    insert: async (entries) => {
      for (const entry of entries) await insertEntry(db, toEntryRow(cellar, entry));
      for (const entry of entries) for (const row of toTouched(cellar, entry)) await insertTouched(db, row);
    },
    countedOf: (vessel, range) => readCountedOf(db, { cellar, vessel }, range),
    counted: (after, most) => readCounted(db, cellar, { after, most }),
    standings: async (vessels) => {
      const rows = [];
      for (const part of inParts(vessels))
        rows.push(...(await ofVessels(db, { cellar, vessels: part })).rows);
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
    shelves: () => readShelves(db, cellar),
    saveShelves: (shelves) => keepShelves(db, cellar, shelves),
    movesOf: (additive, from) => readMovesOf(db, { cellar, additive }, from),
  };
}
