import fc from 'fast-check';
import type { NewEntry } from '../../../src/core/cellar/entry.ts';
import { note, strike } from './notes.ts';

/** A step of a random log: something to note, or which of the entries that stand is to be taken back. */
type Step = { readonly note: NewEntry } | { readonly takeBack: number };

const vessel = fc.constantFrom('tank 1', 'tank 2', 'tank 3', 'tank 4', 'tank 5');
const some = fc.uniqueArray(vessel, { minLength: 1, maxLength: 3 });
const volume_L = fc.option(fc.integer({ min: 1, max: 5000 }), { nil: undefined });
/** Few moments for many entries: most come late, many fall on one moment. */
const at = fc.integer({ min: 0, max: 200 });

const happening = fc.oneof(
  {
    weight: 4,
    arbitrary: fc.record({
      kind: fc.constant('reading'),
      vessels: vessel.map((one) => [one]),
      ph: fc.constantFrom(3.2, 3.5),
      free_mg_L: fc.integer({ min: 0, max: 60 }),
      volume_L,
    }),
  },
  {
    weight: 4,
    arbitrary: fc.record({
      kind: fc.constant('addition'),
      vessels: vessel.map((one) => [one]),
      mass_g: fc.constant(100),
      added_mg_L: fc.integer({ min: 1, max: 60 }),
    }),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      kind: fc.constant('addition'),
      vessels: some,
      mass_g: fc.constant(100),
      SO2_g: fc.constant(57),
      added_mg_L: fc.constant(20),
    }),
  },
  {
    weight: 1,
    arbitrary: fc.record({ kind: fc.constant('order'), vessels: some, mass_g: fc.constant(100) }),
  },
  {
    weight: 2,
    arbitrary: fc.record({
      kind: fc.constant('vessel'),
      event: fc.constantFrom(
        'told',
        'racked',
        'topped',
        'acid',
        'emptied',
        'forgotten',
        'unwatched',
        'watched',
      ),
      vessels: vessel.map((one) => [one]),
      volume_L,
    }),
  },
  {
    weight: 2,
    arbitrary: fc.record({
      kind: fc.constant('vessel'),
      event: fc.constantFrom('moved', 'blended'),
      vessels: some,
      to: vessel,
      volume_L,
    }),
  },
);

const stepOf = (what: fc.Arbitrary<object>): fc.Arbitrary<Step> =>
  fc.oneof(
    {
      weight: 5,
      arbitrary: fc.record({
        note: fc
          .tuple(at, what)
          .map(([when, one]) => note(when, { ph: undefined, ...one } as Partial<NewEntry>)),
      }),
    },
    { weight: 1, arbitrary: fc.record({ takeBack: fc.nat() }) },
  );

const additive = fc.constantFrom('potassium-metabisulfite', 'sodium-metabisulfite');
const chemical_lot = fc.constantFrom('A', 'b', undefined);

/** What comes in, goes out and is counted; some of it of tablets of two sizes. */
const stockHappening = fc.oneof(
  {
    weight: 4,
    arbitrary: fc.record({
      kind: fc.constant('addition'),
      vessels: vessel.map((one) => [one]),
      additive,
      chemical_lot,
      mass_g: fc.integer({ min: 1, max: 2000 }).map((tenths) => tenths / 10),
    }),
  },
  {
    weight: 4,
    arbitrary: fc.record({
      kind: fc.constant('stock'),
      event: fc.constantFrom('received', 'received', 'used', 'discarded', 'counted'),
      vessels: fc.constant([]),
      additive,
      chemical_lot,
      mass_g: fc.integer({ min: 0, max: 1000 }),
    }),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      kind: fc.constantFrom('stock', 'addition'),
      event: fc.constantFrom('received', 'counted'),
      vessels: fc.constant(['tank 1']),
      additive: fc.constant('tablet'),
      tablet_SO2_g: fc.constantFrom(2, 5),
      tablets: fc.integer({ min: 1, max: 50 }),
    }),
  },
);

/** Turns of a random log: late entries, corrections, wine that goes from vessel to vessel. */
export const anyTurns = (length: number): fc.Arbitrary<readonly (readonly NewEntry[])[]> =>
  fc
    .array(fc.array(stepOf(happening), { minLength: 1, maxLength: 4 }), {
      minLength: 1,
      maxLength: length,
      size: 'max',
    })
    .map(withNumbers);

/** Turns of the random log of a chemical store. */
export const anyStockTurns = (length: number): fc.Arbitrary<readonly (readonly NewEntry[])[]> =>
  fc
    .array(fc.array(stepOf(stockHappening), { minLength: 1, maxLength: 4 }), {
      minLength: 1,
      maxLength: length,
      size: 'max',
    })
    .map(withNumbers);

/** Gives each its key, and turns "take one back" into a correction of an entry that stands. */
function withNumbers(turns: readonly (readonly Step[])[]): NewEntry[][] {
  const standing: number[] = [];
  let number = 0;
  return turns.map((turn) =>
    turn.flatMap((one): NewEntry[] => {
      if ('takeBack' in one) {
        const [corrects] = standing.splice(one.takeBack % Math.max(1, standing.length), 1);
        if (corrects === undefined) return [];
        number += 1;
        return [strike(number, corrects, { key: `key ${number}` })];
      }
      number += 1;
      standing.push(number);
      return [{ ...one.note, key: `key ${number}` }];
    }),
  );
}
