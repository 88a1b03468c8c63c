import { DatabaseSync, type StatementSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import type { Write } from '../../../../src/core/cellar/cellar-store.ts';
import { leaseDue, readNextDue, readOpenDue } from '../../../../src/edge/store/sql/due-things.ts';
import { createSqlLedger } from '../../../../src/edge/store/sql/sql-ledger.ts';
import { createSqlMailbox } from '../../../../src/edge/store/sql/sql-mailbox.ts';
import { createSqlView } from '../../../../src/edge/store/sql/sql-view.ts';
import { writeSet } from '../../../../src/edge/store/sql/write-set.ts';
import { createKysely } from '../../../../src/edge/store/sqlite/create-kysely.ts';
import { migrate } from '../../../../src/edge/store/sqlite/migrate.ts';
import { note, strike, writeOf } from '../../../contracts/cellar-store/notes.ts';

/** Without bounds, or sorted when it is found: what such a query costs grows with the table. */
const GROWS = /^(SCAN (?!found$|\d+-ROW VALUES)|USE TEMP B-TREE|.*AUTOMATIC)/;

/** A connection that also asks for the plan of each query that comes by. */
function watched(): { connection: DatabaseSync; plans: Map<string, string[]> } {
  const connection = new DatabaseSync(':memory:');
  migrate(connection, 0);
  const plans = new Map<string, string[]>();
  const prepare = (sql: string): StatementSync => {
    const rows = connection.prepare(`explain query plan ${sql}`).all();
    plans.set(
      sql,
      rows.map((row) => String(row['detail'])),
    );
    return connection.prepare(sql);
  };
  return { connection: { prepare } as DatabaseSync, plans };
}

/** Everything that views, turns and due things ask. */
async function askAll(connection: DatabaseSync): Promise<void> {
  const db = createKysely(connection);
  const view = createSqlView(db, { cellar: 'cellar 1', now: () => 0 });
  const ledger = createSqlLedger(db, 'cellar 1');
  const place = { vessel: 'tank 4', at: 1, entry: 1 };
  const due = { id: 'a', chat: 'c', at: 1, about: '' };
  const writes: Write[] = [
    ...[note(10, { vessels: ['tank 4', 'tank 9'] }), note(5), note(6), strike(20, 2)].map(writeOf),
    { kind: 'keep', key: 'k', text: 't', until: 5 },
    { kind: 'drop', key: 'k' },
    { kind: 'person', id: 'id', number: 1 },
    { kind: 'forget-person', number: 1 },
    { kind: 'due', due },
    { kind: 'said', id: 'a' },
    { kind: 'post', post: { id: 'a', channel: 'c', chat: '1', body: '{}', at: 1 } },
    { kind: 'handled', channel: 'c', number: 1 },
  ];
  const mailbox = createSqlMailbox(db, (work) => work());
  await mailbox.receive([{ channel: 'c', number: 1, body: '{}', received_at: 1 }]);
  await writeSet(db, writes, { cellar: 'cellar 1', now: 0 });
  await Promise.all([view.nextEntry(), view.entry(1), view.entryOfKey('k'), view.entriesOfKeys('k')]);
  for (const vessel of [{}, { vessel: 'tank 4' }])
    for (const times of [{}, { from: 1 }, { to: 9 }, { from: 1, to: 9 }])
      for (const last of [{}, { last: 5 }]) await view.entries({ ...vessel, ...times, ...last });
  await Promise.all([
    view.lastEntryBy(1),
    view.vessel('tank 4'),
    view.vessels(),
    view.person('id'),
    view.people(),
  ]);
  await view.shelves();
  await ledger.saveShelves(new Map([['powder', undefined]]));
  await ledger.movesOf('potassium-metabisulfite', place);
  await Promise.all([view.kept('k'), view.keptUnder('k'), view.keptUnder(''), view.due('a'), view.allDue()]);
  await Promise.all([
    readNextDue(db),
    readOpenDue(db, 5, 5),
    leaseDue(db, { ...due, cellar: 'cellar 1' }, 5),
  ]);
  await Promise.all([mailbox.waiting('c'), mailbox.countTry('c', [1]), mailbox.readdress('c', ['a'], '2')]);
  await Promise.all([
    mailbox.settle('c', ['a']),
    mailbox.prune('c', { handled_at: 5, aside_at: 5, most: 5 }),
  ]);
  await ledger.countedOf('tank 4', { from: place, before: place });
  await Promise.all([
    ledger.counted(place, 5),
    ledger.counted(undefined, 5),
    ledger.lastWaypoint('tank 4', place),
  ]);
  await Promise.all([ledger.waypoint(place), ledger.dropWaypoints([place]), ledger.allStandings()]);
}

test('no query reads more of a table than it gives back, so that a long log is as quick as a short one', async () => {
  const { connection, plans } = watched();
  await askAll(connection);
  expect(plans.size).toBeGreaterThan(40);
  const growing = [...plans].filter(([, plan]) => plan.some((line) => GROWS.test(line)));
  // The next due thing is the first of an index of nothing but what is to be said.
  const isNextDue = ([sql]: [string, string[]]): boolean => sql.includes('order by "open_at" limit');
  expect(growing.filter((one) => !isNextDue(one))).toEqual([]);
  expect(growing.filter(isNextDue).map(([, plan]) => plan)).toEqual([
    ['SCAN due USING COVERING INDEX due_by_opening'],
  ]);
});

test('the last entry of a person is found by the person, not among those of all others', async () => {
  const { connection, plans } = watched();
  await createSqlView(createKysely(connection), { cellar: 'cellar 1', now: () => 0 }).lastEntryBy(1);
  expect([...plans.values()][0]?.[0]).toBe(
    'SEARCH entry USING INDEX entry_by_person (cellar=? AND person=?)',
  );
});
