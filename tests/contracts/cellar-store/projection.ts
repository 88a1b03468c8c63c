import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import type { Vessel } from '../../../src/core/cellar/vessel.ts';
import { anyTurns } from './any-log.ts';
import { allEntries, note, noteIn, strike, type CreateStore } from './notes.ts';
import { plainVessels } from './plain-vessels.ts';

const vessels = (store: CellarStore): Promise<readonly Vessel[]> =>
  store.look('cellar 1', (view) => view.vessels());
const ph = async (store: CellarStore, name: string): Promise<number | undefined> =>
  (await store.look('cellar 1', (view) => view.vessel(name)))?.ph?.value;

/** What is known of vessels, whatever comes in whatever order. */
export function testProjection(create: CreateStore, anyLogs: number): void {
  test('by name, from their first entry on', async () => {
    const store = await create(() => 0);
    expect(await vessels(store)).toEqual([]);
    await noteIn(store, note(1, { vessels: ['tank 9'] }), note(2, { vessels: ['tank 10'] }));
    expect((await vessels(store)).map(({ vessel }) => vessel)).toEqual(['tank 10', 'tank 9']);
    expect(await ph(store, 'tank 9')).toBe(3.5);
    expect(await store.look('cellar 1', (view) => view.vessel('tank 1'))).toBeUndefined();
    expect(await store.look('cellar 2', (view) => view.vessels())).toEqual([]);
    await store.close();
  });

  test('by the latest sample and not by what was noted last', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(20, { ph: 3.6 }));
    await noteIn(store, note(10, { ph: 3.2 }));
    expect(await ph(store, 'tank 4')).toBe(3.6);
    await store.close();
  });

  test('as if what was taken back had never been, a vessel that nothing else tells of included', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(1, { ph: 3.2 }), note(2, { ph: 3.6 }), note(3, { vessels: ['tank 9'] }));
    await noteIn(store, strike(4, 2), strike(5, 3));
    expect(await ph(store, 'tank 4')).toBe(3.2);
    expect((await vessels(store)).map(({ vessel }) => vessel)).toEqual(['tank 4']);
    await store.close();
  });

  test('as forgotten, though an entry of before comes late', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(10), note(20, { kind: 'vessel', event: 'forgotten' }));
    await noteIn(store, note(15));
    expect(await vessels(store)).toEqual([]);
    await noteIn(store, note(30, { ph: 3.7 }));
    expect(await ph(store, 'tank 4')).toBe(3.7);
    await store.close();
  });

  test('also where a late entry changes what was moved on since', async () => {
    const store = await create(() => 0);
    const move = (at: number, from: string, to: string) =>
      note(at, { kind: 'vessel', event: 'moved', vessels: [from], to });
    await noteIn(store, move(20, 'tank 4', 'tank 5'), move(30, 'tank 5', 'tank 6'));
    await noteIn(store, note(10, { ph: 3.9, volume_L: 500 }));
    expect(await vessels(store)).toEqual(plainVessels(await allEntries(store)));
    expect(await ph(store, 'tank 6')).toBe(3.9);
    await store.close();
  });

  test('of a long history as by its plain reading, whatever is noted late or taken back then', async () => {
    const store = await create(() => 0);
    const long = Array.from({ length: 300 }, (_, at) =>
      note(at * 10, { vessels: [`tank ${at % 2}`], free_mg_L: at % 50 }),
    );
    await noteIn(store, ...long);
    for (const at of [2995, 1505, 5]) await noteIn(store, note(at, { vessels: ['tank 1', 'tank 0'] }));
    for (const number of [300, 150, 1, 302]) await noteIn(store, strike(5000 + number, number));
    await noteIn(store, note(2001, { vessels: ['tank 0'] }));
    expect(await vessels(store)).toEqual(plainVessels(await allEntries(store)));
    expect(await store.rebuild('cellar 1')).toEqual({ vessels: 2, differed: [] });
    await store.close();
  });

  test('as by the plain reading of any log, and a rebuild finds no difference', async () => {
    const oneLog = async (turns: Parameters<typeof noteIn>[1][][]): Promise<void> => {
      const store = await create(() => 0);
      for (const entries of turns) await noteIn(store, ...entries);
      const kept = await vessels(store);
      expect(kept).toEqual(plainVessels(await allEntries(store)));
      expect(await store.rebuild('cellar 1')).toEqual({ vessels: kept.length, differed: [] });
      expect(await vessels(store)).toEqual(kept);
      await store.close();
    };
    const property = fc.asyncProperty(anyTurns(40), (turns) => oneLog(turns.map((turn) => [...turn])));
    await fc.assert(property, { numRuns: anyLogs });
  });
}
