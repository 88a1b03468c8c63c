import type { Clock } from '../../../src/edge/clock.ts';

/** A clock that stands until it is told to fly, and on its way wakes everybody at their time. */
export interface FlyingClock extends Clock {
  /** Goes to a moment; whoever waits is woken in order, and has done what it can before the clock goes on. */
  flyTo(to: number): Promise<void>;
}

/** Makes a clock that shows `start`, in milliseconds since 1970. */
export function createFlyingClock(start: number): FlyingClock {
  let now = start;
  const sleepers = new Set<{ readonly at: number; readonly wake: () => void }>();
  return {
    now: () => now,
    wait: (ms, signal) =>
      new Promise((resolve) => {
        if (signal?.aborted === true) return resolve();
        const wake = (): void => {
          sleepers.delete(sleeper);
          signal?.removeEventListener('abort', wake);
          resolve();
        };
        const sleeper = { at: now + ms, wake };
        sleepers.add(sleeper);
        signal?.addEventListener('abort', wake);
      }),
    flyTo: async (to) => {
      for (;;) {
        await settled();
        const next = [...sleepers].toSorted((a, b) => a.at - b.at)[0];
        if (next === undefined || next.at > to) break;
        now = Math.max(now, next.at);
        next.wake();
      }
      now = to;
    },
  };
}

/** Everything that needs no time has been done. */
const settled = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));
