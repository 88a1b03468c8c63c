import type { Kysely } from 'kysely';
import type { Arrived, Mailbox } from '../../../core/cellar/mailbox.ts';
import { countTries, keepArrived, pruneArrived, readWaiting } from './arrived-things.ts';
import { dropPosts, movePosts, readPosts } from './posts.ts';
import type { Tables } from './tables.ts';

/**
 * The mailbox in the tables. `write` runs its work whole or not at all, and resolves when it is durable; `onWritten` is
 * called in between.
 */
export function createSqlMailbox(
  db: Kysely<Tables>,
  write: (work: () => Promise<void>, onWritten?: () => void) => Promise<void>,
): Mailbox {
  return {
    receive: async (arrived, onWritten) => {
      if (arrived.length === 0) return [];
      let fresh: readonly Arrived[] = [];
      const keep = async (): Promise<void> => void (fresh = await keepArrived(db, arrived));
      await write(keep, () => onWritten?.(fresh));
      return fresh;
    },
    waiting: (channel) => readWaiting(db, channel),
    countTry: (channel, numbers) => write(() => countTries(db, channel, numbers)),
    posts: (channel) => readPosts(db, channel),
    settle: (channel, ids) => write(() => dropPosts(db, channel, ids)),
    readdress: (channel, ids, chat) => write(() => movePosts(db, channel, { ids, chat })),
    prune: async (channel, before) => {
      let gone = 0;
      await write(async () => void (gone = await pruneArrived(db, channel, before)));
      return gone;
    },
  };
}
