import { expect, test } from 'vitest';
import type { CellarStore, Write } from '../../../src/core/cellar/cellar-store.ts';
import type { Arrived, Post } from '../../../src/core/cellar/mailbox.ts';
import { allEntries, note, write, writeOf, type CreateStore } from './notes.ts';

const arrived = (number: number, channel = 'here'): Arrived => ({
  channel,
  number,
  body: `{"n":${number}}`,
  received_at: 10 * number,
});
const handled = (number: number, cause?: string): Write => ({
  kind: 'handled',
  channel: 'here',
  number,
  ...(cause !== undefined && { cause }),
});
const post = (id: string, chat = 'chat 1', channel = 'here'): Post => ({
  id,
  channel,
  chat,
  body: `{"t":"${id}"}`,
  at: 7,
});
const writePost = (...posts: readonly Post[]): Write[] => posts.map((one) => ({ kind: 'post', post: one }));
const numbersOf = (list: readonly Arrived[]): number[] => list.map(({ number }) => number);
const waiting = async (store: CellarStore): Promise<number[]> => numbersOf(await store.waiting('here'));
const idsOf = async (store: CellarStore, channel = 'here'): Promise<string[]> =>
  (await store.posts(channel)).map(({ id }) => id);

/** What came in from platforms, and what is to be sent to them. */
export function testMailbox(create: CreateStore): void {
  test('gives back of what arrives what is new, once, in the order it came', async () => {
    const store = await create(() => 0);
    expect(numbersOf(await store.receive([arrived(2), arrived(1), arrived(2)]))).toEqual([2, 1]);
    expect(numbersOf(await store.receive([arrived(1), arrived(3)]))).toEqual([3]);
    expect(await store.receive([])).toEqual([]);
    expect(await store.receive([arrived(1, 'there')])).toEqual([arrived(1, 'there')]);
    expect(await store.waiting('here')).toEqual(
      [1, 2, 3].map((number) => ({ ...arrived(number), tries: 0 })),
    );
    await store.close();
  });

  test('lets a turn handle what arrived as soon as it is written, and both are kept', async () => {
    const store = await create(() => 0);
    const turns: Promise<unknown>[] = [];
    const fresh = await store.receive([arrived(1), arrived(2)], (written) => {
      for (const { number } of written) turns.push(write(store, handled(number), writeOf(note(number))));
    });
    await Promise.all(turns);
    expect([numbersOf(fresh), await waiting(store)]).toEqual([[1, 2], []]);
    expect(await allEntries(store)).toHaveLength(2);
    const told: number[] = [];
    await store.receive([arrived(2), arrived(3)], (written) => void told.push(...numbersOf(written)));
    expect(told).toEqual([3]);
    await store.close();
  });

  test('takes a batch of any length', async () => {
    const store = await create(() => 0);
    const many = Array.from({ length: 1500 }, (_, at) => arrived(at));
    expect(await store.receive(many)).toEqual(many);
    expect(await store.receive(many)).toEqual([]);
    await store.countTry('here', numbersOf(many));
    expect((await store.waiting('here')).map(({ tries }) => tries)).toEqual(Array(1500).fill(1));
    await store.close();
  });

  test('handles what arrived together with what its turn writes, once', async () => {
    const store = await create(() => 0);
    await store.receive([arrived(1), arrived(2)]);
    await write(store, writeOf(note(1)), handled(1), ...writePost(post('1 a'), post('1 b')));
    expect([await waiting(store), await idsOf(store)]).toEqual([[2], ['1 a', '1 b']]);
    expect(await store.receive([arrived(1)])).toEqual([]);
    const again = write(store, writeOf(note(2)), ...writePost(post('1 c')), handled(1));
    await expect(again).rejects.toThrow(RangeError);
    await expect(write(store, handled(9))).rejects.toThrow(RangeError);
    expect([(await allEntries(store)).length, await idsOf(store)]).toEqual([1, ['1 a', '1 b']]);
    await store.close();
  });

  test('leaves waiting what a turn that failed had handled', async () => {
    const store = await create(() => 0);
    await store.receive([arrived(1)]);
    const failing = write(store, handled(1), ...writePost(post('a')), writeOf(note(1)), writeOf(note(1)));
    await expect(failing).rejects.toThrow(/./);
    expect([await waiting(store), await idsOf(store)]).toEqual([[1], []]);
    await store.close();
  });

  test('counts the tries of what waits', async () => {
    const store = await create(() => 0);
    await store.receive([arrived(1), arrived(2)]);
    await store.countTry('here', [1]);
    await store.countTry('here', [1, 2, 3]);
    expect((await store.waiting('here')).map(({ tries }) => tries)).toEqual([2, 1]);
    await store.close();
  });

  test('hands out posts of a channel in the order they were written, and forgets those that are settled', async () => {
    const store = await create(() => 0);
    await write(store, ...writePost(post('z'), post('a', 'chat 2'), post('z', 'chat 1', 'there')));
    await store.turn('cellar 2', async () => ({ writes: writePost(post('b')), result: undefined }));
    expect(await store.posts('here')).toEqual([post('z'), post('a', 'chat 2'), post('b')]);
    await store.settle('here', ['z', 'never written']);
    expect([await idsOf(store), await idsOf(store, 'there')]).toEqual([['a', 'b'], ['z']]);
    await store.settle('here', ['a', 'b']);
    await write(store, ...writePost(post('d'), post('c')));
    expect(await idsOf(store)).toEqual(['d', 'c']);
    await store.close();
  });

  test('keeps one post of an id, the first', async () => {
    const store = await create(() => 0);
    await write(store, ...writePost(post('a')));
    await write(store, ...writePost({ ...post('a'), body: 'other' }, post('b')));
    expect(await store.posts('here')).toEqual([post('a'), post('b')]);
    await store.close();
  });

  test('sends posts to where their chat has gone, in their order', async () => {
    const store = await create(() => 0);
    await write(store, ...writePost(post('a'), post('b', 'chat 2'), post('c')));
    await store.readdress('here', ['a', 'c'], 'chat 9');
    expect(await store.posts('here')).toEqual([
      post('a', 'chat 9'),
      post('b', 'chat 2'),
      post('c', 'chat 9'),
    ]);
    await store.close();
  });

  test('forgets what was handled long ago, later what was put aside, and nothing that waits', async () => {
    let now = 100;
    const store = await create(() => now);
    await store.receive([1, 2, 3, 4, 5].map((number) => arrived(number)));
    await write(store, handled(1));
    await write(store, handled(2, 'a planted fault'));
    now = 200;
    await write(store, handled(3));
    await write(store, handled(4));
    expect(await store.prune('here', { handled_at: 100, aside_at: 100, most: 9 })).toBe(0);
    expect(await store.prune('here', { handled_at: 150, aside_at: 100, most: 9 })).toBe(1);
    expect(await store.prune('there', { handled_at: 999, aside_at: 999, most: 9 })).toBe(0);
    expect(await store.prune('here', { handled_at: 999, aside_at: 100, most: 1 })).toBe(1);
    expect(await store.prune('here', { handled_at: 999, aside_at: 999, most: 9 })).toBe(2);
    expect(await waiting(store)).toEqual([5]);
    await store.close();
  });
}
