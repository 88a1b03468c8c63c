import { applyToShelf } from '../../../core/cellar/apply-to-shelf.ts';
import type { Entry } from '../../../core/cellar/entry.ts';
import type { Shelf } from '../../../core/cellar/shelf.ts';
import { stockMove } from '../../../core/cellar/stock-move.ts';
import type { Ledger } from './ledger.ts';
import { BEGINNING, comparePoints, type Point } from './point.ts';

/**
 * Brings the shelves of the chemical store up to entries that were just put into the log. What comes in and goes out
 * only sums up: it is added, or taken away again, in whatever order it is noted. Only a count, a first receipt that comes
 * late, and a correction of what lies before the last count ask for entries of the log.
 */
export async function projectShelves(ledger: Ledger, entries: readonly Entry[]): Promise<void> {
  const news = entries.filter((entry) => stockMove(entry) !== undefined);
  const gone = await takenBack(ledger, entries);
  if (news.length + gone.length === 0) return;
  const kept = new Map((await ledger.shelves()).map((shelf) => [shelf.shelf, shelf]));
  const touched = new Map<string, Change>();
  for (const [list, changed] of [
    ['news', news],
    ['gone', gone],
  ] as const)
    for (const entry of changed) {
      const name = stockMove(entry)?.shelf ?? '';
      const change = touched.get(name) ?? { news: [], gone: [] };
      change[list].push(entry);
      touched.set(name, change);
    }
  const shelves = new Map<string, Shelf | undefined>();
  for (const [name, change] of touched) {
    const before = kept.get(name);
    const after = await changedShelf(ledger, before, change);
    if (after !== before) shelves.set(name, after);
  }
  if (shelves.size > 0) await ledger.saveShelves(shelves);
}

/** Every shelf, an entry further. */
export function foldShelves(shelves: Map<string, Shelf>, entry: Entry): void {
  const name = stockMove(entry)?.shelf;
  const after = name === undefined ? undefined : applyToShelf(shelves.get(name), entry);
  if (after !== undefined) shelves.set(after.shelf, after);
}

interface Change {
  readonly news: Entry[];
  readonly gone: Entry[];
}

/** What the corrections among some entries take back. */
async function takenBack(ledger: Ledger, entries: readonly Entry[]): Promise<readonly Entry[]> {
  const gone: Entry[] = [];
  for (const entry of entries) {
    if (entry.kind !== 'correction') continue;
    const named = await ledger.entry(entry.corrects);
    if (named !== undefined && stockMove(named) !== undefined) gone.push(named);
  }
  return gone;
}

async function changedShelf(
  ledger: Ledger,
  before: Shelf | undefined,
  { news, gone }: Change,
): Promise<Shelf | undefined> {
  const all = [...news, ...gone];
  if (before === undefined && all.every(({ kind }) => kind === 'addition')) return undefined;
  const from: Point | undefined = before && { at: before.from_at, entry: before.from_entry };
  const isSince = from !== undefined && all.every((entry) => comparePoints(entry, from) > 0);
  const isSum = all.every((entry) => stockMove(entry)?.does !== 'count');
  if (before !== undefined && isSince && isSum) {
    const isIn = (list: readonly Entry[], { entry }: Entry): boolean =>
      list.some((one) => one.entry === entry);
    const fresh = news.filter((entry) => !isIn(gone, entry));
    const struck = gone.filter((entry) => !isIn(news, entry));
    return foldAll(foldAll(before, struck, -1), fresh);
  }
  const [first] = all.toSorted(comparePoints);
  const move = first && stockMove(first);
  const additive = move?.kind.additive;
  if (first === undefined || additive === undefined) return before;
  // What went out before there was a shelf is not reckoned with.
  const start = before === undefined || (isSince && gone.length === 0) ? first : BEGINNING;
  const later = (await ledger.movesOf(additive, start)).filter(
    (entry) => stockMove(entry)?.shelf === move?.shelf,
  );
  if (before === undefined || start === BEGINNING) return foldAll(undefined, later);
  const fresh = new Set(news.map(({ entry }) => entry));
  const known = later.filter(({ entry }) => !fresh.has(entry));
  return foldAll(foldAll(before, known, -1), later);
}

const foldAll = (
  before: Shelf | undefined,
  entries: readonly Entry[],
  times: 1 | -1 = 1,
): Shelf | undefined =>
  entries.reduce<Shelf | undefined>((shelf, entry) => applyToShelf(shelf, entry, times), before);
