import { expect, test } from 'vitest';
import type { CellarStore, Due, Write } from '../../../src/core/cellar/cellar-store.ts';
import { note, write, writeOf, type CreateStore } from './notes.ts';

const due = (id: string, at: number, about = id): Due => ({ id, chat: 'chat 1', at, about });
const writeDue = (...things: readonly Due[]): Write[] => things.map((thing) => ({ kind: 'due', due: thing }));
const said = (id: string): Write => ({ kind: 'said', id });

const take = async (store: CellarStore, now: number, most = 10): Promise<string[]> =>
  (await store.takeDue(now, { lease_ms: 100, most })).map(({ id }) => id);
const open = async (store: CellarStore): Promise<string[]> =>
  (await store.look('cellar 1', (view) => view.allDue())).map(({ id, at }) => `${id} at ${at}`);

/** What is to be said at a moment. */
export function testDue(create: CreateStore): void {
  test('lists what is still to be said, the earliest first', async () => {
    const store = await create(() => 0);
    await write(store, ...writeDue(due('c', 30), due('b', 10), due('a', 10)), said('nothing'));
    expect(await open(store)).toEqual(['a at 10', 'b at 10', 'c at 30']);
    await write(store, said('b'));
    expect(await open(store)).toEqual(['a at 10', 'c at 30']);
    expect(await store.look('cellar 1', (view) => view.due('c'))).toEqual(due('c', 30));
    expect(await store.look('cellar 1', (view) => view.due('b'))).toBeUndefined();
    expect(await store.look('cellar 2', (view) => view.due('c'))).toBeUndefined();
    await store.close();
  });

  test('hands out what is due, of all cellars, to one taker until the lease ends', async () => {
    const store = await create(() => 0);
    expect(await store.nextDue()).toBeUndefined();
    await write(store, ...writeDue(due('a', 20), due('b', 10), due('c', 31)));
    await store.turn('cellar 2', async () => ({ writes: writeDue(due('a', 30)), result: undefined }));
    expect(await store.nextDue()).toBe(10);
    expect(await take(store, 9)).toEqual([]);
    expect(await store.takeDue(30, { lease_ms: 100, most: 10 })).toEqual([
      { cellar: 'cellar 1', ...due('b', 10) },
      { cellar: 'cellar 1', ...due('a', 20) },
      { cellar: 'cellar 2', ...due('a', 30) },
    ]);
    expect(await take(store, 30)).toEqual([]);
    expect(await store.nextDue()).toBe(31);
    expect(await take(store, 129)).toEqual(['c']);
    expect(await store.nextDue()).toBe(130);
    expect(await take(store, 130)).toEqual(['a', 'b', 'a']);
    await store.close();
  });

  test('hands out no more than was asked for, what is due longest first', async () => {
    const store = await create(() => 0);
    await write(store, ...writeDue(due('a', 3), due('b', 2), due('c', 1)));
    expect(await take(store, 9, 2)).toEqual(['c', 'b']);
    expect(await take(store, 9, 2)).toEqual(['a']);
    await store.close();
  });

  test('gives two takers at once different things', async () => {
    const store = await create(() => 0);
    await write(store, ...writeDue(...Array.from({ length: 10 }, (_, at) => due(`due ${at}`, at))));
    const taken = await Promise.all([take(store, 20, 4), take(store, 20, 4), take(store, 20, 4)]);
    expect(taken.flat().toSorted()).toEqual(Array.from({ length: 10 }, (_, at) => `due ${at}`));
    await store.close();
  });

  test('says nothing twice, though it is written again', async () => {
    const store = await create(() => 0);
    await write(store, ...writeDue(due('a', 10)));
    await take(store, 10);
    await write(store, said('a'));
    await write(store, ...writeDue(due('a', 50)));
    expect([await take(store, 1000), await store.nextDue()]).toEqual([[], undefined]);
    await store.close();
  });

  test('takes the later of two of one id, and leaves it with whoever has it in hand', async () => {
    const store = await create(() => 0);
    await write(store, ...writeDue(due('a', 10)));
    await write(store, ...writeDue(due('a', 20, 'later')));
    expect(await take(store, 10)).toEqual([]);
    expect(await take(store, 20)).toEqual(['a']);
    await write(store, ...writeDue(due('a', 20, 'the same again')));
    expect([await take(store, 119), await store.nextDue()]).toEqual([[], 120]);
    await write(store, ...writeDue(due('a', 500)));
    expect([await take(store, 499), await take(store, 500)]).toEqual([[], ['a']]);
    await store.close();
  });

  test('knows nothing of a turn that failed', async () => {
    const store = await create(() => 0);
    await write(store, writeOf(note(1)), ...writeDue(due('a', 10)));
    await expect(write(store, said('a'), ...writeDue(due('b', 5)), writeOf(note(1)))).rejects.toThrow(/./);
    expect(await open(store)).toEqual(['a at 10']);
    await store.close();
  });
}
