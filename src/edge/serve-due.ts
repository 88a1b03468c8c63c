import type { CellarStore, TakenDue, Write } from '../core/cellar/cellar-store.ts';
import { handleDue } from '../chat/conversation/handle-due.ts';
import type { Settings } from '../chat/conversation/settings.ts';
import type { Said, Say } from '../chat/replies/say.ts';

/** What serving a due thing needs: the words, and the store. */
export interface ServingDue {
  readonly say: Say;
  readonly store: Pick<CellarStore, 'turn'>;
  readonly settings: Settings;
}

/** What is to be sent to a chat unasked. */
export interface Unasked {
  readonly chat: string;
  readonly said: readonly Said[];
}

/**
 * Serves a due thing: what is to be sent, once what it wrote is durable. `also` gives what the turn writes besides.
 * Rejects where the store fails.
 */
export type ServeDue = (
  due: TakenDue,
  now: number,
  also?: (unasked: Unasked) => readonly Write[],
) => Promise<Unasked>;

/** Makes the serving of due things. */
export function makeServeDue({ say, store, settings }: ServingDue): ServeDue {
  return (due, now, also) =>
    store.turn(due.cellar, async (view) => {
      const { chat, cellar } = due;
      // Its hour may have been changed since it was handed out.
      if ((await view.due(due.id)) === undefined) return { writes: [], result: { chat, said: [] } };
      const { writes, replies } = await handleDue({ cellar, due, at: now }, view, settings);
      const result: Unasked = { chat, said: replies.map(say) };
      return { writes: also === undefined ? writes : [...writes, ...also(result)], result };
    });
}
