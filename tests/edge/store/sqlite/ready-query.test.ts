import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { readyQuery } from '../../../../src/edge/store/sql/ready-query.ts';
import { createKysely } from '../../../../src/edge/store/sqlite/create-kysely.ts';
import { migrate } from '../../../../src/edge/store/sqlite/migrate.ts';

function openKept() {
  const connection = new DatabaseSync(':memory:');
  migrate(connection, 0);
  const db = createKysely(connection);
  let built = 0;
  const ask = readyQuery(
    (on, { keys, until, cellar }: { keys: readonly string[]; until: number | undefined; cellar: string }) => {
      built += 1;
      return on
        .selectFrom('kept')
        .select('text')
        .where('cellar', '=', cellar)
        .where('key', 'in', keys)
        .$if(until !== undefined, (query) => query.where('until', '<', until ?? 0))
        .orderBy('key');
    },
  );
  connection.exec(
    "insert into kept values ('c', 'a', 'one', 1), ('c', 'b', 'two', 2), ('d', 'a', 'three', 3)",
  );
  const texts = async (cellar: string, keys: readonly string[], until?: number) =>
    (await ask(db, { cellar, keys, until })).rows.map(({ text }) => text);
  return { texts, builtSoFar: () => built };
}

test('a query is built once, and gives what each asking asks for, whatever the order of its values', async () => {
  const { texts, builtSoFar } = openKept();
  expect(await texts('c', ['a', 'b'])).toEqual(['one', 'two']);
  expect(await texts('c', ['b', 'x'])).toEqual(['two']);
  expect(await texts('d', ['a', 'b'])).toEqual(['three']);
  expect(builtSoFar()).toBe(1);
});

test('a list of another length and a value that is absent make another query of it', async () => {
  const { texts, builtSoFar } = openKept();
  expect(await texts('c', ['a'])).toEqual(['one']);
  expect(await texts('c', ['a', 'b'], 2)).toEqual(['one']);
  expect(await texts('c', ['a', 'b'])).toEqual(['one', 'two']);
  expect(await texts('c', ['b', 'a'], 9)).toEqual(['one', 'two']);
  expect(builtSoFar()).toBe(3);
});
