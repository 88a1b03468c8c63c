import type { Addition } from '../../../core/cellar/entry.ts';
import { doseOf } from '../dose-of.ts';
import type { Here } from '../here.ts';
import { buttonKey } from '../keys.ts';
import type { Remembered } from '../memory.ts';
import { toBeWeighed } from '../to-be-weighed.ts';
import { vesselsIn } from '../vessels-named.ts';

/** An addition that a button stands for, and the key that it is noted under, once. */
export interface KeyedAddition {
  readonly addition: Addition;
  readonly key: string;
}

/**
 * The dose of a reading as additions, one for each of its vessels, so that one of them can be struck alone; reckoned again,
 * which always comes out alike. None where the dose has no one amount.
 */
export function doseAdditions({ reading, chat, ref }: Remembered, here: Here): KeyedAddition[] {
  const vessels = vesselsIn(reading.fields);
  if (vessels.length === 0 || reading.intent !== 'dose') return [];
  const weighed = toBeWeighed(reading, doseOf(reading, here.settings), 'each');
  if (weighed === undefined) return [];
  const [, another] = vessels;
  return vessels.map((vessel) => {
    const [order] = here.vessels.get(vessel)?.orders ?? [];
    const isOrdered = order !== undefined && order.additive === weighed.additive;
    return {
      addition: {
        kind: 'addition',
        vessels: [vessel],
        ...weighed,
        ...(reading.over_rule !== undefined && { over_rule: reading.over_rule }),
        ...(isOrdered && { order: order.entry }),
      },
      key: buttonKey('dose', chat, ref, another === undefined ? undefined : vessel),
    };
  });
}
