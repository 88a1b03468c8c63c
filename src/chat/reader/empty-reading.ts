import type { Reading } from './understood.ts';

/**
 * A reading with an intent and nothing else but what is given; every list of it is there, and empty.
 *
 * @param intent What the message wants.
 * @param more The parts that are known.
 * @example
 * ```ts
 * emptyReading('chat').asks // => []
 * ```
 */
export const emptyReading = (intent: Reading['intent'], more: Partial<Reading> = {}): Reading => ({
  intent,
  fields: {},
  assumed: {},
  asks: [],
  problems: [],
  setAside: [],
  notes: [],
  marks: {},
  where: {},
  ...more,
});
