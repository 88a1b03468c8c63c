import type { Depth } from '../http/meter.ts';

/** What waits in a queue knows since when. */
interface Queued {
  readonly received_at: number;
}

/** Queues of chats: what waits in one is handled in order, and those of different chats side by side. */
export interface ChatQueues<T> {
  readonly add: (chatId: number, one: T) => void;
  /** How many wait or are in hand. */
  readonly count: () => number;
  readonly depth: () => Depth;
  /** Resolves when nothing waits, or when the work has stopped. */
  readonly idle: () => Promise<void>;
}

/**
 * Makes queues; a chat for which nothing waits takes no memory. `handle` is given all that waits in a chat and gives
 * back how many of the first it has done; 0 stops the work in that chat. It must not reject.
 */
export function createChatQueues<T extends Queued>(
  handle: (queue: readonly [T, ...T[]]) => Promise<number>,
): ChatQueues<T> {
  const queues = new Map<number, T[]>();
  let count = 0;
  let running = 0;
  let watchers: (() => void)[] = [];

  const run = async (chatId: number, queue: T[]): Promise<void> => {
    running += 1;
    // All that came with it is seen together.
    await Promise.resolve();
    while (queue.length > 0) {
      const done = await handle(queue as [T, ...T[]]);
      if (done === 0) break;
      queue.splice(0, done);
      count -= done;
    }
    queues.delete(chatId);
    running -= 1;
    if (running === 0) for (const watcher of watchers.splice(0)) watcher();
  };

  return {
    add: (chatId, one) => {
      count += 1;
      const queue = queues.get(chatId);
      if (queue !== undefined) return void queue.push(one);
      const made = [one];
      queues.set(chatId, made);
      void run(chatId, made);
    },
    count: () => count,
    depth: () => {
      const firsts = [...queues.values()].flatMap(([first]) => (first === undefined ? [] : [first]));
      if (firsts.length === 0) return { count };
      return { count, oldest_at: Math.min(...firsts.map(({ received_at }) => received_at)) };
    },
    idle: async () => {
      while (running > 0) await new Promise<void>((resolve) => (watchers = [...watchers, resolve]));
    },
  };
}
