import type { CellarStore, TakenDue } from '../../../src/core/cellar/cellar-store.ts';
import { runReminders } from '../../../src/edge/reminders/run-reminders.ts';
import { createWakeUp } from '../../../src/edge/reminders/wake-up.ts';
import { wakingTurn } from '../../../src/edge/reminders/waking-turn.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { createFlyingClock } from './flying-clock.ts';

/** When the clock begins. */
export const START = Date.parse('2026-11-12T08:00Z');

/** Reminding under way: `said` holds what was said, with the seconds after the start. */
export function reminding(
  says: (due: TakenDue) => Promise<void> | void = () => {},
  around: (store: CellarStore) => Partial<CellarStore> = () => ({}),
) {
  const clock = createFlyingClock(START);
  const cellar = createMemoryCellars({ now: clock.now });
  const wakeUp = createWakeUp();
  const turn = wakingTurn(cellar, wakeUp);
  const tries: string[] = [];
  const said: string[] = [];
  const logged: string[] = [];
  const seconds = (): number => (clock.now() - START) / 1000;
  const note = (data: { err?: unknown }, sentence: string): void =>
    void logged.push(`${sentence}: ${String((data.err as Error | undefined)?.message)}`);
  const say = async (due: TakenDue): Promise<void> => {
    tries.push(`${due.id} ${seconds()}`);
    await says(due);
    await turn(due.cellar, async () => ({ writes: [{ kind: 'said', id: due.id }], result: undefined }));
    said.push(`${due.id} ${seconds()}`);
  };
  const controller = new AbortController();
  const log = { error: note, warn: note } as unknown as Parameters<typeof runReminders>[0]['log'];
  const store = { ...cellar, ...around(cellar) };
  const running = runReminders({ store, say, clock, log, wakeUp, signal: controller.signal });
  const plan = (id: string, after_s: number): Promise<void> =>
    turn('c', async () => ({
      writes: [{ kind: 'due', due: { id, chat: 'one', at: START + 1000 * after_s, about: '{}' } }],
      result: undefined,
    }));
  const fly = (to_s: number): Promise<void> => clock.flyTo(START + 1000 * to_s);
  return { clock, plan, fly, tries, said, logged, running, stop: () => controller.abort() };
}
