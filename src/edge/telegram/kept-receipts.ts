import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import { CHATS } from '../cellars/registry.ts';
import type { Clock } from '../clock.ts';
import type { Receipt } from './receipts.ts';

const KEY = 'telegram receipts';

/** Nobody asks for one that is older. */
const KEPT_ms = 24 * 60 * 60 * 1000;

/** The receipts that an earlier process has left at its stop. */
export async function readReceipts(store: Pick<CellarStore, 'look'>): Promise<readonly Receipt[]> {
  const text = await store.look(CHATS, (view) => view.kept(KEY));
  return text === undefined ? [] : (JSON.parse(text) as Receipt[]);
}

/** Leaves receipts for the next process. At a stop, so that no answer pays for it. */
export async function keepReceipts(
  receipts: readonly Receipt[],
  { store, clock }: { readonly store: Pick<CellarStore, 'turn'>; readonly clock: Pick<Clock, 'now'> },
): Promise<void> {
  if (receipts.length === 0) return;
  const text = JSON.stringify(receipts);
  const until = clock.now() + KEPT_ms;
  await store.turn(CHATS, async () => ({
    writes: [{ kind: 'keep', key: KEY, text, until }],
    result: undefined,
  }));
}
