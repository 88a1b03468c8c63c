import type { NewEntry } from '../../../core/cellar/entry.ts';
import { checkEntries } from './check-entries.ts';
import type { Ledger } from './ledger.ts';
import { projectEntries } from './project-entries.ts';
import { projectShelves } from './project-shelves.ts';

/** Gives entries their numbers, checks them, puts them into the log and brings the vessels up to them. */
export async function noteEntries(ledger: Ledger, news: readonly NewEntry[]): Promise<void> {
  if (news.length === 0) return;
  const first = await ledger.nextEntry();
  const entries = news.map((entry, place) => ({ ...entry, entry: first + place }));
  await checkEntries(ledger, entries);
  await ledger.insert(entries);
  await projectEntries(ledger, entries);
  await projectShelves(ledger, entries);
}
