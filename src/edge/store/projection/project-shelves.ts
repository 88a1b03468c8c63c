import type { Entry } from '../../../core/cellar/entry.ts';
import { stockMove } from '../../../core/cellar/stock-move.ts';
import { changedShelf, type ShelfChange } from './changed-shelf.ts';
import { foldShelf, type KeptShelf } from './kept-shelf.ts';
import type { Ledger } from './ledger.ts';

/** Brings the shelves of the chemical store up to entries that were just put into the log. */
export async function projectShelves(ledger: Ledger, entries: readonly Entry[]): Promise<void> {
  const news = entries.filter((entry) => stockMove(entry) !== undefined);
  const gone = await takenBack(ledger, entries);
  if (news.length + gone.length === 0) return;
  const kept = new Map((await ledger.shelves()).map((shelf) => [shelf.shelf, shelf]));
  const shelves = new Map<string, KeptShelf | undefined>();
  for (const [name, change] of byShelf(news, gone)) {
    const before = kept.get(name);
    const after = await changedShelf(ledger, before, change);
    if (after !== before) shelves.set(name, after);
  }
  if (shelves.size > 0) await ledger.saveShelves(shelves);
}

/** Every shelf, an entry further. */
export function foldShelves(shelves: Map<string, KeptShelf>, entry: Entry): void {
  const name = stockMove(entry)?.shelf;
  const after = name === undefined ? undefined : foldShelf(shelves.get(name), [entry]);
  if (after !== undefined) shelves.set(after.shelf, after);
}

function byShelf(news: readonly Entry[], gone: readonly Entry[]): ReadonlyMap<string, ShelfChange> {
  const changes = new Map<string, ShelfChange>();
  const of = (entry: Entry): ShelfChange => {
    const name = stockMove(entry)?.shelf ?? '';
    const change = changes.get(name) ?? { news: [], gone: [] };
    changes.set(name, change);
    return change;
  };
  for (const entry of news) of(entry).news.push(entry);
  for (const entry of gone) of(entry).gone.push(entry);
  return changes;
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
