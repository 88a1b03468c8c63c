import type { Person } from '../../core/cellar/cellar-store.ts';
import type { Entry, NewEntry } from '../../core/cellar/entry.ts';
import type { ImportProblem, ImportRead } from './import-read.ts';

/** What the cellar has that an import goes into. */
export interface KnownCellar {
  readonly nextEntry: number; // the number of an entry
  readonly people: readonly Person[];
  /** Whether an entry with that key is there. */
  readonly hasKey: (key: string) => boolean;
}

/** An import as the cellar can take it: in this order, whole, and only where there is no problem. */
export interface FittedImport {
  readonly entries: readonly NewEntry[];
  /** People that the cellar does not have yet. */
  readonly people: readonly Person[];
  readonly problems: readonly ImportProblem[];
}

/**
 * Gives the entries of a file the numbers that they get here: they follow on the last one, and what names another entry
 * names it by its new number. People keep their numbers where those are free or are theirs already.
 */
export function fitImport(read: ImportRead, cellar: KnownCellar): FittedImport {
  const there = read.entries.flatMap(({ key }, i) => (cellar.hasKey(key) ? [read.lines[i] ?? 0] : []));
  const problems = [
    ...read.problems,
    ...(there.length > 0 ? [{ code: 'already-noted' as const, lines: there.toSorted((a, b) => a - b) }] : []),
  ];
  if (problems.length > 0) return { entries: [], people: [], problems };
  const numbers = new Map(read.entries.map(({ entry }, i) => [entry, cellar.nextEntry + i]));
  const people = fitPeople(read.people, cellar.people);
  return {
    entries: read.entries.map((entry) => renumbered(entry, numbers, people.numbers)),
    people: people.added,
    problems: [],
  };
}

function renumbered(
  { entry: _entry, ...entry }: Entry,
  numbers: ReadonlyMap<number, number>,
  people: ReadonlyMap<number, number>,
): NewEntry {
  const by = people.get(entry.by) ?? entry.by;
  if (entry.kind === 'correction') return { ...entry, by, corrects: numbers.get(entry.corrects) ?? 0 };
  const order = entry.kind === 'addition' && entry.order !== undefined ? numbers.get(entry.order) : undefined;
  return order === undefined ? { ...entry, by } : ({ ...entry, by, order } as NewEntry);
}

/** The number of each person here: their own where nobody else has it, else the next free one. */
function fitPeople(
  theirs: readonly Person[],
  ours: readonly Person[],
): { readonly numbers: ReadonlyMap<number, number>; readonly added: readonly Person[] } {
  const numbers = new Map<number, number>();
  const added: Person[] = [];
  let next = Math.max(0, ...ours.map(({ number }) => number), ...theirs.map(({ number }) => number)) + 1;
  for (const person of theirs) {
    const same = ours.find(({ number }) => number === person.number);
    const isSame = same?.name !== undefined && same.name === person.name;
    const number = same === undefined || isSame ? person.number : next++;
    numbers.set(person.number, number);
    if (!isSame) added.push({ ...person, number });
  }
  return { numbers, added };
}
