import { expect, test } from 'vitest';

import type { Handle } from '../../../src/chat/conversation/ports.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { openScene } from './scene.ts';
import { hastyClock } from './served-bot.ts';
import { handle } from './stub-conversation.ts';

/** Counts how often each message is begun. */
const counting = (): { handle: Handle; begun: Record<string, number> } => {
  const begun: Record<string, number> = {};
  return {
    begun,
    handle: (message, ...rest) => {
      begun[message.id] = (begun[message.id] ?? 0) + 1;
      return handle(message, ...rest);
    },
  };
};

test('a message that throws three times is put aside with its cause, the person is told, and the queue goes on', async () => {
  await using scene = await openScene();
  const { rosa, serve } = scene;
  const store = createMemoryCellars({ now: hastyClock.now });
  const causes: unknown[] = [];
  const turn: typeof store.turn = (cellar, work) =>
    store.turn(cellar, async (view) => {
      const done = await work(view);
      causes.push(...done.writes.flatMap((write) => (write.kind === 'handled' ? [write.cause] : [])));
      return done;
    });
  const { begun, handle: counted } = counting();
  serve({ store: { ...store, turn }, handle: counted });
  rosa.sends('throw');
  rosa.sends('next');
  await rosa.reads(2);
  expect(rosa.texts).toEqual(['fault-aside', '1: next']);
  expect(begun).toEqual({ 'message 1': 3, 'message 2': 1 });
  expect(causes).toEqual(['Error: a planted fault', undefined]);
  expect(await store.waiting('telegram')).toEqual([]);
});

test('a message that fails once is answered all the same', async () => {
  await using scene = await openScene();
  const { rosa, serve } = scene;
  let failures = 0;
  serve({
    handle: async (...asked) => {
      failures += 1;
      if (failures < 3) throw new Error('a planted fault');
      return handle(...asked);
    },
  });
  rosa.sends('first');
  expect(await rosa.reads(1)).toBe('1: first');
});

test.each([
  [0, 'side by side with others', '1: first'],
  [1, 'alone', '1: first'],
  [3, 'alone', '1: first'],
  [4, 'not at all: it ended the process again and again', 'fault-aside'],
])('what %i earlier processes had in hand is taken up %s', async (tries, _, answer) => {
  await using scene = await openScene();
  const { api, rosa, serve } = scene;
  const store = createMemoryCellars({ now: hastyClock.now });
  rosa.sends('first');
  rosa.sends('second');
  const arrived = api.takeUpdates().map((update, at) => {
    const received_at = hastyClock.now();
    return { channel: 'telegram', number: 1001 + at, body: JSON.stringify(update), received_at };
  });
  await store.receive(arrived);
  for (let i = 0; i < tries; i += 1) await store.countTry('telegram', [1001]);
  serve({ store });
  await rosa.reads(2);
  expect(rosa.texts[0]).toBe(answer);
  expect(rosa.texts[1]).toContain('second');
  expect(await store.waiting('telegram')).toEqual([]);
});
