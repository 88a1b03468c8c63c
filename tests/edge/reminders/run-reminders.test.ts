import { expect, test } from 'vitest';
import { reminderAt } from '../../../src/core/cellar/reminder-at.ts';
import { runReminders } from '../../../src/edge/reminders/run-reminders.ts';
import { createWakeUp } from '../../../src/edge/reminders/wake-up.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { createFlyingClock } from './flying-clock.ts';
import { reminding, START } from './reminding.ts';

const MINUTE = 60_000;

test('what falls due is said at its time, also what is written while everybody waits', async () => {
  const bot = reminding();
  await bot.plan('a', 600);
  await bot.fly(17);
  await bot.plan('b', 20);
  await bot.plan('c', 17);
  await bot.fly(1000);
  expect(bot.said).toEqual(['c 17', 'b 20', 'a 600']);
});

test('what was due while nobody ran is said at once, and many things in the order of their time', async () => {
  const bot = reminding();
  const ids = Array.from({ length: 130 }, (_, index) => `n${index}`);
  for (const [index, id] of ids.entries()) await bot.plan(id, -1000 + index);
  await bot.fly(1);
  expect(bot.said).toEqual(ids.map((id) => `${id} 0`));
});

test('a reminder that was asked for in the evening comes the next evening, in quiet hours', async () => {
  const bot = reminding();
  const added = START + 13 * 60 * MINUTE; // 22:00 in Madrid
  await bot.plan('r', (reminderAt(added) - START) / 1000);
  await bot.fly(40 * 3600);
  expect(bot.said).toEqual([`r ${37 * 3600}`]);
});

test('what fails is tried again, later each time, and keeps nothing else from being said', async () => {
  const bot = reminding(({ id }) => {
    if (id.startsWith('poison')) throw new Error('planted');
  });
  for (let index = 0; index < 60; index += 1) await bot.plan(`poison${index}`, 0);
  await bot.plan('a', 1);
  await bot.plan('b', 90);
  await bot.fly(90);
  expect(bot.said).toEqual(['a 1', 'b 90']);
  await bot.fly(3 * 3600);
  const minutes = bot.tries
    .filter((one) => one.startsWith('poison7 '))
    .map((one) => Number(one.split(' ')[1]) / 60);
  expect(minutes).toEqual([0, 1, 3, 8, 23, 83, 143]);
  expect(bot.logged).toHaveLength(60 * minutes.length);
  expect(new Set(bot.logged)).toEqual(new Set(['what is due could not be said: planted']));
});

test('what failed and then works is said once', async () => {
  let left = 2;
  const bot = reminding(() => {
    if (left-- > 0) throw new Error('planted');
  });
  await bot.plan('a', 10);
  await bot.fly(3600);
  expect(bot.tries).toEqual(['a 10', 'a 70', 'a 190']);
  expect(bot.said).toEqual(['a 190']);
});

test('what hangs is not begun a second time, holds nobody up, and a stop does not wait for it for ever', async () => {
  const bot = reminding(({ id }) => (id === 'hangs' ? new Promise(() => {}) : undefined));
  await bot.plan('hangs', 0);
  await bot.plan('a', 30);
  await bot.plan('b', 600);
  await bot.fly(1000);
  expect(bot.tries).toEqual(['hangs 0', 'a 30', 'b 600']);
  bot.stop();
  await Promise.all([bot.running, bot.fly(1011)]);
  expect(bot.logged).toEqual(['not all that was being said has ended: undefined']);
});

test('fifty that hang leave the store alone, and the next one is begun as soon as one of them ends', async () => {
  const ends: (() => void)[] = [];
  const bot = reminding(() => new Promise((resolve) => ends.push(resolve)));
  for (let index = 0; index < 51; index += 1) await bot.plan(`n${index}`, 0);
  await bot.fly(30);
  expect(bot.tries).toHaveLength(50);
  ends[3]?.();
  await bot.fly(31);
  expect(bot.said).toEqual(['n3 30']);
  expect(bot.tries.at(-1)).toBe('n50 30');
});

