import type { Kysely } from 'kysely';
import type { Post } from '../../../core/cellar/mailbox.ts';
import { inParts } from './in-parts.ts';
import type { Tables } from './tables.ts';

/** Keeps something that is to be sent, behind all others; where it waits already nothing changes. */
export async function keepPost(db: Kysely<Tables>, { id, channel, chat, body, at }: Post): Promise<void> {
  const insert = db.insertInto('post').values({ id, channel, chat, body, at });
  await insert.onConflict((on) => on.doNothing()).execute();
}

/** What is to be sent, in order. */
export function readPosts(db: Kysely<Tables>, channel: string): Promise<Post[]> {
  const query = db.selectFrom('post').select(['id', 'channel', 'chat', 'body', 'at']);
  return query.where('channel', '=', channel).orderBy('place').execute();
}

/** Forgets posts. */
export async function dropPosts(db: Kysely<Tables>, channel: string, ids: readonly string[]): Promise<void> {
  for (const part of inParts(ids))
    await db.deleteFrom('post').where('channel', '=', channel).where('id', 'in', part).execute();
}

/** Gives posts another chat. */
export async function movePosts(
  db: Kysely<Tables>,
  channel: string,
  { ids, chat }: { readonly ids: readonly string[]; readonly chat: string },
): Promise<void> {
  for (const part of inParts(ids)) {
    const update = db.updateTable('post').set({ chat }).where('channel', '=', channel);
    await update.where('id', 'in', part).execute();
  }
}
