import type { CellarStore, CellarView, Due, TakenDue } from '../../../src/core/cellar/cellar-store.ts';

/** As much of a store as reminding needs: one cellar, due things with leases, and nothing else. */
export type SmallCellar = Pick<CellarStore, 'turn' | 'nextDue' | 'takeDue'>;

interface Row {
  due: Due;
  open_at: number;
  leased_until: number;
  said: boolean;
}

/** Makes an empty one. */
export function createSmallCellar(): SmallCellar {
  const rows = new Map<string, Row>();
  const open = (): Row[] => [...rows.values()].filter(({ said }) => !said);
  const view = {
    due: async (id: string) => open().find(({ due }) => due.id === id)?.due,
    allDue: async () => open().map(({ due }) => due),
  } as Partial<CellarView> as CellarView;
  return {
    turn: async (_cellar, work) => {
      const { writes, result } = await work(view);
      for (const write of writes) {
        if (write.kind === 'said') {
          const row = rows.get(write.id);
          if (row !== undefined) row.said = true;
        }
        if (write.kind !== 'due') continue;
        const { leased_until, said } = rows.get(write.due.id) ?? { leased_until: 0, said: false };
        const open_at = Math.max(write.due.at, leased_until);
        rows.set(write.due.id, { due: write.due, open_at, leased_until, said });
      }
      return result;
    },
    nextDue: async () => {
      const times = open().map(({ open_at }) => open_at);
      return times.length === 0 ? undefined : Math.min(...times);
    },
    takeDue: async (now, { lease_ms, most }) => {
      const taken = open()
        .filter(({ open_at }) => open_at <= now)
        .toSorted((a, b) => a.open_at - b.open_at)
        .slice(0, most);
      for (const row of taken) row.open_at = row.leased_until = now + lease_ms;
      return taken.map(({ due }): TakenDue => ({ ...due, cellar: 'c' }));
    },
  };
}
