import fc from 'fast-check';
import { expect, test } from 'vitest';
import { applyToShelf } from '../../../src/core/cellar/apply-to-shelf.ts';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import type { LoggedEntry, NewEntry, StockMovement } from '../../../src/core/cellar/entry.ts';
import { lotsLeft } from '../../../src/core/cellar/lots-left.ts';
import type { Shelf } from '../../../src/core/cellar/shelf.ts';
import { stockMove } from '../../../src/core/cellar/stock-move.ts';
import { anyStockTurns } from './any-log.ts';
import { allEntries, note, noteIn, strike, type CreateStore } from './notes.ts';

const shelves = (store: CellarStore): Promise<readonly Shelf[]> =>
  store.look('cellar 1', (view) => view.shelves());

/** What is there of the one additive that is kept, in grams. */
const balance_g = async (store: CellarStore): Promise<number | undefined> => {
  const [shelf] = await shelves(store);
  return shelf && lotsLeft(shelf).balance / 1000;
};

const kmbs = { vessels: [], additive: 'potassium-metabisulfite', ph: undefined } as const;
const stock = (at: number, event: StockMovement['event'], mass_g: number): NewEntry =>
  note(at, { ...kmbs, kind: 'stock', event, mass_g });
const addition = (at: number, mass_g: number): NewEntry =>
  note(at, { ...kmbs, kind: 'addition', vessels: ['tank 4'], mass_g });

/** The shelves by a log, in the plainest way: all that counts, one after the other. */
function plainShelves(log: readonly LoggedEntry[]): readonly Shelf[] {
  const found = new Map<string, Shelf>();
  const counting = log.filter((entry) => entry.kind !== 'correction' && entry.struck === undefined);
  for (const entry of counting.toSorted((one, other) => one.at - other.at || one.entry - other.entry)) {
    const name = stockMove(entry)?.shelf ?? '';
    const after = applyToShelf(found.get(name), entry);
    if (after !== undefined && name !== '') found.set(name, after);
  }
  return [...found.values()].sort((one, other) => (one.shelf < other.shelf ? -1 : 1));
}

/** What stands in the chemical store, whatever comes in whatever order. */
export function testStock(create: CreateStore, anyLogs: number): void {
  test('none where nothing came in or was counted, whatever went into wine', async () => {
    const store = await create(() => 0);
    await noteIn(store, addition(1, 100), stock(2, 'used', 50));
    expect(await shelves(store)).toEqual([]);
    await noteIn(store, stock(3, 'received', 1000));
    expect(await balance_g(store)).toBe(1000);
    await store.close();
  });

  test('what was struck is back, also where its entry came late', async () => {
    const store = await create(() => 0);
    await noteIn(store, stock(1, 'received', 1000), addition(5, 100));
    await noteIn(store, addition(3, 200));
    expect(await balance_g(store)).toBe(700);
    await noteIn(store, strike(6, 2));
    expect(await balance_g(store)).toBe(800);
    await noteIn(store, strike(7, 1));
    expect(await shelves(store)).toEqual([]);
    await store.close();
  });

  test('a count holds, whatever comes late from before it', async () => {
    const store = await create(() => 0);
    await noteIn(store, stock(1, 'received', 1000), stock(10, 'counted', 640), addition(20, 40));
    await noteIn(store, addition(5, 200));
    expect(await balance_g(store)).toBe(600);
    await noteIn(store, strike(30, 2));
    expect(await balance_g(store)).toBe(760);
    await noteIn(store, stock(15, 'counted', 700));
    expect(await balance_g(store)).toBe(660);
    await store.close();
  });

  test('a turn that takes back what it has noted itself changes nothing', async () => {
    const store = await create(() => 0);
    await noteIn(store, stock(1, 'received', 1000));
    await noteIn(store, addition(2, 100), strike(3, 2));
    expect(await balance_g(store)).toBe(1000);
    await store.close();
  });

  test('of one cellar are not of another', async () => {
    const store = await create(() => 0);
    await noteIn(store, stock(1, 'received', 1000));
    expect(await store.look('cellar 2', (view) => view.shelves())).toEqual([]);
    await store.close();
  });

  test('as by the plain reading of any log, and a rebuild finds no difference', async () => {
    const property = fc.asyncProperty(anyStockTurns(40), async (turns) => {
      const store = await create(() => 0);
      for (const entries of turns) await noteIn(store, ...entries);
      const kept = await shelves(store);
      expect(kept).toEqual(plainShelves(await allEntries(store)));
      expect((await store.rebuild('cellar 1')).differed).toEqual([]);
      expect(await shelves(store)).toEqual(kept);
      await store.close();
    });
    await fc.assert(property, { numRuns: anyLogs });
  });
}
