import { expect, test } from 'vitest';
import type { Happening, NewEntry } from '../../../src/core/cellar/entry.ts';
import { allEntries, note, noteIn, numbersOf, strike, write, writeOf, type CreateStore } from './notes.ts';

const HAPPENINGS: readonly Happening[] = [
  {
    kind: 'addition',
    vessels: ['tank 4', 'tank 9'],
    additive: 'potassium-metabisulfite',
    strength_percent: 57.6,
    chemical_lot: 'lot "4471"',
    mass_g: 0.1 + 0.2,
    SO2_g: 147.69,
    added_mg_L: 26.9,
    volume_L: 5488.8470868,
    planned_mg_L: 26,
    order: 3,
    remark: "Ana's, half of it\nafter lunch 😀",
  },
  { kind: 'reading', vessels: ['tank 4'], ph: 3.58, free_mg_L: 0, total_mg_L: 96, style: 'red' },
  { kind: 'vessel', event: 'moved', vessels: ['tank 4'], to: 'tank 9', volume_L: 2000 },
  { kind: 'order', vessels: ['tank 4'], mass_g: 256 },
  { kind: 'other', vessels: ['tank 4'], remark: '2 kg bentonite', mass_g: 2000 },
  { kind: 'stock', vessels: [], additive: 'sulfur-gas', mass_g: 5000, supplier: 'the invented supplier' },
].map((one) => one as Happening);

/** Entries go in, get their numbers, and stay. */
export function testLog(create: CreateStore): void {
  test('numbers entries from 1 in the order of the writes, each cellar for itself', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(30), note(10));
    await noteIn(store, note(20));
    await store.turn('cellar 2', async (view) => ({
      writes: [writeOf(note(30))],
      result: expect(await view.nextEntry()).toBe(1),
    }));
    expect((await allEntries(store)).map(({ entry, at }) => [entry, at])).toEqual([
      [2, 10],
      [3, 20],
      [1, 30],
    ]);
    expect(await store.look('cellar 1', (view) => view.nextEntry())).toBe(4);
    await store.close();
  });

  test.each(HAPPENINGS.map((one) => [one.kind, one] as const))(
    'gives back whatever an entry of the kind %s holds',
    async (_, happening) => {
      const store = await create(() => 0);
      const entry: NewEntry = { ...happening, key: 'press:1', at: -5, noted_at: 1_700_000_000_123, by: 7 };
      await noteIn(store, entry);
      const expected = { ...entry, entry: 1 };
      expect(await store.look('cellar 1', (view) => view.entry(1))).toEqual(expected);
      expect(await store.look('cellar 1', (view) => view.entryOfKey('press:1'))).toEqual(expected);
      expect(await allEntries(store)).toEqual([expected]);
      await store.close();
    },
  );

  test('knows no entry that was not noted', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(1));
    const look = <T>(work: Parameters<typeof store.look<T>>[1]): Promise<T> => store.look('cellar 1', work);
    expect(await look((view) => view.entry(2))).toBeUndefined();
    expect(await look((view) => view.entry(0))).toBeUndefined();
    expect(await look((view) => view.entryOfKey('key'))).toBeUndefined();
    expect(await store.look('cellar 2', (view) => view.entry(1))).toBeUndefined();
    await store.close();
  });

  test.each<[string, readonly NewEntry[]]>([
    ['whose key has an entry already', [note(2), note(3, { key: 'key 1' })]],
    ['of which two have one key', [note(2), note(3, { key: 'key 2' })]],
    ['without a key', [note(2), note(3, { key: '' })]],
    ['with a key of 201 letters', [note(2), note(3, { key: 'k'.repeat(201) })]],
    ['with half a letter as key', [note(2), note(3, { key: '\ud83d' })]],
    ['at no moment', [note(2), note(Number.NaN, { key: 'nan' })]],
    ['that take back what was never noted', [note(2), strike(3, 9)]],
    ['that take back a correction', [note(2), strike(3, 2), strike(4, 3)]],
    ['that take back twice', [note(2), strike(3, 1), strike(4, 1)]],
    ['that take back what is to come', [strike(3, 3), note(2)]],
  ])('refuses entries %s, and keeps nothing of that turn', async (_, entries) => {
    const store = await create(() => 0);
    await noteIn(store, note(1));
    const attempt = write(store, { kind: 'keep', key: 'k', text: 'kept' }, ...entries.map(writeOf));
    await expect(attempt).rejects.toThrow(/./);
    expect(numbersOf(await allEntries(store))).toEqual([1]);
    expect(await store.look('cellar 1', (view) => view.kept('k'))).toBeUndefined();
    await noteIn(store, note(5, { key: 'k'.repeat(200) }));
    expect(numbersOf(await allEntries(store))).toEqual([1, 2]);
    await store.close();
  });

  test('refuses to take back again what another turn took back', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(1));
    await noteIn(store, strike(2, 1));
    await expect(noteIn(store, strike(3, 1))).rejects.toThrow(RangeError);
    await store.close();
  });

  test('tells with an entry that it was taken back, by which entry and why; both stay', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(1), note(2), strike(3, 1));
    const struck = { entry: 3, reason: 'typo' };
    expect(await allEntries(store)).toMatchObject([{ entry: 1, struck }, { entry: 2 }, { entry: 3 }]);
    expect(await store.look('cellar 1', (view) => view.entry(1))).toMatchObject({ struck });
    expect(await store.look('cellar 1', (view) => view.entryOfKey('key 1'))).toMatchObject({ struck });
    expect(await store.look('cellar 1', (view) => view.entry(2))).not.toHaveProperty('struck');
    await store.close();
  });

  test('is not changed by what happens to an object after it was handed in or out', async () => {
    const store = await create(() => 0);
    const entry = note(1) as NewEntry & { ph: number; vessels: string[] };
    await noteIn(store, entry);
    entry.ph = 9;
    entry.vessels.push('tank 5');
    const [given] = (await allEntries(store)) as unknown as { ph: number; vessels: string[] }[];
    if (given !== undefined) given.vessels.push('tank 6');
    expect(await allEntries(store)).toEqual([{ ...note(1), entry: 1 }]);
    await store.close();
  });
}
