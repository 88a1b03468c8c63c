import { setImmediate as nextTurnOfTheLoop } from 'node:timers/promises';

import type { Clock } from '../../../src/edge/clock.ts';

/** A clock that begins at 0 and goes on to the next moment that somebody waits for when nothing else happens. */
export function steppingClock(): Clock {
  let now = 0;
  let stepping = false;
  const sleepers = new Set<{ readonly at: number; readonly wake: () => void }>();
  const step = async (): Promise<void> => {
    stepping = true;
    while (sleepers.size > 0) {
      await nextTurnOfTheLoop();
      await nextTurnOfTheLoop();
      now = Math.max(now, Math.min(...Array.from(sleepers, ({ at }) => at)));
      for (const sleeper of sleepers)
        if (sleeper.at <= now) {
          sleepers.delete(sleeper);
          sleeper.wake();
        }
    }
    stepping = false;
  };
  return {
    now: () => now,
    wait: (ms, signal) =>
      new Promise((wake) => {
        if (signal?.aborted === true) return wake();
        const sleeper = { at: now + ms, wake };
        sleepers.add(sleeper);
        signal?.addEventListener('abort', () => {
          if (sleepers.delete(sleeper)) wake();
        });
        if (!stepping) void step();
      }),
  };
}
