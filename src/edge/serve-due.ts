import type { CellarStore, TakenDue } from '../core/cellar/cellar-store.ts';
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

/** Makes the serving of due things: what is to be sent, once what it wrote is durable. Rejects where the store fails. */
export function makeServeDue({
  say,
  store,
  settings,
}: ServingDue): (due: TakenDue, now: number) => Promise<Unasked> {
  return (due, now) =>
    store.turn(due.cellar, async (view) => {
      const { chat, cellar } = due;
      // Its hour may have been changed since it was handed out.
      if ((await view.due(due.id)) === undefined) return { writes: [], result: { chat, said: [] } };
      const { writes, replies } = await handleDue({ cellar, due, at: now }, view, settings);
      return { writes, result: { chat, said: replies.map(say) } };
    });
}
