import { expect, test } from 'vitest';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { write, type CreateStore } from './notes.ts';

const keep = (store: CellarStore, key: string, text: string, until?: number): Promise<void> =>
  write(store, { kind: 'keep', key, text, ...(until === undefined ? {} : { until }) });
const kept = (store: CellarStore, key: string): Promise<string | undefined> =>
  store.look('cellar 1', (view) => view.kept(key));
const under = async (store: CellarStore, begin: string): Promise<string[]> =>
  (await store.look('cellar 1', (view) => view.keptUnder(begin))).map(({ key, text }) => `${key}=${text}`);

/** Texts under keys, for ever or for a while. */
export function testKeeping(create: CreateStore): void {
  test('gives back a text as it was, and the later of two', async () => {
    const store = await create(() => 0);
    const text = '{"a":"it\'s \\"so\\"\\n😀"}';
    expect(await kept(store, 'k')).toBeUndefined();
    await keep(store, 'k', 'first');
    await keep(store, 'k', text);
    expect(await kept(store, 'k')).toBe(text);
    await write(store, { kind: 'keep', key: 'k', text: '1' }, { kind: 'keep', key: 'k', text: '2' });
    expect(await kept(store, 'k')).toBe('2');
    await store.close();
  });

  test('drops what is to be dropped, also what never was', async () => {
    const store = await create(() => 0);
    await keep(store, 'k', 'text');
    await write(store, { kind: 'drop', key: 'k' }, { kind: 'drop', key: 'other' });
    expect(await kept(store, 'k')).toBeUndefined();
    await store.close();
  });

  test('keeps the cellars apart', async () => {
    const store = await create(() => 0);
    await keep(store, 'k', 'text');
    expect(await store.look('cellar 2', (view) => view.kept('k'))).toBeUndefined();
    expect(await store.look('cellar 2', (view) => view.keptUnder(''))).toEqual([]);
    await store.close();
  });

  test('gives back several texts in one look, without those that are not there or have lapsed', async () => {
    let now = 0;
    const store = await create(() => now);
    await keep(store, 'a', '1');
    await keep(store, "b '%_", '2');
    await keep(store, 'c', '3', 100);
    now = 100;
    const look = (keys: string[]): Promise<ReadonlyMap<string, string>> =>
      store.look('cellar 1', (view) => view.keptOf(keys));
    expect(Object.fromEntries(await look(['a', "b '%_", 'c', 'd', 'a']))).toEqual({ a: '1', "b '%_": '2' });
    expect((await look([])).size).toBe(0);
    await store.close();
  });

  test('lets a text lapse at its moment; a later one without an end stays', async () => {
    let now = 0;
    const store = await create(() => now);
    await keep(store, 'claim', 'Ana', 100);
    await keep(store, 'claim 2', 'Rui', 100);
    await keep(store, 'claim 2', 'Rui again');
    now = 99;
    expect(await under(store, '')).toEqual(['claim=Ana', 'claim 2=Rui again']);
    now = 100;
    expect(await kept(store, 'claim')).toBeUndefined();
    expect(await under(store, '')).toEqual(['claim 2=Rui again']);
    await keep(store, 'claim', 'Eva', 200);
    expect(await kept(store, 'claim')).toBe('Eva');
    await store.close();
  });

  test.each([
    ['', ['%=%', 'a=a', 'a%=a%', 'a%b=a%b', 'a_b=a_b', 'ab=ab', 'é=é', '😀=😀']],
    ['a', ['a=a', 'a%=a%', 'a%b=a%b', 'a_b=a_b', 'ab=ab']],
    ['a%', ['a%=a%', 'a%b=a%b']],
    ['a_', ['a_b=a_b']],
    ['%', ['%=%']],
    ['😀', ['😀=😀']],
    ['x', []],
  ])('lists what is kept under keys that begin with %j, by key', async (begin, expected) => {
    const store = await create(() => 0);
    for (const key of ['ab', '😀', 'a%b', 'é', 'a', '%', 'a_b', 'a%']) await keep(store, key, key);
    expect(await under(store, begin)).toEqual(expected);
    await store.close();
  });
}