test('what takes longer than its lease, and ends while it is handed out again, is said once', async () => {
  let end = (): void => {};
  const bot = reminding(
    () => new Promise((resolve) => (end = resolve)),
    (store) => ({
      takeDue: async (now, options) => {
        const taken = await store.takeDue(now, options);
        if (now >= START + MINUTE) {
          end();
          await new Promise((resolve) => setImmediate(resolve));
        }
        return taken;
      },
    }),
  );
  await bot.plan('a', 0);
  for (const second of [600, 601, 602]) await bot.fly(second);
  expect(bot.tries).toEqual(['a 0']);
  expect(bot.said).toEqual(['a 60']);
});

test('a stop ends the wait, lets what is being said end, and begins nothing more', async () => {
  let end = (): void => {};
  const bot = reminding(() => new Promise((resolve) => (end = resolve)));
  await bot.plan('a', 0);
  await bot.plan('b', 100);
  await bot.fly(20);
  bot.stop();
  await bot.fly(21);
  end();
  await bot.running;
  await bot.fly(1000);
  expect(bot.said).toEqual(['a 21']);
  expect(bot.logged).toEqual([]);
});

test('a stop that comes while the store is asked leaves what it hands out to its lease', async () => {
  let stop = (): void => {};
  const bot = reminding(
    () => {},
    (store) => ({
      takeDue: async (now, options) => {
        const taken = await store.takeDue(now, options);
        if (taken.length > 0) stop();
        return taken;
      },
    }),
  );
  stop = bot.stop;
  await bot.plan('a', 5);
  await bot.fly(100);
  await bot.running;
  expect(bot.tries).toEqual([]);
});

test('what throws before it waits for anything is tried again like everything else', async () => {
  let left = 1;
  const clock = createFlyingClock(START);
  const store = createMemoryCellars({ now: clock.now });
  const due = { id: 'a', chat: 'one', at: START, about: '{}' };
  await store.turn('c', async () => ({ writes: [{ kind: 'due', due }], result: undefined }));
  const said: number[] = [];
  const say = (): Promise<void> => {
    if (left-- > 0) throw new Error('planted');
    said.push((clock.now() - START) / 1000);
    return store.turn('c', async () => ({ writes: [{ kind: 'said', id: 'a' }], result: undefined }));
  };
  const log = { error: () => {}, warn: () => {} };
  const controller = new AbortController();
  const running = runReminders({ store, say, clock, log, wakeUp: createWakeUp(), signal: controller.signal });
  await clock.flyTo(START + 10 * MINUTE);
  controller.abort();
  await running;
  expect(said).toEqual([60]);
});

test('a store that fails is asked again, later each time, and nothing is lost', async () => {
  const asked: number[] = [];
  let clockNow = (): number => 0;
  const bot = reminding(
    () => {},
    (store) => ({
      takeDue: async (now, options) => {
        asked.push((clockNow() - START) / 1000);
        if (asked.length <= 4) throw new Error('planted');
        return store.takeDue(now, options);
      },
    }),
  );
  clockNow = bot.clock.now;
  await bot.plan('a', 2);
  await bot.fly(60);
  expect(asked.slice(1, 5)).toEqual([1, 3, 8, 23]);
  expect(bot.said).toEqual(['a 23']);
  expect(bot.logged).toEqual(Array.from({ length: 4 }, () => 'what is due could not be read: planted'));
});

test('a clock that was set forward is noticed within a minute', async () => {
  const bot = reminding();
  await bot.plan('a', 7200);
  await bot.fly(1);
  // Nobody is woken by a jump; the next look at the clock finds it.
  const now = bot.clock.now;
  const jumped = { ...bot.clock, now: () => now() + 7200_000 };
  Object.assign(bot.clock, { now: jumped.now });
  await bot.fly(61);
  expect(bot.said.map((one) => one.split(' ')[0])).toEqual(['a']);
});

test('a store that hands nothing out although it is due is not asked without end', async () => {
  let asked = 0;
  const bot = reminding(
    () => {},
    () => ({
      takeDue: async () => {
        asked += 1;
        return [];
      },
    }),
  );
  await bot.plan('a', 0);
  await bot.fly(10);
  expect(asked).toBeLessThanOrEqual(13);
});
