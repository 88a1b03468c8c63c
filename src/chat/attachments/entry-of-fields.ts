import type { Entry } from '../../core/cellar/entry.ts';
import type { EntryField } from './entry-fields.ts';
import type { EntryFields, FieldValue } from './fields-of-entry.ts';
import { USUAL_FIELDS, fieldsOfKind, isEventOf } from './kind-fields.ts';
import type { Kind } from './kind-fields.ts';

/** What stands for a field that an entry must have and that an empty cell leaves out. */
const EMPTY: Readonly<Partial<Record<EntryField, FieldValue>>> = { vessels: [], remark: '', reason: '' };

/**
 * The entry that has these fields, each of which has the form of its kind. Undefined where one is missing that the
 * kind must have, or one is there that it cannot have: then the fields are no entry.
 */
export function entryOfFields(fields: EntryFields): Entry | undefined {
  if (fields.kind === undefined) return undefined;
  const known = fieldsOfKind(fields.kind as Kind);
  if (Object.keys(fields).some((name) => !Object.hasOwn(known, name))) return undefined;
  if (!isEventOf(fields.kind as Kind, fields.event)) return undefined;
  const entry: Record<string, unknown> = {};
  const usual: Record<string, unknown> = {};
  for (const [field, need] of Object.entries(known) as [EntryField, 'must' | 'may'][]) {
    const value = fields[field] ?? (need === 'must' ? EMPTY[field] : undefined);
    if (value === undefined && need === 'must') return undefined;
    const isUsual = fields.kind === 'vessel' && USUAL_FIELDS.some((one) => one === field);
    if (value !== undefined) (isUsual ? usual : entry)[field] = value;
  }
  if (Object.keys(usual).length > 0) entry['usual'] = usual;
  // The tables of fields, which the type check holds against the types of entries, say that this is one.
  return entry as unknown as Entry;
}
