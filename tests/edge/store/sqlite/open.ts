import type { CellarStore } from '../../../../src/core/cellar/cellar-store.ts';
import { openSqliteStore } from '../../../../src/edge/store/sqlite/open-sqlite-store.ts';

/** Opens a store whose clock stands still and whose file must be sound. */
export const open = (path: string): Promise<CellarStore> =>
  openSqliteStore(path, {
    now: () => 0,
    report: (damage) => {
      throw damage;
    },
  });
