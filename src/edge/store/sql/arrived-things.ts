import type { Kysely } from 'kysely';
import type { Write } from '../../../core/cellar/cellar-store.ts';
import type { Arrived, Mailbox, Waiting } from '../../../core/cellar/mailbox.ts';
import { inParts } from './in-parts.ts';
import { readyQuery } from './ready-query.ts';
import type { ArrivedRow, Tables } from './tables.ts';

const keep = readyQuery((db, row: ArrivedRow) =>
  db
    .insertInto('arrived')
    .values(row)
    .onConflict((on) => on.doNothing()),
);

/** Keeps what arrived; gives back what was not known. */
export async function keepArrived(db: Kysely<Tables>, arrived: readonly Arrived[]): Promise<Arrived[]> {
  const fresh: Arrived[] = [];
  for (const one of arrived) {
    const { channel, number, body, received_at } = one;
    const row = { channel, number, body, received_at, tries: 0, handled_at: null, cause: null };
    if ((await keep(db, row)).numAffectedRows === 1n) fresh.push(one);
  }
  return fresh;
}

/** What waits to be handled, the lowest number first. */
export async function readWaiting(db: Kysely<Tables>, channel: string): Promise<Waiting[]> {
  const query = db
    .selectFrom('arrived')
    .select(['channel', 'number', 'body', 'received_at', 'tries'])
    .where('channel', '=', channel);
  return query.where('handled_at', 'is', null).orderBy('number').execute();
}

/** Counts a try of each. */
export async function countTries(
  db: Kysely<Tables>,
  channel: string,
  numbers: readonly number[],
): Promise<void> {
  for (const part of inParts(numbers))
    await db
      .updateTable('arrived')
      .set((eb) => ({ tries: eb('tries', '+', 1) }))
      .where('channel', '=', channel)
      .where('number', 'in', part)
      .execute();
}

/** Absent: stays as it is. */
type End = {
  readonly channel: string;
  readonly number: number;
  readonly now: number;
  readonly body: string | undefined;
  readonly cause: string | undefined;
};

const end = readyQuery((db, { channel, number, now, body, cause }: End) =>
  db
    .updateTable('arrived')
    .set({ handled_at: now, ...(body !== undefined && { body }), ...(cause !== undefined && { cause }) })
    .where('channel', '=', channel)
    .where('number', '=', number)
    .where('handled_at', 'is', null),
);

/**
 * What arrived is handled; what it said goes, unless it is put aside.
 *
 * @throws RangeError where it does not wait
 */
export async function markHandled(
  db: Kysely<Tables>,
  { channel, number, cause }: Extract<Write, { kind: 'handled' }>,
  now: number,
): Promise<void> {
  const body = cause === undefined ? '' : undefined;
  const { numAffectedRows } = await end(db, { channel, number, now, body, cause });
  if (numAffectedRows !== 1n) throw new RangeError(`${channel} ${number} does not wait to be handled`);
}

/** Forgets what was handled or put aside long ago, the oldest first. */
export async function pruneArrived(
  db: Kysely<Tables>,
  channel: string,
  { handled_at, aside_at, most }: Parameters<Mailbox['prune']>[1],
): Promise<number> {
  let gone = 0;
  for (const [before, isAside] of [
    [handled_at, false],
    [aside_at, true],
  ] as const) {
    const old = db
      .selectFrom('arrived')
      .select('number')
      .where('channel', '=', channel)
      .where('handled_at', '<', before)
      .where('cause', isAside ? 'is not' : 'is', null);
    const numbers = (await old.orderBy('handled_at').limit(most).execute()).map(({ number }) => number);
    for (const part of inParts(numbers))
      await db.deleteFrom('arrived').where('channel', '=', channel).where('number', 'in', part).execute();
    gone += numbers.length;
  }
  return gone;
}
