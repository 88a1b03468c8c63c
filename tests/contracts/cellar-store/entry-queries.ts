import { expect, test } from 'vitest';
import type { EntryQuery } from '../../../src/core/cellar/cellar-store.ts';
import { note, noteIn, numbersOf, strike, type CreateStore } from './notes.ts';

/** Numbers in the order of time: 2 and 6 at 10, 1 at 20, 3 (with tank 9) at 30, 4 (into tank 9) at 40, 5 takes back 3. */
const LOG = [
  note(20),
  note(10),
  note(30, { kind: 'addition', vessels: ['tank 4', 'tank 9'], mass_g: 5 }),
  note(40, { kind: 'vessel', event: 'blended', vessels: ['tank 4'], to: 'tank 9' }),
  strike(50, 3, { by: 2 }),
  note(10, { key: 'again', vessels: ['tank 7'] }),
];

const HARD_KEYS = [
  'a',
  'a%',
  'a%b',
  'a_',
  'a_b',
  'ab',
  "a'b",
  'a"b',
  'a\\',
  'a*',
  'a[b]',
  'aé',
  'a😀',
  'a\u{10ffff}',
  'b',
];

/** What is asked of the log. */
export function testEntryQueries(create: CreateStore): void {
  test.each<[EntryQuery, readonly number[]]>([
    [{}, [2, 6, 1, 3, 4, 5]],
    [{ from: 20 }, [1, 3, 4, 5]],
    [{ to: 20 }, [2, 6]],
    [{ from: 20, to: 40 }, [1, 3]],
    [{ from: 60 }, []],
    [{ last: 2 }, [4, 5]],
    [{ last: 0 }, []],
    [{ last: 99 }, [2, 6, 1, 3, 4, 5]],
    [{ to: 40, last: 2 }, [1, 3]],
    [{ vessel: 'tank 4' }, [2, 1, 3, 4, 5]],
    [{ vessel: 'tank 9' }, [3, 4]],
    [{ vessel: 'tank 9', last: 1 }, [4]],
    [{ vessel: 'tank 4', from: 10, to: 40, last: 2 }, [1, 3]],
    [{ vessel: 'tank 7' }, [6]],
    [{ vessel: 'tank' }, []],
  ])('of %o, oldest first', async (query, expected) => {
    const store = await create(() => 0);
    await noteIn(store, ...LOG);
    const found = await store.look('cellar 1', (view) => view.entries(query));
    expect(numbersOf(found)).toEqual(expected);
    expect(found.filter((entry) => entry.struck !== undefined).map(({ entry }) => entry)).toEqual(
      expected.filter((number) => number === 3),
    );
    await store.close();
  });

  test('under each vessel once, however often it is named', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(1, { vessels: ['tank 4', 'tank 4'] }));
    const found = await store.look('cellar 1', (view) => view.entries({ vessel: 'tank 4' }));
    expect(found).toEqual([{ ...note(1, { vessels: ['tank 4', 'tank 4'] }), entry: 1 }]);
    await store.close();
  });

  test.each([
    '',
    'a',
    'a%',
    'a_',
    "a'",
    'a\\',
    'a*',
    'a[',
    'a😀',
    'a\u{10ffff}',
    '\u{10ffff}',
    'b',
    'c',
    '\ud7ff',
  ])('whose keys begin with %j, and no letter of it means anything else', async (begin) => {
    const store = await create(() => 0);
    await noteIn(store, ...HARD_KEYS.map((key, at) => note(at, { key })));
    const found = await store.look('cellar 1', (view) => view.entriesOfKeys(begin));
    expect(found.map(({ key }) => key)).toEqual(HARD_KEYS.filter((key) => key.startsWith(begin)));
    await store.close();
  });

  test('whose keys begin alike come oldest first, and say that they were taken back', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(20, { key: 'm:1' }), note(10, { key: 'm:2' }), strike(30, 1));
    const found = await store.look('cellar 1', (view) => view.entriesOfKeys('m:'));
    expect(found).toMatchObject([{ entry: 2 }, { entry: 1, struck: { entry: 3 } }]);
    await store.close();
  });

  test('that somebody noted last: no correction, none that was taken back, nobody else', async () => {
    const store = await create(() => 0);
    const lastBy = async (person: number): Promise<number | undefined> =>
      (await store.look('cellar 1', (view) => view.lastEntryBy(person)))?.entry;
    await noteIn(store, note(50), note(20), note(60, { by: 2 }));
    expect([await lastBy(1), await lastBy(2), await lastBy(3)]).toEqual([2, 3, undefined]);
    await noteIn(store, strike(70, 2));
    expect([await lastBy(1), await lastBy(2)]).toEqual([1, 3]);
    await noteIn(store, strike(80, 1));
    expect(await lastBy(1)).toBeUndefined();
    await store.close();
  });
}
