import { setImmediate as nextTurnOfTheLoop } from 'node:timers/promises';
import { expect, test } from 'vitest';
import { allEntries, note, noteIn, numbersOf, write, writeOf, type CreateStore } from './notes.ts';

/** Turns: alone in a cellar, whole or not at all. */
export function testTurns(create: CreateStore): void {
  test('gives back the result, with writes and without', async () => {
    const store = await create(() => 0);
    expect(await store.turn('cellar 1', async () => ({ writes: [], result: 'none' }))).toBe('none');
    const writes = [writeOf(note(1))];
    expect(await store.turn('cellar 1', async () => ({ writes, result: 'one' }))).toBe('one');
    await store.close();
  });

  test('of one cellar one at a time, in the order they were asked for', async () => {
    const store = await create(() => 0);
    let running = 0;
    const seen: number[] = [];
    await Promise.all(
      Array.from({ length: 20 }, (_, at) =>
        store.turn('cellar 1', async (view) => {
          running += 1;
          if (at % 3 === 0) await nextTurnOfTheLoop();
          seen.push(await view.nextEntry());
          expect(running).toBe(1);
          running -= 1;
          return { writes: [writeOf(note(at))], result: undefined };
        }),
      ),
    );
    expect(seen).toEqual(Array.from({ length: 20 }, (_, at) => at + 1));
    expect((await allEntries(store)).map(({ at, entry }) => entry - at)).toEqual(Array(20).fill(1));
    await store.close();
  });

  test('of another cellar go on while one waits', async () => {
    const store = await create(() => 0);
    const { promise: wait, resolve } = Promise.withResolvers<void>();
    const slow = store.turn('cellar 1', async () => {
      await wait;
      return { writes: [writeOf(note(1))], result: undefined };
    });
    await store.turn('cellar 2', async () => ({ writes: [writeOf(note(2))], result: undefined }));
    expect(await store.look('cellar 2', (view) => view.nextEntry())).toBe(2);
    resolve();
    await slow;
    expect(await store.look('cellar 1', (view) => view.nextEntry())).toBe(2);
    await store.close();
  });

  test('of many cellars at once do not mix', async () => {
    const store = await create(() => 0);
    const cellars = Array.from({ length: 10 }, (_, at) => `cellar ${at}`);
    await Promise.all(
      [1, 2, 3, 4, 5].flatMap((at) =>
        cellars.map((cellar) =>
          store.turn(cellar, async (view) => {
            if ((at + cellar.length) % 2 === 0) await nextTurnOfTheLoop();
            const vessel = await view.vessel('tank 4');
            expect(vessel?.readings.length ?? 0).toBe(at - 1);
            return {
              writes: [writeOf(note(at)), writeOf(note(at, { key: `more ${at}`, vessels: [cellar] }))],
              result: 0,
            };
          }),
        ),
      ),
    );
    for (const cellar of cellars) {
      const entries = await store.look(cellar, (view) => view.entries({}));
      expect(numbersOf(entries)).toEqual(Array.from({ length: 10 }, (_, at) => at + 1));
    }
    await store.close();
  });

  test('see all that an earlier turn wrote, though that one is not done yet', async () => {
    const store = await create(() => 0);
    const first = write(store, writeOf(note(1)), { kind: 'keep', key: 'k', text: 'kept' });
    const second = store.turn('cellar 1', async (view) => ({
      writes: [],
      result: [await view.nextEntry(), await view.kept('k'), (await view.vessel('tank 4'))?.last_entry],
    }));
    expect(await second).toEqual([2, 'kept', 1]);
    await first;
    await store.close();
  });

  test('that fail reject with what they failed with, and leave nothing', async () => {
    const store = await create(() => 0);
    const fault = new Error('the conversation is broken');
    await expect(store.turn('cellar 1', () => Promise.reject(fault))).rejects.toBe(fault);
    await noteIn(store, note(1));
    const again = writeOf(note(1));
    const failing = write(store, writeOf(note(2)), { kind: 'keep', key: 'k', text: 'kept' }, again);
    const beside = noteIn(store, note(3));
    const elsewhere = store.turn('cellar 2', async () => ({ writes: [writeOf(note(4))], result: 'kept' }));
    await expect(failing).rejects.toThrow(RangeError);
    await beside;
    expect(await elsewhere).toBe('kept');
    expect((await allEntries(store)).map(({ entry, at }) => [entry, at])).toEqual([
      [1, 1],
      [2, 3],
    ]);
    expect(await store.look('cellar 1', (view) => view.kept('k'))).toBeUndefined();
    await store.close();
  });

  test('do not hold up who only looks, who sees each of them whole', async () => {
    const store = await create(() => 0);
    await noteIn(store, note(1));
    const look = (): Promise<number> => store.look('cellar 1', (view) => view.nextEntry());
    const counted: number[] = [];
    await store.turn('cellar 1', async () => {
      counted.push(await look());
      return { writes: [writeOf(note(2)), writeOf(note(3))], result: undefined };
    });
    const turn = noteIn(store, note(4), note(5));
    const looks = Array.from({ length: 50 }, look);
    await turn;
    counted.push(...(await Promise.all(looks)), await look());
    expect(counted.filter((number) => ![2, 4, 6].includes(number))).toEqual([]);
    expect([counted[0], counted.at(-1)]).toEqual([2, 6]);
    await store.close();
  });

  test('make a cellar known when they write into it', async () => {
    const store = await create(() => 0);
    await store.turn('cellar 3', async () => ({ writes: [], result: undefined }));
    await store.look('cellar 4', (view) => view.nextEntry());
    await store.turn('cellar 2', async () => ({ writes: [{ kind: 'drop', key: 'k' }], result: undefined }));
    await noteIn(store, note(1));
    expect(await store.cellars()).toEqual(['cellar 1', 'cellar 2']);
    await store.close();
  });
}
