import { sql, type Kysely } from 'kysely';
import type { Due, TakenDue } from '../../../core/cellar/cellar-store.ts';
import type { Tables } from './tables.ts';

/** A literal: an index of some rows serves only a query that says so itself. */
const UNSAID = sql.lit(0);

const COLUMNS = ['id', 'chat', 'at', 'about'] as const;

/** What is still to be said under that id. */
export function readDue(db: Kysely<Tables>, cellar: string, id: string): Promise<Due | undefined> {
  const query = db.selectFrom('due').select(COLUMNS).where('cellar', '=', cellar).where('id', '=', id);
  return query.where('said', '=', UNSAID).executeTakeFirst();
}

/** What is still to be said in a cellar, the earliest first. */
export function readAllDue(db: Kysely<Tables>, cellar: string): Promise<Due[]> {
  const query = db.selectFrom('due').select(COLUMNS).where('cellar', '=', cellar).where('said', '=', UNSAID);
  return query.orderBy('at').orderBy('id').execute();
}

/** When the next thing of any cellar can be handed out. */
export async function readNextDue(db: Kysely<Tables>): Promise<number | undefined> {
  const query = db.selectFrom('due').select('open_at').where('said', '=', UNSAID);
  return (await query.orderBy('open_at').limit(1).executeTakeFirst())?.open_at;
}

/** What can be handed out by `now` in all cellars, the earliest first. */
export function readOpenDue(db: Kysely<Tables>, now: number, most: number): Promise<TakenDue[]> {
  const query = db.selectFrom('due').select(['cellar', ...COLUMNS]);
  const open = query.where('said', '=', UNSAID).where('open_at', '<=', now);
  return open.orderBy('open_at').orderBy('cellar').orderBy('id').limit(most).execute();
}

/** Keeps what is to be said. Where it was said already nothing changes; a lease that runs goes on. */
export async function keepDue(db: Kysely<Tables>, cellar: string, due: Due): Promise<void> {
  const { id, chat, at, about } = due;
  await db
    .insertInto('due')
    .values({ cellar, id, chat, at, about, leased_until: 0, open_at: at, said: 0 })
    .onConflict((on) =>
      on
        .columns(['cellar', 'id'])
        .doUpdateSet((eb) => ({
          chat: eb.ref('excluded.chat'),
          at: eb.ref('excluded.at'),
          about: eb.ref('excluded.about'),
          open_at: eb
            .case()
            .when('excluded.at', '>', eb.ref('due.leased_until'))
            .then(eb.ref('excluded.at'))
            .else(eb.ref('due.leased_until'))
            .end(),
        }))
        .where('due.said', '=', UNSAID),
    )
    .execute();
}

/** Gives a due thing to whoever took it, until then. */
export async function leaseDue(db: Kysely<Tables>, { cellar, id }: TakenDue, until: number): Promise<void> {
  const update = db.updateTable('due').set({ leased_until: until, open_at: until });
  await update.where('cellar', '=', cellar).where('id', '=', id).execute();
}

/** It was said, or need not be: it stays known, so that it is never said again; what it was about goes. */
export async function markSaid(db: Kysely<Tables>, cellar: string, id: string): Promise<void> {
  const update = db.updateTable('due').set({ said: 1, about: '' });
  await update.where('cellar', '=', cellar).where('id', '=', id).execute();
}
