import type { CellarStore, TakenDue } from '../../core/cellar/cellar-store.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { createRetries } from './retries.ts';
import type { WakeUp } from './wake-up.ts';

/** What reminding needs. */
export interface RemindersOptions {
  readonly store: Pick<CellarStore, 'nextDue' | 'takeDue'>;
  /**
   * Says one due thing. It does so in a turn of its cellar that looks whether the thing is still due, and writes that
   * it was said together with whatever has to be sent; or that it is due later. Where it rejects, it is tried again.
   */
  readonly say: (due: TakenDue) => Promise<void>;
  readonly clock: Clock;
  readonly log: Pick<Log, 'error' | 'warn'>;
  /** Woken when a new due thing was written. */
  readonly wakeUp: WakeUp;
  /** Ends the reminding. */
  readonly signal: AbortSignal;
  /** The longest wait, in milliseconds: so soon it is noticed that the clock was set, or that the machine slept. */
  readonly longest_wait_ms?: number;
}

/** Nobody else gets what was taken within this time, and after a crash it is tried again when it is over. */
const LEASE_MS = 60_000;
const LONGEST_WAIT_MS = 60_000;
const NOT_HANDED_OUT_MS = 1000;
/** So many are said side by side: one that hangs holds nobody up. */
const MOST_AT_ONCE = 50;
/** Waits after the store has failed, in milliseconds. */
const STORE_WAITS_MS = [1000, 2000, 5000, 15_000, 60_000] as const;
/** At a stop, what is being said has so long to end. */
const FAREWELL_MS = 10_000;

/**
 * Hands out what falls due, each thing at its time, until the signal is aborted; resolves when what was being said has
 * ended. Never rejects: what fails is logged and tried again, later each time, and holds nothing else up.
 */
export async function runReminders(options: RemindersOptions): Promise<void> {
  const { store, clock, log, wakeUp, signal, longest_wait_ms = LONGEST_WAIT_MS } = options;
  const saying = new Map<string, Promise<void>>();
  const start = makeStart(saying, options);
  let failures = 0;
  while (!signal.aborted) {
    try {
      // What is being said now may be handed out again when its lease runs out, and may end before that is seen here.
      const busy = new Set(saying.keys());
      const now = clock.now();
      const most = MOST_AT_ONCE - busy.size;
      const taken = most > 0 ? await store.takeDue(now, { lease_ms: LEASE_MS, most }) : [];
      if (signal.aborted) break;
      for (const due of taken) if (!busy.has(keyOf(due))) start(due, now);
      if (taken.length > 0) continue;
      const next = (await store.nextDue()) ?? Infinity;
      failures = 0;
      // Where nothing is handed out although it is due, it will not be in the same instant either.
      const wait_ms = next > clock.now() ? next - clock.now() : NOT_HANDED_OUT_MS;
      await wakeUp.wait(Math.min(wait_ms, longest_wait_ms), { clock, signal });
    } catch (error) {
      log.error({ err: error }, 'what is due could not be read');
      await clock.wait(STORE_WAITS_MS[failures] ?? LONGEST_WAIT_MS, signal);
      failures += 1;
    }
  }
  if (saying.size === 0) return;
  const ended = new AbortController();
  void Promise.all(saying.values()).then(() => ended.abort());
  await clock.wait(FAREWELL_MS, ended.signal);
  if (saying.size > 0) log.warn({ due: [...saying.keys()] }, 'not all that was being said has ended');
}

/** Makes what says a due thing without being waited for. */
function makeStart(
  saying: Map<string, Promise<void>>,
  { say, log, wakeUp }: RemindersOptions,
): (due: TakenDue, now: number) => void {
  const retries = createRetries();
  const sayOnce = async (due: TakenDue, now: number): Promise<void> => {
    const key = keyOf(due);
    try {
      // In a later turn, so that whatever it does is done after it is known to be in hand.
      await Promise.resolve();
      await say(due);
      retries.succeeded(key);
    } catch (error) {
      retries.failed(key, now);
      // Without what it is about: that may hold a person's words.
      log.error({ err: error, cellar: due.cellar, due: due.id }, 'what is due could not be said');
    } finally {
      saying.delete(key);
      wakeUp.wake();
    }
  };
  return (due, now) => {
    const key = keyOf(due);
    if (retries.mayTry(key, now)) saying.set(key, sayOnce(due, now));
  };
}

const keyOf = ({ cellar, id }: TakenDue): string => JSON.stringify([cellar, id]);
