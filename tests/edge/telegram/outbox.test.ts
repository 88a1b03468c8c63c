import fc from 'fast-check';
import { describe, expect, test } from 'vitest';

import type { Post } from '../../../src/core/cellar/mailbox.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { createOutbox, type Outbox } from '../../../src/edge/telegram/outbox.ts';
import { NO_LIMITS, USUAL_LIMITS, type Limits } from '../../../src/edge/telegram/pace.ts';
import type { Sent } from '../../../src/edge/telegram/send-post.ts';
import { steppingClock } from './stepping-clock.ts';

const post = (id: string, chat: string, params: object = {}): Post => ({
  id,
  channel: 'telegram',
  chat,
  body: JSON.stringify({ method: 'sendMessage', params: { text: id, ...params } }),
  at: 0,
});
const BUTTONS = { reply_markup: { inline_keyboard: [[{ text: 'x', callback_data: 'x' }]] } };

interface Stage {
  readonly outbox: Outbox;
  /** What left, as `second chat text`. */
  readonly left: string[];
  readonly logged: string[];
  readonly moved: string[];
  /** Puts posts into the store and hands them over, and resolves when nothing waits. */
  readonly send: (...posts: Post[]) => Promise<void>;
  readonly unsettled: () => Promise<string[]>;
}

/** An outbox on a clock of its own; sendings end as `ends` says, one after the other, then well. */
function stage({
  limits = NO_LIMITS,
  ends = [],
}: { readonly limits?: Limits; readonly ends?: Sent[] } = {}): Stage {
  const clock = steppingClock();
  const store = createMemoryCellars({ now: clock.now });
  const left: string[] = [];
  const logged: string[] = [];
  const moved: string[] = [];
  const outbox = createOutbox({
    store,
    send: async ({ chat, body }) => {
      const { params } = JSON.parse(body) as { params: { text: string } };
      left.push(`${clock.now() / 1000} ${chat} ${params.text}`);
      return ends.shift() ?? { kind: 'sent' };
    },
    limits,
    clock,
    log: createLog({ level: 'info', to: { write: (line) => void logged.push(line) } }),
    onMoved: (from, to) => void moved.push(`${from} ${to}`),
    signal: new AbortController().signal,
  });
  return {
    outbox,
    left,
    logged,
    moved,
    send: async (...posts) => {
      const writes = posts.map((one) => ({ kind: 'post', post: one }) as const);
      await store.turn('cellar 1', async () => ({ writes, result: undefined }));
      outbox.add(posts);
      await outbox.idle();
    },
    unsettled: async () => (await store.posts('telegram')).map(({ id }) => id),
  };
}

const refused = (code: number, reason: string) => ({ kind: 'refused', code, reason }) as const;

