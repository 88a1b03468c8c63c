import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import type { Clock } from '../clock.ts';
import { clientSignal, type Platform } from './platform.ts';

/** What is looked at. */
export interface TroubleOptions {
  readonly store: Pick<CellarStore, 'nextDue'>;
  readonly platform: Platform;
  readonly clock: Clock;
}

/** Whoever asks often gets an answer of so long ago: the platform counts calls. */
const KNOWN_FOR_MS = 10_000;
const LONGEST_CALL_MS = 3000;

/** Makes what names the things that cannot be reached, none where the work can be done. Never rejects. */
export function makeFindTroubles({ store, platform, clock }: TroubleOptions): () => Promise<string[]> {
  let reached_at = -Infinity;
  const isReached = async (): Promise<boolean> => {
    if (clock.now() < reached_at + KNOWN_FOR_MS) return true;
    await platform.calls.getMe(clientSignal(AbortSignal.timeout(LONGEST_CALL_MS)));
    reached_at = clock.now();
    return true;
  };
  const isRead = async (): Promise<boolean> => {
    await store.nextDue();
    return true;
  };
  return async () => {
    const [read, reached] = await Promise.allSettled([isRead(), isReached()]);
    return [
      ...(read.status === 'fulfilled' ? [] : ['store']),
      ...(reached.status === 'fulfilled' ? [] : ['platform']),
    ];
  };
}
