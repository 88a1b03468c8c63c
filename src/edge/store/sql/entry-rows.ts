import type { Entry, Happening, LoggedEntry, Noting } from '../../../core/cellar/entry.ts';
import { touches } from '../../../core/cellar/touches.ts';
import type { EntryRow, Tables } from './tables.ts';

/** An entry as a row. */
export function toEntryRow(cellar: string, { entry, key, at, noted_at, by, ...happening }: Entry): EntryRow {
  const corrects = happening.kind === 'correction' ? happening.corrects : null;
  const content = JSON.stringify(happening);
  return { cellar, entry, key, at, noted_at, person: by, kind: happening.kind, corrects, content };
}

/** The rows by which an entry is found under each vessel that it is about. */
export function toTouched(cellar: string, entry: Entry): Tables['touched'][] {
  const vessels = new Set(touches(entry));
  return Array.from(vessels, (vessel) => ({ cellar, vessel, at: entry.at, entry: entry.entry }));
}

/** An entry out of its row. */
export function toEntry(row: Omit<EntryRow, 'cellar' | 'kind' | 'corrects'>): Entry {
  const { entry, key, at, noted_at, person: by } = row;
  const noting: Noting & { entry: number } = { entry, key, at, noted_at, by };
  return { ...(JSON.parse(row.content) as Happening), ...noting };
}

/** The correction of an entry beside it; null where nobody took it back. */
export interface StruckRow {
  readonly struck_entry: number | null;
  readonly struck_content: string | null;
}

/** An entry out of its row and that of its correction. */
export function toLoggedEntry(row: Parameters<typeof toEntry>[0] & StruckRow): LoggedEntry {
  const entry = toEntry(row);
  if (row.struck_entry === null || row.struck_content === null) return entry;
  const { reason } = JSON.parse(row.struck_content) as { reason: string };
  return { ...entry, struck: { entry: row.struck_entry, reason } };
}
