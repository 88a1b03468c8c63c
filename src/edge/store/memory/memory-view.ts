import type { CellarView, Person } from '../../../core/cellar/cellar-store.ts';
import type { Vessel } from '../../../core/cellar/vessel.ts';
import { shelfOf, type KeptShelf } from '../projection/kept-shelf.ts';
import type { Standing } from '../projection/standing.ts';
import { counts, entryOf, inOrder, loggedOf, type MemoryCellar } from './memory-cellar.ts';

/** A cellar in memory as the port has it. `now` is milliseconds since 1970. */
export function createMemoryView(cellar: MemoryCellar, now: () => number): CellarView {
  const unlapsed = (until: number | undefined): boolean => until === undefined || until > now();
  return {
    nextEntry: async () => cellar.log.length + 1,
    entry: async (number) => {
      const one = cellar.log[number - 1];
      return one && loggedOf(cellar, one);
    },
    entryOfKey: async (key) => {
      const one = cellar.byKey.get(key);
      return one && loggedOf(cellar, one);
    },
    entriesOfKeys: async (begin) => {
      const found = cellar.log.filter(({ key }) => key.startsWith(begin));
      return inOrder(found).map((one) => loggedOf(cellar, one));
    },
    entries: async ({ vessel, from = -Infinity, to = Infinity, last = Infinity }) => {
      const all = vessel === undefined ? cellar.log : (cellar.byVessel.get(vessel) ?? []);
      const found = inOrder(all.filter(({ at }) => at >= from && at < to));
      return found.slice(Math.max(0, found.length - last)).map((one) => loggedOf(cellar, one));
    },
    lastEntryBy: async (person) => {
      const one = cellar.log.findLast((entry) => entry.by === person && counts(cellar, entry));
      return one && entryOf(one);
    },
    vessel: async (name) => {
      const text = cellar.standings.get(name);
      return text === undefined ? undefined : stateOf(text);
    },
    vessels: async () => {
      const states = Array.from(cellar.standings.values(), stateOf).filter((state) => state !== undefined);
      return states.sort((one, other) => (one.vessel < other.vessel ? -1 : 1));
    },
    shelves: async () =>
      Array.from(cellar.shelves.values(), (text) => shelfOf(JSON.parse(text) as KeptShelf)).sort(
        (one, other) => (one.shelf < other.shelf ? -1 : 1),
      ),
    person: async (id) => {
      const found = [...cellar.people].find(([, person]) => person.id === id);
      return found && toPerson(found[0], found[1].name);
    },
    people: async () =>
      [...cellar.people]
        .toSorted(([one], [other]) => one - other)
        .map(([number, { name }]) => toPerson(number, name)),
    kept: async (key) => {
      const found = cellar.kept.get(key);
      return found !== undefined && unlapsed(found.until) ? found.text : undefined;
    },
    keptOf: async (keys) => {
      const found = keys.map((key) => [key, cellar.kept.get(key)] as const);
      return new Map(
        found.flatMap(([key, one]) => (one && unlapsed(one.until) ? [[key, one.text] as const] : [])),
      );
    },
    keptUnder: async (begin) =>
      [...cellar.kept]
        .filter(([key, { until }]) => key.startsWith(begin) && unlapsed(until))
        .toSorted(([one], [other]) => (one < other ? -1 : 1))
        .map(([key, { text }]) => ({ key, text })),
    due: async (id) => {
      const found = cellar.due.get(id);
      return found === undefined || found.said ? undefined : { ...found.due };
    },
    allDue: async () =>
      [...cellar.due.values()]
        .filter(({ said }) => !said)
        .map(({ due }) => ({ ...due }))
        .sort((one, other) => one.at - other.at || (one.id < other.id ? -1 : 1)),
  };
}

const toPerson = (number: number, name: string | undefined): Person =>
  name === undefined ? { number } : { number, name };

const stateOf = (text: string): Vessel | undefined => (JSON.parse(text) as Standing).state;
