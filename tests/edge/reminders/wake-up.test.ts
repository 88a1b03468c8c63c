import { expect, test } from 'vitest';
import { createWakeUp } from '../../../src/edge/reminders/wake-up.ts';
import { createFlyingClock } from './flying-clock.ts';

/** Waits 60 seconds again and again, and notes when each wait ended. */
function waiting() {
  const clock = createFlyingClock(0);
  const wakeUp = createWakeUp();
  const controller = new AbortController();
  const ended: number[] = [];
  const wait = async (): Promise<void> => {
    await wakeUp.wait(60_000, { clock, signal: controller.signal });
    ended.push(clock.now() / 1000);
  };
  return {
    wakeUp,
    wait,
    ended,
    fly: (to_s: number) => clock.flyTo(1000 * to_s),
    abort: () => controller.abort(),
  };
}

test('a wait ends by itself, when woken, and when it is aborted', async () => {
  const { wakeUp, wait, ended, fly, abort } = waiting();
  void wait();
  await fly(61);
  void wait();
  await fly(70);
  wakeUp.wake();
  await fly(71);
  void wait();
  await fly(80);
  abort();
  await fly(81);
  void wait();
  await fly(90);
  expect(ended).toEqual([60, 70, 80, 81]);
});

test('who is woken between two waits does not begin the next one, but the one after', async () => {
  const { wakeUp, wait, ended, fly } = waiting();
  wakeUp.wake();
  wakeUp.wake();
  await wait();
  void wait();
  await fly(100);
  expect(ended).toEqual([0, 60]);
});
