/** What is counted for whoever runs the program. */
export interface Meter {
  readonly received: (updates: number) => void;
  /** What became of an update, and how long that took once it was its turn. */
  readonly handled: (outcome: 'answered' | 'left' | 'aside', seconds: number) => void;
  readonly sent: () => void;
  readonly refused: (reason: 'slow down' | 'failed' | 'closed' | 'moved' | 'refused') => void;
}

/** How much waits, and since when the oldest of it does (milliseconds since 1970). */
export interface Depth {
  readonly count: number;
  readonly oldest_at?: number;
}

/** Counts nothing: where nobody asks. */
export const NO_METER: Meter = {
  received: () => undefined,
  handled: () => undefined,
  sent: () => undefined,
  refused: () => undefined,
};
