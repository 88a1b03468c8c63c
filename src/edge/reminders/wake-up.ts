import type { Clock } from '../clock.ts';

/** A wait that can be ended early from outside. */
export interface WakeUp {
  /** Ends the wait, or the next one where nobody is waiting: what happens between two waits is not missed. */
  wake(): void;
  /** Resolves after `ms` milliseconds, when woken, or when `signal` is aborted. Never rejects. */
  wait(ms: number, options: { readonly clock: Clock; readonly signal: AbortSignal }): Promise<void>;
}

/** Makes a wake-up for one that waits. */
export function createWakeUp(): WakeUp {
  let woken = false;
  let end = (): void => {};
  return {
    wake: () => {
      woken = true;
      end();
    },
    wait: async (ms, { clock, signal }) => {
      if (!woken && !signal.aborted) {
        const nap = new AbortController();
        end = () => nap.abort();
        signal.addEventListener('abort', end);
        await clock.wait(ms, nap.signal);
        signal.removeEventListener('abort', end);
      }
      woken = false;
    },
  };
}
