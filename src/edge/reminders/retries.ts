/** Which due things failed to be said, and from when on each may be tried again; times in milliseconds since 1970. */
export interface Retries {
  mayTry(key: string, now: number): boolean;
  failed(key: string, tried_at: number): void;
  succeeded(key: string): void;
}

const MINUTE_MS = 60_000;
const WAITS_MS = [1, 2, 5, 15, 60].map((minutes) => minutes * MINUTE_MS);
const LONGEST_MS = 60 * MINUTE_MS;
/** Somebody else may have said it meanwhile: it is forgotten when it did not come again for so long. */
const FORGOTTEN_MS = 24 * LONGEST_MS;

/** Remembers failures as long as the process lives; a restart tries everything at once. */
export function createRetries(): Retries {
  const known = new Map<string, { readonly failures: number; readonly from: number }>();
  return {
    mayTry: (key, now) => now >= (known.get(key)?.from ?? 0),
    failed: (key, tried_at) => {
      for (const [other, { from }] of known) if (from < tried_at - FORGOTTEN_MS) known.delete(other);
      const failures = (known.get(key)?.failures ?? 0) + 1;
      known.set(key, { failures, from: tried_at + (WAITS_MS[failures - 1] ?? LONGEST_MS) });
    },
    succeeded: (key) => void known.delete(key),
  };
}
