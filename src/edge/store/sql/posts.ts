import type { Kysely } from 'kysely';
import type { Post } from '../../../core/cellar/mailbox.ts';
import { inParts } from './in-parts.ts';
import { readyQuery } from './ready-query.ts';
import type { Tables } from './tables.ts';

const keep = readyQuery((db, post: Post) =>
  db
    .insertInto('post')
    .values(post)
    .onConflict((on) => on.doNothing()),
);

const drop = readyQuery(
  (db, { channel, ids }: { readonly channel: string; readonly ids: readonly string[] }) =>
    db.deleteFrom('post').where('channel', '=', channel).where('id', 'in', ids),
);

/** Keeps something that is to be sent, behind all others; where it waits already nothing changes. */
export async function keepPost(db: Kysely<Tables>, { id, channel, chat, body, at }: Post): Promise<void> {
  await keep(db, { id, channel, chat, body, at });
}

/** What is to be sent, in order. */
export function readPosts(db: Kysely<Tables>, channel: string): Promise<Post[]> {
  const query = db.selectFrom('post').select(['id', 'channel', 'chat', 'body', 'at']);
  return query.where('channel', '=', channel).orderBy('place').execute();
}

/** Forgets posts. */
export async function dropPosts(db: Kysely<Tables>, channel: string, ids: readonly string[]): Promise<void> {
  for (const part of inParts(ids)) await drop(db, { channel, ids: part });
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
