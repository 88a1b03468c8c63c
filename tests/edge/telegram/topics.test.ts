import { expect, test } from 'vitest';

import type { Write } from '../../../src/core/cellar/cellar-store.ts';
import type { Post } from '../../../src/core/cellar/mailbox.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { createWakeUp } from '../../../src/edge/reminders/wake-up.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { remind } from '../../../src/edge/telegram/remind.ts';
import { noteTopics } from '../../../src/edge/telegram/topics.ts';
import { hastyClock as clock } from './served-bot.ts';

const GROUP = -4001;

/** What is sent of a thing that was asked for there, and falls due. */
async function remindedOf(chatId: number, threadId?: number): Promise<unknown[]> {
  const store = createMemoryCellars({ now: clock.now });
  const due = { id: 'measure T4', chat: `telegram:${chatId}`, at: clock.now(), about: '' };
  const writes: Write[] = [{ kind: 'due', due }];
  // First in another topic, then here.
  for (const spot of [{ threadId: 5 }, threadId === undefined ? {} : { threadId }])
    await store.turn('cellar 1', async () => ({
      writes: [...writes, ...noteTopics({ chatId, ...spot }, writes)],
      result: undefined,
    }));
  const stop = new AbortController();
  const sent: Post[] = [];
  await remind({
    store,
    serveDue: async ({ cellar, id, chat }, _, also) =>
      store.turn(cellar, async () => {
        const said: Write = { kind: 'said', id };
        const unasked = { chat, said: [{ text: 'T4 is due', buttons: [] }] };
        return { writes: [said, ...(also?.(unasked, [said]) ?? [])], result: unasked };
      }),
    wakeUp: createWakeUp(),
    send: (posts) => {
      sent.push(...posts);
      stop.abort();
    },
    clock,
    log: createLog({ level: 'silent', to: { write: () => undefined } }),
    signal: stop.signal,
  });
  expect(await store.look('cellar 1', (view) => view.keptUnder('telegram topic '))).toEqual([]);
  return sent.map(({ body }) => (JSON.parse(body) as { params: object }).params);
}

test('what falls due is said in the topic of the group where it was asked for last', async () => {
  expect(await remindedOf(GROUP, 77)).toEqual([
    expect.objectContaining({ text: 'T4 is due', message_thread_id: 77 }),
  ]);
});

test.each([
  ['asked for outside all topics is said outside them', GROUP],
  ['asked for in a private chat has no topic', 7001],
])('what was %s', async (_, chatId) => {
  const [params] = await remindedOf(chatId);
  expect(params).toMatchObject({ text: 'T4 is due' });
  expect(params).not.toHaveProperty('message_thread_id');
});
