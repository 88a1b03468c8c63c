import type { Clock } from '../clock.ts';

/** At most so many within so long. */
export interface Limit {
  readonly most: number;
  readonly within_ms: number;
}

/** How fast may be sent. */
export interface Limits {
  /** Over all chats. */
  readonly all: readonly Limit[];
  /** In one chat with one person. */
  readonly person: readonly Limit[];
  readonly group: readonly Limit[];
}

/** What way a message takes is not known: so much later it counts with the platform. */
const MARGIN_MS = 50;

/**
 * As the platform asks: about 30 a second over all chats, one a second in a chat with short bursts, 20 a minute in a
 * group (its FAQ for bots, "My bot is hitting limits", from memory).
 */
export const USUAL_LIMITS: Limits = {
  all: [{ most: 30, within_ms: 1000 + MARGIN_MS }],
  person: [{ most: 3, within_ms: 3000 + MARGIN_MS }],
  group: [
    { most: 3, within_ms: 3000 + MARGIN_MS },
    { most: 20, within_ms: 60_000 + MARGIN_MS },
  ],
};

/** No limits: for measuring. */
export const NO_LIMITS: Limits = { all: [], person: [], group: [] };

/** When the next message may leave, by those that left. Times in milliseconds since 1970. */
export interface Window {
  /** `now` or later. */
  readonly opensAt: (now: number) => number;
  readonly note: (at: number) => void;
}

/** Makes a window that looks back on what left: in no stretch of time do more leave than a limit says. */
export function createWindow(limits: readonly Limit[]): Window {
  const longest = Math.max(0, ...limits.map(({ most }) => most));
  const left: number[] = [];
  return {
    opensAt: (now) => {
      const opening = limits.map(({ most, within_ms }) => {
        const opens = (left[left.length - most] ?? -Infinity) + within_ms;
        // The clock may have been set back since.
        return Math.min(opens, now + within_ms);
      });
      return Math.max(now, ...opening);
    },
    note: (at) => {
      if (longest === 0) return;
      left.push(at);
      if (left.length > longest) left.shift();
    },
  };
}

/** A way through which one passes after the other. */
export interface Gate {
  /** Resolves when it is one's turn, or at once when `signal` is aborted. */
  readonly pass: (signal: AbortSignal) => Promise<void>;
  /** Nobody passes before then, in milliseconds since 1970. */
  readonly closeUntil: (at: number) => void;
}

/** Makes a gate that lets pass as a window says, in the order of asking. */
export function createGate(window: Window, clock: Clock): Gate {
  let last = Promise.resolve();
  let closedUntil = -Infinity;
  const waitForTurn = async (signal: AbortSignal): Promise<void> => {
    for (;;) {
      const now = clock.now();
      const opensAt = Math.max(window.opensAt(now), closedUntil);
      if (opensAt <= now || signal.aborted) break;
      await clock.wait(opensAt - now, signal);
    }
    window.note(clock.now());
  };
  return {
    pass: (signal) => (last = last.then(() => waitForTurn(signal))),
    closeUntil: (at) => void (closedUntil = Math.max(closedUntil, at)),
  };
}
