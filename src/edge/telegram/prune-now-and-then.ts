import type { Mailbox } from '../../core/cellar/mailbox.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { CHANNEL } from './channel.ts';

/** What pruning needs. */
export interface PruneOptions {
  readonly store: Pick<Mailbox, 'prune'>;
  readonly clock: Clock;
  readonly log: Pick<Log, 'error'>;
  readonly signal: AbortSignal;
}

const HOUR_MS = 60 * 60 * 1000;
/** The platform delivers again what is a day old at most. */
const KNOWN_FOR_MS = 48 * HOUR_MS;
/** Somebody should look at what was put aside within a month. */
const ASIDE_FOR_MS = 30 * 24 * HOUR_MS;
const WAIT_MS = HOUR_MS;
/** Few at a time: everybody waits meanwhile. */
const MOST_AT_ONCE = 500;
const PAUSE_MS = 100;

/**
 * Forgets what was handled long ago, now and every hour until the signal is aborted. Never rejects. The numbers of
 * updates begin anew after a quiet week: by then none of the old ones is known.
 */
export async function pruneNowAndThen({ store, clock, log, signal }: PruneOptions): Promise<void> {
  while (!signal.aborted) {
    let gone = 0;
    try {
      const [handled_at, aside_at] = [clock.now() - KNOWN_FOR_MS, clock.now() - ASIDE_FOR_MS];
      gone = await store.prune(CHANNEL, { handled_at, aside_at, most: MOST_AT_ONCE });
    } catch (err) {
      log.error({ err }, 'what was handled long ago could not be forgotten');
    }
    await clock.wait(gone >= MOST_AT_ONCE ? PAUSE_MS : WAIT_MS, signal);
  }
}
