/** Under which number the platform keeps the message that answered an event. */
export interface Receipts {
  readonly note: (chat: string, event: string, messageId: number | undefined) => void;
  readonly find: (chat: string, event: string) => number | undefined;
}

/**
 * So many are remembered. Only a correction within a quarter of an hour asks for one; after a restart there is none, and
 * the correction is sent as a message of its own.
 */
const MOST_KNOWN = 5000;

/** Makes what remembers the last receipts. */
export function createReceipts(): Receipts {
  const known = new Map<string, number>();
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
  };
}
