import { describe, expect, test } from 'vitest';
import type { CellarStore } from '../../../src/core/cellar/cellar-store.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { StoreError } from '../../../src/edge/store/store-error.ts';
import { NOON, startRun } from './start-run.ts';

describe('lines on a file, which any store stands for here', () => {
  const masses_g = (store: CellarStore): Promise<unknown[]> =>
    store.look('cellar', async (view) =>
      (await view.entries({})).map((entry) => 'mass_g' in entry && entry.mass_g),
    );
  const ADDED = { id: 7, chat: 'c', text: 'added 137 g kmbs T12' };

  test('a chat and an id make an entry once, in whatever run they come', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    await startRun({ store })(ADDED);
    const { reply } = await startRun({ store })(ADDED);
    expect(reply).toMatch(/already noted/i);
    expect(await masses_g(store)).toEqual([137]);
    await startRun({ store })({ ...ADDED, chat: 'd' });
    await startRun({ store })({ ...ADDED, id: 8 });
    expect(await masses_g(store)).toEqual([137, 137, 137]);
  });

  test('a line without a chat or without an id is another one every time', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    const answer = startRun({ store });
    for (const line of [{ chat: 'c' }, { id: 7 }, {}])
      for (const text of ['added 1 g kmbs T1', 'added 1 g kmbs T1']) await answer({ ...line, text });
    expect(await masses_g(store)).toHaveLength(6);
  });

  test('all lines are in one cellar, and the person is who notes it', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    const answer = startRun({ store });
    await answer({ id: 1, chat: 'c', person: 'Ana', text: 'T4 40 hl pH 3.5 red' });
    const { understood } = await answer({ id: 1, person: 'Luis\n', text: 'T4 free 20' });
    expect(understood[0]?.assumed).toMatchObject({ volume_L: 4000, ph: 3.5 });
    expect(await store.look('cellar', (view) => view.people())).toEqual([
      { number: 1, name: 'Ana' },
      { number: 2, name: 'Luis' },
    ]);
  });

  test('nothing is kept for a chat that nobody comes back to, but what it noted', async () => {
    const store = createMemoryCellars({ now: () => NOON });
    await startRun({ store })({ text: 'added 137 g kmbs T12' });
    await startRun({ store })({ text: 'T13 40 hl pH 3.4 free 15' });
    const [kept, due] = await store.look('cellar', async (view) => [
      await view.keptUnder(''),
      await view.allDue(),
    ]);
    expect(kept.map(({ key }) => key).filter((key) => /^(memory|reading|daily)/.test(key))).toEqual([]);
    expect(due).toEqual([]);
    expect(await masses_g(store)).toContain(137);
  });

  test('where nothing could be written, the line says so to the person and to the program', async () => {
    const full = new StoreError('full', { cause: new Error('planted') });
    const store = { ...createMemoryCellars({ now: () => NOON }), turn: () => Promise.reject(full) };
    const { reply, error, answers } = await startRun({ store })(ADDED);
    expect(reply).toMatch(/^Not noted/);
    expect(error).toBe('the store failed: full (planted)');
    expect(answers).toEqual([]);
  });
});
