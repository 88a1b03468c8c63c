import fc from 'fast-check';
import { expect, test } from 'vitest';
import { applyToShelf } from '../../../src/core/cellar/apply-to-shelf.ts';
import type { Entry, Happening } from '../../../src/core/cellar/entry.ts';
import { lotsLeft } from '../../../src/core/cellar/lots-left.ts';
import type { Shelf } from '../../../src/core/cellar/shelf.ts';
import { stockMove } from '../../../src/core/cellar/stock-move.ts';

const KMBS = { vessels: [], additive: 'potassium-metabisulfite' } as const;

/** Entries one after the other, a moment each. */
function logOf(...told: readonly Partial<Happening>[]): Entry[] {
  return told.map(
    (one, at) =>
      ({ ...KMBS, entry: at + 1, key: `${at}`, at, noted_at: at, by: 1, ...one }) as unknown as Entry,
  );
}

const received = (mass_g: number, chemical_lot?: string): Partial<Happening> => ({
  kind: 'stock',
  event: 'received',
  mass_g,
  ...(chemical_lot && { chemical_lot }),
});
const added = (mass_g: number, chemical_lot?: string): Partial<Happening> => ({
  kind: 'addition',
  mass_g,
  ...(chemical_lot && { chemical_lot }),
});
const counted = (mass_g: number, chemical_lot?: string): Partial<Happening> => ({
  kind: 'stock',
  event: 'counted',
  mass_g,
  ...(chemical_lot && { chemical_lot }),
});

/** What is left of each lot in grams, by its name, and in all. */
function leftOf(...told: readonly Partial<Happening>[]): Record<string, number> {
  const shelf = logOf(...told).reduce<Shelf | undefined>((one, entry) => applyToShelf(one, entry), undefined);
  const { lots, balance } = lotsLeft(shelf ?? { lots: [], out: {} });
  return Object.fromEntries([
    ...lots.map(({ lot = '', left }) => [lot, left / 1000] as const),
    ['all', balance / 1000],
  ]);
}

test.each<[string, Partial<Happening>[], Record<string, number>]>([
  [
    'the oldest lot goes first',
    [received(500, 'A'), received(500, 'B'), added(600)],
    { A: 0, B: 400, all: 400 },
  ],
  [
    'a lot that is named goes',
    [received(500, 'A'), received(500, 'B'), added(200, 'b')],
    { A: 500, B: 300, all: 800 },
  ],
  [
    'what a named lot lacks is of the oldest',
    [received(500, 'A'), received(100, 'B'), added(200, 'B')],
    { A: 400, B: 0, all: 400 },
  ],
  ['a lot that nobody knows is of the oldest', [received(500, 'A'), added(200, 'X')], { A: 300, all: 300 }],
  ['more than came in is below zero', [received(100, 'A'), added(220)], { A: 0, all: -120 }],
  [
    'what went out before anything came in does not count',
    [added(220), received(100, 'A')],
    { A: 100, all: 100 },
  ],
  ['a count begins a shelf too', [added(220), counted(3200), added(200)], { '': 3000, all: 3000 }],
  [
    'less than reckoned is missing of the oldest',
    [received(500, 'A'), received(500, 'B'), counted(600)],
    { A: 100, B: 500, all: 600 },
  ],
  [
    'more than reckoned fills up what came in',
    [received(500, 'A'), added(300), counted(400)],
    { A: 400, all: 400 },
  ],
  [
    'more than ever came in is a lot without a name',
    [received(500, 'A'), counted(700)],
    { A: 500, '': 200, all: 700 },
  ],
  [
    'a lot that is counted alone',
    [received(500, 'A'), received(500, 'B'), counted(50, 'B')],
    { A: 500, B: 50, all: 550 },
  ],
  [
    'after a count below zero it goes on from what was counted',
    [received(100, 'A'), added(220), counted(80), added(30)],
    { A: 50, all: 50 },
  ],
])('%s', (_, told, left) => {
  expect(leftOf(...told)).toEqual(left);
});

test('tablets are counted, also where the log has the grams of SO2 that they give', () => {
  const tablets = { kind: 'addition', vessels: [], additive: 'tablet', tablet_SO2_g: 5 } as const;
  expect(stockMove({ ...tablets, mass_g: 15 })).toMatchObject({ unit: 'tablets', amount: 3000 });
  expect(stockMove({ ...tablets, mass_g: 15 })?.shelf).toBe(stockMove({ ...tablets, tablets: 3 })?.shelf);
});

test.each([
  [
    { tablet_SO2_g: 5, tablets: 1 },
    { tablet_SO2_g: 2, tablets: 1 },
  ],
  [
    { additive: 'sulfur-dioxide-solution', strength_percent: 6, additive_volume_mL: 1 },
    { additive: 'sulfur-dioxide-solution', strength_percent: 5, additive_volume_mL: 1 },
  ],
  [{ additive: 'sodium-metabisulfite', mass_g: 1 }, { mass_g: 1 }],
] as const)('%o and %o stand on two shelves', (one, other) => {
  const shelfOf = (more: object): string | undefined =>
    stockMove({ kind: 'addition', ...KMBS, ...more })?.shelf;
  expect(shelfOf(one)).toBeDefined();
  expect(shelfOf(one)).not.toBe(shelfOf(other));
});

test('a powder is one powder whatever its assay', () => {
  const powder = { kind: 'addition', ...KMBS, mass_g: 1 } as const;
  expect(stockMove({ ...powder, strength_percent: 57 })?.shelf).toBe(stockMove(powder)?.shelf);
});

test('what is left of the lots and what is missing come to what came in less what went out', () => {
  const move = fc.record({
    isIn: fc.boolean(),
    tenths: fc.integer({ min: 0, max: 99_999 }),
    lot: fc.constantFrom('A', 'B', 'C', undefined),
  });
  fc.assert(
    fc.property(fc.array(move), (moves) => {
      const told = moves.map(({ isIn, tenths, lot }) => (isIn ? received : added)(tenths / 10, lot));
      const { all = Number.NaN } = leftOf(received(0), ...told);
      const sum = moves.reduce((grams, { isIn, tenths }) => grams + (isIn ? tenths : -tenths), 0) / 10;
      expect(all).toBeCloseTo(sum, 6);
    }),
  );
});
