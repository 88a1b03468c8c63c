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

/** Clocks differ a little. */
const MARGIN_MS = 10;
/**
 * When a message counts with the platform lies between its leaving and its receipt: it is taken for the latest, and for
 * so much after its leaving while there is no receipt.
 */
const LONGEST_WAY_MS = 250;

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

/** A message on its way. */
export interface Passed {
  /** Its receipt came. */
  readonly arrived: () => void;
}

/** When the next message may leave, by those that left. Times in milliseconds since 1970. */
export interface Window {
  /** `now` or later. */
  readonly opensAt: (now: number) => number;
  /** A message leaves. Its receipt is told where that comes in time. */
  readonly note: (at: number) => { readonly arrived: (at: number) => void };
}

/** Makes a window that looks back on what left: in no stretch of time do more leave than a limit says. */
export function createWindow(limits: readonly Limit[]): Window {
  const longest = Math.max(0, ...limits.map(({ most }) => most));
  const left: { latest_at: number }[] = [];
  return {
    opensAt: (now) => {
      if (left.length === 0) return now;
      const times = left.map(({ latest_at }) => latest_at).sort((one, other) => one - other);
      const opening = limits.map(({ most, within_ms }) => {
        const opens = (times[times.length - most] ?? -Infinity) + within_ms;
        // The clock may have been set back since.
        return Math.min(opens, now + within_ms + LONGEST_WAY_MS);
      });
      return Math.max(now, ...opening);
    },
    note: (at) => {
      const one = { latest_at: at + LONGEST_WAY_MS };
      if (longest > 0) left.push(one);
      if (left.length > longest) left.shift();
      return { arrived: (receipt_at) => void (one.latest_at = Math.min(one.latest_at, receipt_at)) };
    },
  };
}

/** A way through which one passes after the other. */
export interface Gate {
  /** Resolves when it is one's turn, or at once when `signal` is aborted. */
  readonly pass: (signal: AbortSignal) => Promise<Passed>;
  /** Nobody passes before then, in milliseconds since 1970. */
  readonly closeUntil: (at: number) => void;
}

/** Makes a gate that lets pass as a window says, in the order of asking. */
export function createGate(window: Window, clock: Clock): Gate {
  let last: Promise<unknown> = Promise.resolve();
  let closedUntil = -Infinity;
  const waitForTurn = async (signal: AbortSignal): Promise<Passed> => {
    for (;;) {
      const now = clock.now();
      const opensAt = Math.max(window.opensAt(now), closedUntil);
      if (opensAt <= now || signal.aborted) break;
      await clock.wait(opensAt - now, signal);
    }
    const passed = window.note(clock.now());
    return { arrived: () => passed.arrived(clock.now()) };
  };
  return {
    pass: (signal) => {
      const turn = last.then(() => waitForTurn(signal));
      last = turn;
      return turn;
    },
    closeUntil: (at) => void (closedUntil = Math.max(closedUntil, at)),
  };
}
