/** The time, handed in wherever it is needed, so that a test can hold it. */
export interface Clock {
  /** Milliseconds since 1970. */
  readonly now: () => number;
  /** Resolves after `ms` milliseconds, or as soon as `signal` is aborted. Never rejects. */
  readonly wait: (ms: number, signal?: AbortSignal) => Promise<void>;
}

/** The clock of the machine. */
export const systemClock: Clock = {
  now: () => Date.now(),
  wait: (ms, signal) =>
    new Promise((resolve) => {
      if (signal?.aborted === true) return resolve();
      const finish = (): void => {
        clearTimeout(timer);
        signal?.removeEventListener('abort', finish);
        resolve();
      };
      const timer = setTimeout(finish, ms);
      signal?.addEventListener('abort', finish);
    }),
};
