/** Runs tasks of one chat one after the other, and those of different chats side by side. */
export interface ChatQueues {
  /** Puts a task at the end of its chat's queue. The task must not reject. */
  add(chatId: number, task: () => Promise<void>): void;
  /** Resolves when no task is left. */
  idle(): Promise<void>;
}

/** Makes queues; a chat without tasks takes no memory. */
export function createChatQueues(): ChatQueues {
  const tails = new Map<number, Promise<void>>();
  return {
    add: (chatId, task) => {
      const tail = (tails.get(chatId) ?? Promise.resolve()).then(task).then(() => {
        if (tails.get(chatId) === tail) tails.delete(chatId);
      });
      tails.set(chatId, tail);
    },
    idle: async () => {
      while (tails.size > 0) await Promise.all(tails.values());
    },
  };
}
