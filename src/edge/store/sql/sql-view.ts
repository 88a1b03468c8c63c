import type { Kysely } from 'kysely';
import type { CellarView } from '../../../core/cellar/cellar-store.ts';
import { readAllDue, readDue } from './due-things.ts';
import { readKept, readKeptOf, readKeptUnder } from './kept-texts.ts';
import { readPeople, readPerson } from './people.ts';
import {
  readEntries,
  readEntriesOfKeys,
  readEntry,
  readEntryOfKey,
  readLastEntryBy,
  readNextEntry,
} from './read-entries.ts';
import { readVessel, readVessels } from './read-vessels.ts';
import { shelfOf } from '../projection/kept-shelf.ts';
import { readShelves } from './shelves.ts';
import type { Tables } from './tables.ts';

/** How the tables of a cellar are looked at. `now` is milliseconds since 1970. */
export interface SqlViewOptions {
  readonly cellar: string;
  readonly now: () => number;
  /** Called before each reading. */
  readonly onRead?: () => void;
}

/** A cellar as its tables have it. */
export function createSqlView(db: Kysely<Tables>, { cellar, now, onRead }: SqlViewOptions): CellarView {
  const looking = (): Kysely<Tables> => {
    onRead?.();
    return db;
  };
  return {
    nextEntry: () => readNextEntry(looking(), cellar),
    entry: (number) => readEntry(looking(), cellar, number),
    entryOfKey: (key) => readEntryOfKey(looking(), cellar, key),
    entriesOfKeys: (begin) => readEntriesOfKeys(looking(), cellar, begin),
    entries: (query) => readEntries(looking(), cellar, query),
    lastEntryBy: (person) => readLastEntryBy(looking(), cellar, person),
    vessel: (name) => readVessel(looking(), cellar, name),
    vessels: () => readVessels(looking(), cellar),
    shelves: async () => (await readShelves(looking(), cellar)).map(shelfOf),
    person: (id) => readPerson(looking(), cellar, id),
    people: () => readPeople(looking(), cellar),
    kept: (key) => readKept(looking(), cellar, { key, now: now() }),
    keptOf: (keys) => readKeptOf(looking(), cellar, { keys, now: now() }),
    keptUnder: (begin) => readKeptUnder(looking(), cellar, { begin, now: now() }),
    due: (id) => readDue(looking(), cellar, id),
    allDue: () => readAllDue(looking(), cellar),
  };
}
