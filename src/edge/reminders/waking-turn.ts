import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import type { WakeUp } from './wake-up.ts';

/** Does turns as the store does, and wakes whoever waits for the next due thing where a turn wrote one. */
export function wakingTurn(
  store: Pick<CellarStore, 'turn'>,
  wakeUp: Pick<WakeUp, 'wake'>,
): CellarStore['turn'] {
  return async (cellar, work) => {
    let wrote = false;
    const result = await store.turn(cellar, async (view) => {
      const turned = await work(view);
      wrote = turned.writes.some(({ kind }) => kind === 'due');
      return turned;
    });
    if (wrote) wakeUp.wake();
    return result;
  };
}
