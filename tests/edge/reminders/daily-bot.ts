import type { TakenDue, Write } from '../../../src/core/cellar/cellar-store.ts';
import { dailyTurn } from '../../../src/core/time/daily-turn.ts';
import { isoWithZone } from '../../../src/core/time/iso-with-zone.ts';
import { nextDaily, type DailyHours } from '../../../src/core/time/next-daily.ts';
import { runReminders } from '../../../src/edge/reminders/run-reminders.ts';
import { createWakeUp } from '../../../src/edge/reminders/wake-up.ts';
import { wakingTurn } from '../../../src/edge/reminders/waking-turn.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import type { FlyingClock } from './flying-clock.ts';

/** A bot that sends one chat its daily list, and can be stopped, killed and started again on the same store. */
export interface DailyBot {
  start(): void;
  /** Ends as it should: what is being said is said. */
  stop(): Promise<void>;
  /** Ends like a process that is killed: nothing more is written. */
  kill(): void;
  /** When a list went out, by the clock of the zone. */
  readonly sent: readonly string[];
}

const SAYING_MS = 3000;

/** Makes one; `fails` tells of each attempt to say something whether it goes wrong. */
export async function createDailyBot(
  clock: FlyingClock,
  {
    hours,
    fails = () => false,
    longest_wait_ms,
  }: { readonly hours: DailyHours; readonly fails?: () => boolean; readonly longest_wait_ms?: number },
): Promise<DailyBot> {
  const store = createMemoryCellars({ now: clock.now });
  const sent: string[] = [];
  const daily = (at: number): Write => {
    const id = `daily ${isoWithZone(at, hours.zone).slice(0, 10)}`;
    return { kind: 'due', due: { id, chat: 'one', at, about: '{}' } };
  };
  await store.turn('c', async () => ({ writes: [daily(nextDaily(clock.now(), hours))], result: undefined }));

  let kill = (): void => {};
  let stop = async (): Promise<void> => {};
  const start = (): void => {
    let alive = true;
    const controller = new AbortController();
    const wakeUp = createWakeUp();
    const turn = wakingTurn(store, wakeUp);
    const say = async (due: TakenDue): Promise<void> => {
      await clock.wait(SAYING_MS);
      if (!alive) return new Promise(() => {});
      if (fails()) throw new Error('planted');
      await turn(due.cellar, async (view) => {
        if ((await view.due(due.id)) === undefined) return { writes: [], result: undefined };
        const { is, next } = dailyTurn(clock.now(), hours);
        // The list itself would be written here, to be sent after.
        if (is === 'now') sent.push(isoWithZone(clock.now(), hours.zone));
        return { writes: [{ kind: 'said', id: due.id }, daily(next)], result: undefined };
      });
    };
    const log = { error: () => {}, warn: () => {} };
    const times = longest_wait_ms === undefined ? {} : { longest_wait_ms };
    const running = runReminders({ store, say, clock, log, wakeUp, signal: controller.signal, ...times });
    stop = () => {
      controller.abort();
      return running;
    };
    kill = () => {
      alive = false;
      controller.abort();
    };
  };
  return { start, stop: () => stop(), kill: () => kill(), sent };
}
