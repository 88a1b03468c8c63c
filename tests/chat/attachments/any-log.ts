import fc from 'fast-check';
import type { Person } from '../../../src/core/cellar/cellar-store.ts';
import type { Entry, LoggedEntry } from '../../../src/core/cellar/entry.ts';
import { FIELD_FORMS } from '../../../src/chat/attachments/entry-fields.ts';
import type { EntryField } from '../../../src/chat/attachments/entry-fields.ts';
import { USUAL_FIELDS, fieldsOfKind, isEventOf } from '../../../src/chat/attachments/kind-fields.ts';
import type { Kind } from '../../../src/chat/attachments/kind-fields.ts';

const KINDS = Object.keys({
  addition: 0,
  reading: 0,
  vessel: 0,
  order: 0,
  other: 0,
  stock: 0,
} satisfies Record<Exclude<Kind, 'correction'>, 0>) as Kind[];

/** Texts that hurt: formulas, marks of them, quotes, separators, line ends, other scripts, what looks like an escape. */
const text = fc
  .oneof(
    fc.constantFrom(
      '=1+1',
      '=HYPERLINK("http://example.org","x")',
      '+41 79',
      '-5',
      '@SUM(A1)',
      "'=1",
      "''-2",
      "'quoted",
      '\t=1',
      '\r=1',
      'a,b;c|d\te',
      'said "a lot"',
      'one\ntwo\r\nthree\rfour',
      ' blank at both ends ',
      '0012',
      '1e5',
      '3,5',
      '12.11.2026',
      'Ælfgyð · 千 · 🍷',
      '_x000D_',
      '_x005F_',
      '=＝＋',
      '＝1',
      'true',
      'constructor',
      '__proto__',
      'toString',
      'a & b < c > d',
    ),
    fc.string({ unit: 'grapheme', minLength: 1, maxLength: 20 }).filter((one) => one.trim() !== ''),
  )
  .filter((one) => !/[\p{Cc}--[\t\n\r]]/v.test(one) && one.isWellFormed());

const name = fc.oneof(
  fc.nat({ max: 40 }).map((n) => `tank ${n}`),
  fc.constantFrom('B17', 'FV3', 'T4A', 'a, b', 'back\\slash'),
);

const moment = fc.integer({ min: Date.UTC(2025, 11, 1), max: Date.UTC(2027, 0, 31) });

function valueOf(field: EntryField, kind: Kind): fc.Arbitrary<unknown> {
  const form = FIELD_FORMS[field];
  switch (form.is) {
    case 'text':
      return text;
    case 'names':
      return fc.uniqueArray(name, { minLength: 1, maxLength: 3 });
    case 'count':
      return fc.integer({ min: 1, max: 9 });
    case 'time':
      return moment;
    case 'yes-no':
      return fc.boolean();
    case 'choice':
      return fc.constantFrom(
        ...Object.keys(form.of).filter((one) => field !== 'event' || isEventOf(kind, one)),
      );
    case 'number':
      return fc.oneof(
        fc.double({ min: form.min, max: form.max, noNaN: true }).map((one) => (one === 0 ? 0 : one)),
        fc.integer({ min: Math.ceil(form.min), max: Math.floor(Math.min(form.max, 10_000)) }),
      );
  }
}

/** What an entry of a kind holds: every field may be there or not. */
function happening(kind: Kind): fc.Arbitrary<Record<string, unknown>> {
  const fields = Object.entries(fieldsOfKind(kind)) as [EntryField, 'must' | 'may'][];
  const own = fields.filter(([field]) => !NOTED.includes(field));
  const shape = Object.fromEntries(own.map(([field]) => [field, valueOf(field, kind)]));
  const required = own.flatMap(([field, need]) => (need === 'must' ? [field] : []));
  return fc.record(shape, { requiredKeys: required }).map((held) => {
    if (kind !== 'vessel') return held;
    const isUsual = (field: string): boolean => USUAL_FIELDS.some((one) => one === field);
    const rest = Object.entries(held).filter(([field]) => !isUsual(field));
    const usual = Object.entries(held).filter(([field]) => isUsual(field));
    return {
      ...Object.fromEntries(rest),
      ...(usual.length > 0 && { usual: Object.fromEntries(usual) }),
    };
  });
}

const NOTED: readonly EntryField[] = ['entry', 'kind', 'key', 'at', 'noted_at', 'by', 'order'];

const draft = fc.constantFrom(...KINDS).chain((kind) =>
  fc.record({
    kind: fc.constant(kind),
    held: happening(kind),
    at: moment,
    late_ms: fc.nat(6 * 86_400_000),
  }),
);

/** A log of so many entries, the same for the same seed: every tenth takes one back, some carry out an order. */
export function anyLog(count: number, seed: number): LoggedEntry[] {
  const made = fc.sample(draft, { numRuns: count, seed }).map(({ kind, held, at, late_ms }, i): Entry => {
    const entry = i + 1;
    const noting = { entry, key: `chat:${seed}:${i}`, at, noted_at: at + late_ms, by: (i % 4) + 1 };
    if (i % 10 === 9) {
      const corrects = entry - 1 - (i % 7);
      return { ...noting, kind: 'correction', vessels: ['tank 4'], corrects, reason: `=typo ${i}` };
    }
    // The fields are those that the type of this kind has.
    return { ...noting, kind, ...held } as unknown as Entry;
  });
  const orders = made.flatMap((one) => (one.kind === 'order' ? [one.entry] : []));
  const done = made.map((one): Entry => {
    const order = orders.find((number) => number < one.entry && number > one.entry - 5);
    return one.kind === 'addition' && order !== undefined ? { ...one, order } : one;
  });
  return struckIn(done);
}

/** Each entry with the last correction that takes it back, as a store tells it. */
export function struckIn(entries: readonly Entry[]): LoggedEntry[] {
  const by = new Map(
    entries.flatMap((one) =>
      one.kind === 'correction' ? [[one.corrects, { entry: one.entry, reason: one.reason }] as const] : [],
    ),
  );
  return entries.map((one): LoggedEntry => {
    const struck = by.get(one.entry);
    return struck === undefined ? one : { ...one, struck };
  });
}

/** Who noted it; one has no name, one has a name that a spreadsheet would reckon with. */
export const PEOPLE: readonly Person[] = [
  { number: 1, name: 'Ana' },
  { number: 2, name: '=Bo' },
  { number: 3 },
  { number: 4, name: 'Zoë "Z" O’Neil' },
];
