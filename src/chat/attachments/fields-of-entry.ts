import type { Entry } from '../../core/cellar/entry.ts';
import type { EntryField } from './entry-fields.ts';

/** The value of a field. */
export type FieldValue = string | number | boolean | readonly string[];

/** An entry as one list of fields. */
export type EntryFields = Readonly<Partial<Record<EntryField, FieldValue>>>;

/** The fields of an entry, those of a vessel's usual additive among them. */
export function fieldsOfEntry(entry: Entry): EntryFields {
  if (entry.kind !== 'vessel') return entry;
  const { usual, ...rest } = entry;
  return { ...rest, ...usual };
}
