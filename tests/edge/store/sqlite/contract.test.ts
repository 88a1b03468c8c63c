import { join } from 'node:path';
import { openSqliteStore } from '../../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { testCellarStore } from '../../../contracts/cellar-store.ts';
import type { CreateStore } from '../../../contracts/cellar-store/notes.ts';
import { temporaryFolder } from './temporary-folder.ts';

let files = 0;

const create: CreateStore = async (now) => {
  files += 1;
  const path = join(temporaryFolder(), `cellar-${files}.db`);
  const report = (damage: Error): never => {
    throw damage;
  };
  return openSqliteStore(path, { now, report });
};

// The memory store, which derives vessels by the same steps, runs many more.
testCellarStore('a file of SQLite', create, { anyLogs: 12 });
