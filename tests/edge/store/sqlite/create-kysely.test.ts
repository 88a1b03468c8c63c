import { DatabaseSync } from 'node:sqlite';
import { sql } from 'kysely';
import { expect, test } from 'vitest';
import { createKysely } from '../../../../src/edge/store/sqlite/create-kysely.ts';

test.each([new Date(0), { a: 1 }, [1], undefined, true, Number.NaN, Infinity])(
  'the value %s is refused and not kept as something else',
  async (value) => {
    const connection = new DatabaseSync(':memory:');
    await expect(sql`select ${value} as value`.execute(createKysely(connection))).rejects.toThrow(TypeError);
    connection.close();
  },
);

test.each([0, -1.5, 2 ** 53 - 1, '', "it's", null])('the value %s comes back as it was', async (value) => {
  const connection = new DatabaseSync(':memory:');
  const { rows } = await sql`select ${value} as value`.execute(createKysely(connection));
  expect(rows).toEqual([{ value }]);
  connection.close();
});
