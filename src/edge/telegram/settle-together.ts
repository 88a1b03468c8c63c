import type { Clock } from '../clock.ts';

/** Forgets posts that were sent; resolves when that is durable. At once, with all that wait, where somebody waits for it. */
export type Settle = (ids: readonly string[], isAwaited: boolean) => Promise<void>;

/** So long a post that nobody waits for may wait for others, in milliseconds: a commit costs as much for many as for one. */
const TOGETHER_MS = 10;

/** Makes what forgets posts together. */
export function makeSettleTogether(
  settle: (ids: readonly string[]) => Promise<void>,
  clock: Pick<Clock, 'wait'>,
): Settle {
  let open: { readonly ids: string[]; readonly haste: AbortController; done: Promise<void> } | undefined;
  const begin = (): NonNullable<typeof open> => {
    const haste = new AbortController();
    const ids: string[] = [];
    const done = clock.wait(TOGETHER_MS, haste.signal).then(() => {
      open = undefined;
      return settle(ids);
    });
    return { ids, haste, done };
  };
  return (ids, isAwaited) => {
    open ??= begin();
    open.ids.push(...ids);
    if (isAwaited) open.haste.abort();
    return open.done;
  };
}
