import { join } from 'node:path';
import { DatabaseSync } from 'node:sqlite';
import { expect, test } from 'vitest';
import { openSqliteStore } from '../../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { write } from '../../../contracts/cellar-store/notes.ts';
import { temporaryFolder } from './temporary-folder.ts';

test('what has lapsed goes from the file when the next thing that will lapse is kept', async () => {
  const path = join(temporaryFolder(), 'cellar.db');
  let now = 0;
  const store = await openSqliteStore(path, { now: () => now, report: () => undefined });
  const keep = (key: string, until?: number) =>
    write(store, { kind: 'keep', key, text: 'text', ...(until === undefined ? {} : { until }) });
  await keep('for ever');
  await keep('claim 1', 10);
  await keep('claim 2', 20);
  now = 10;
  await keep('claim 3', 30);
  const file = new DatabaseSync(path, { readOnly: true });
  expect(
    file
      .prepare('select key from kept order by key')
      .all()
      .map((row) => row['key']),
  ).toEqual(['claim 2', 'claim 3', 'for ever']);
  file.close();
  await store.close();
});