describe('what is to be sent', () => {
  test('leaves in order within a chat, and is settled when it has arrived', async () => {
    const { send, left, unsettled } = stage();
    await send(post('a', '1'), post('b', '2'), post('c', '1'));
    expect(left).toEqual(['0 1 a', '0 2 b', '0 1 c']);
    expect(await unsettled()).toEqual([]);
  });

  test('waits for its chat alone where the platform asks for it, and nothing overtakes it there', async () => {
    const { send, left } = stage({ ends: [{ kind: 'slow down', wait_s: 7 }] });
    await send(post('a', '1', BUTTONS), post('b', '2'), post('c', '1', BUTTONS), post('d', '2'));
    expect(left).toEqual(['0 1 a', '0 2 b', '0 2 d', '7 1 a', '7 1 c']);
  });

  test('waits everywhere when three chats in a row are told to slow down', async () => {
    const slow = { kind: 'slow down', wait_s: 7 } as const;
    const { send, left } = stage({ ends: [slow, slow, slow] });
    await send(post('a', '1'), post('b', '2'), post('c', '3'), post('d', '4'), post('e', '4'));
    // What was on its way already arrives.
    expect(left.slice(0, 4)).toEqual(['0 1 a', '0 2 b', '0 3 c', '0 4 d']);
    expect(left.slice(4).toSorted()).toEqual(['7 1 a', '7 2 b', '7 3 c', '7 4 e']);
  });

  test('is tried again, later and later, as long as it does not arrive', async () => {
    const failed = { kind: 'failed', failure: { kind: 'unreached', reason: 'cut' } } as const;
    const { send, left } = stage({ ends: Array<Sent>(8).fill(failed) });
    await send(post('a', '1'));
    expect(left.map((line) => parseInt(line))).toEqual([0, 1, 3, 7, 15, 30, 60, 90, 120]);
  });

  test('is dropped quietly for a chat that takes nothing any more', async () => {
    const closed = { kind: 'closed', failure: refused(403, 'Forbidden') } as const;
    const { send, left, unsettled, logged } = stage({ ends: [closed] });
    await send(post('a', '1'), post('b', '1'));
    expect([left, await unsettled()]).toEqual([['0 1 a'], []]);
    expect(logged.filter((line) => /"level":[456]0/.test(line))).toEqual([]);
    await send(post('c', '1'));
    expect(left.map((line) => line.split(' ')[2])).toEqual(['a', 'c']);
  });

  test('goes to the new name of a group, all of it in order, and the change is told', async () => {
    const { send, left, moved, unsettled } = stage({ ends: [{ kind: 'moved', chat: '-1009' }] });
    await send(post('a', '-9'), post('b', '-9'), post('c', '1'));
    expect(left).toEqual(['0 -9 a', '0 1 c', '0 -1009 a', '0 -1009 b']);
    expect([moved, await unsettled()]).toEqual([['-9 -1009'], []]);
  });

  test('is given up alone and logged when the platform does not take it', async () => {
    const { send, left, logged, unsettled } = stage({
      ends: [{ kind: 'refused', failure: refused(400, 'Bad Request: planted') }],
    });
    await send(post('a', '1'), post('b', '1'));
    expect([left, await unsettled()]).toEqual([['0 1 a', '0 1 b'], []]);
    expect(logged.join('')).toContain('Bad Request: planted');
  });

  test('is made one message where several plain texts wait for one chat, and nothing else is', async () => {
    const { send, left } = stage({ ends: [{ kind: 'slow down', wait_s: 1 }] });
    const texts = [post('a', '1'), post('b', '1'), post('with buttons', '1', BUTTONS), post('c', '1')];
    await send(...texts, post('d'.repeat(4095), '1'));
    expect(left).toEqual(['0 1 a', '1 1 a\n\nb', '1 1 with buttons', '1 1 c', `1 1 ${'d'.repeat(4095)}`]);
  });
});

describe('the limits of the platform', () => {
  test('count a file with the messages of its chat', async () => {
    const { outbox, send, left } = stage({ limits: USUAL_LIMITS });
    for (let file = 0; file < 3; file += 1) (await outbox.pass('1')).arrived();
    await send(post('a', '1', BUTTONS), post('b', '2'));
    const [first, second] = left.map((line) => [line.split(' ')[2], Number(line.split(' ')[0]) >= 3]);
    expect([first, second]).toEqual([
      ['b', false],
      ['a', true],
    ]);
  });

  const anyChats = fc.array(
    fc.oneof(fc.constantFrom('1', '-4', '-5'), fc.integer({ min: -50, max: 50 }).map(String)),
    { minLength: 1, maxLength: 300, size: 'max' },
  );

  test('are kept in every stretch of time, whatever is to be sent, and nothing is late without need', async () => {
    await fc.assert(
      fc.asyncProperty(anyChats, async (wanted) => {
        const { send, left, unsettled } = stage({ limits: USUAL_LIMITS });
        await send(...wanted.map((chat, at) => post(`p${at}`, chat, BUTTONS)));
        expect(await unsettled()).toEqual([]);
        const times = (chats: RegExp): number[] =>
          left
            .filter((line) => chats.test(line.split(' ')[1] ?? ''))
            .map((line) => Number(line.split(' ')[0]));
        const most = (list: readonly number[], within_s: number): number =>
          Math.max(0, ...list.map((from) => list.filter((at) => at >= from && at < from + within_s).length));
        expect(most(times(/./), 1)).toBeLessThanOrEqual(30);
        for (const chat of new Set(wanted)) {
          const own = times(new RegExp(`^${chat}$`));
          expect(most(own, 3)).toBeLessThanOrEqual(3);
          const allowed = chat.startsWith('-') ? 20 : Infinity;
          expect(most(own, 60)).toBeLessThanOrEqual(allowed);
        }
      }),
      { numRuns: 60 },
    );
  });

  test('leave room for nine tenths of what the platform allows: 600 messages over 100 chats', async () => {
    const { send, left } = stage({ limits: USUAL_LIMITS });
    await send(...Array.from({ length: 600 }, (_, at) => post(`p${at}`, String(1 + (at % 100)), BUTTONS)));
    const last_s = Number(left.at(-1)?.split(' ')[0]);
    expect(left).toHaveLength(600);
    expect(600 / (last_s + 1)).toBeGreaterThan(0.9 * 30);
  });
});
