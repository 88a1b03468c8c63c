/** So many chats in a row that were told to slow down, and it is not about one chat. */
const MOST_CHATS = 3;

/** Tells whether a request to slow down is about one chat or about all: the platform does not say so. */
export interface SlowDowns {
  /** Whether it is about all. */
  readonly note: (chat: string) => boolean;
  readonly succeeded: () => void;
}

/** Makes what remembers who was told to slow down since the last message went through. */
export function createSlowDowns(): SlowDowns {
  const chats = new Set<string>();
  return {
    note: (chat) => chats.add(chat).size >= MOST_CHATS,
    succeeded: () => chats.clear(),
  };
}
