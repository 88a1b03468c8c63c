import { expect, test } from 'vitest';

import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { StoreError } from '../../../src/edge/store/store-error.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';

test('what is handled while it is written, and then cannot be kept, is answered once: when the platform brings it again', async () => {
  await using scene = await openScene();
  const { rosa, serve } = scene;
  const store = createMemoryCellars({ now: hastyClock.now });
  let turns = 0;
  let refusals = 2;
  const bot = serve({
    store: {
      ...store,
      turn: (cellar, work) => {
        turns += 1;
        return store.turn(cellar, work);
      },
      receive: async (arrived, onWritten) => {
        if (refusals === 0 || arrived.length === 0) return store.receive(arrived, onWritten);
        refusals -= 1;
        const before = turns;
        onWritten?.(arrived);
        await expect.poll(() => turns).toBeGreaterThan(before);
        throw new StoreError('full', { cause: new Error('planted') });
      },
    },
  });
  rosa.sends('first');
  expect(await rosa.reads(1)).toBe('1: first');
  rosa.sends('second');
  await rosa.reads(2);
  expect([rosa.texts, refusals]).toEqual([['1: first', '2: second'], 0]);
  expect(bot.logged.join('')).not.toContain('could not be answered');
});
