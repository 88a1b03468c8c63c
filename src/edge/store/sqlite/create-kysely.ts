import type { DatabaseSync, SQLInputValue, StatementSync } from 'node:sqlite';
import { Kysely, SqliteAdapter, SqliteDialect, type SqliteDatabase, type SqliteStatement } from 'kysely';
import type { Tables } from '../sql/tables.ts';
import { callSqlite } from './sqlite-fault.ts';

/** Statements that are kept ready; far more than there are queries, save for lists of changing length. */
const MOST_STATEMENTS = 300;

/** Kysely on a connection of `node:sqlite`, which stays its maker's to close. */
export function createKysely(connection: DatabaseSync): Kysely<Tables> {
  return new Kysely({ dialect: new Dialect({ database: asKyselyWants(connection) }) });
}

/**
 * Statements run to their end when they are called, and what belongs together takes turns by itself (`group-commit.ts`):
 * a query need not wait for the ones that were asked before it.
 */
class Dialect extends SqliteDialect {
  override createAdapter(): SqliteAdapter {
    return Object.defineProperty(new SqliteAdapter(), 'supportsMultipleConnections', { value: true });
  }
}

function asKyselyWants(connection: DatabaseSync): SqliteDatabase {
  const ready = new Map<string, SqliteStatement>();
  return {
    prepare: (sql) => {
      const known = ready.get(sql);
      if (known !== undefined) return known;
      if (ready.size >= MOST_STATEMENTS) ready.clear();
      const made = statement(callSqlite(() => connection.prepare(sql)));
      ready.set(sql, made);
      return made;
    },
    close: () => undefined,
  };
}

function statement(made: StatementSync): SqliteStatement {
  return {
    reader: made.columns().length > 0,
    all: (values) => callSqlite(() => made.all(...values.map(bindable))),
    run: (values) => callSqlite(() => made.run(...values.map(bindable))),
    iterate: (values) => made.iterate(...values.map(bindable)),
  };
}

/** `node:sqlite` takes an object for a list of named values and a NaN for NULL: neither may pass in silence. */
function bindable(value: unknown): SQLInputValue {
  if (value === null || typeof value === 'string' || typeof value === 'bigint') return value;
  if (typeof value === 'number' && Number.isFinite(value)) return value;
  throw new TypeError(`no value for the database: ${typeof value}`);
}
