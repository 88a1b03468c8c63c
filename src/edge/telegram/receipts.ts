/** Under which number the platform keeps the message that answered an event. */
export interface Receipts {
  readonly note: (chat: string, event: string, messageId: number | undefined) => void;
  readonly find: (chat: string, event: string) => number | undefined;
  /** All that are remembered, to be handed to the next process. */
  readonly all: () => readonly Receipt[];
}

/** The number of a message, under the chat and the event that it answered. */
export type Receipt = readonly [key: string, messageId: number];

/**
 * So many are remembered. Only a correction within a quarter of an hour asks for one; where there is none, as after a
 * crash, the correction is sent as a message of its own.
 */
const MOST_KNOWN = 5000;

/** Makes what remembers the last receipts, those of an earlier process among them. */
export function createReceipts(earlier: readonly Receipt[] = []): Receipts {
  const known = new Map<string, number>(earlier);
  const keyOf = (chat: string, event: string): string => `${chat} ${event}`;
  return {
    note: (chat, event, messageId) => {
      if (messageId === undefined) return;
      const key = keyOf(chat, event);
      known.delete(key);
      known.set(key, messageId);
      const [oldest] = known.keys();
      if (known.size > MOST_KNOWN && oldest !== undefined) known.delete(oldest);
    },
    find: (chat, event) => known.get(keyOf(chat, event)),
    all: () => [...known],
  };
}
