import type { CellarStore, TakenDue, Write } from '../core/cellar/cellar-store.ts';
import type { Door } from './cellars/door.ts';
import { handleDue } from '../chat/conversation/handle-due.ts';
import type { Settings } from '../chat/conversation/settings.ts';
import type { Said, Say } from '../chat/replies/say.ts';

/** What serving a due thing needs: the words, and the store. */
export interface ServingDue {
  readonly say: Say;
  readonly store: Pick<CellarStore, 'turn'>;
  readonly settings: Settings;
  /** Knows what a chat is called by now, and its cellars; absent where the edge itself does. */
  readonly door?: Pick<Door, 'whereIs'>;
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
  also?: (unasked: Unasked, writes: readonly Write[]) => readonly Write[],
) => Promise<Unasked>;

/** Makes the serving of due things. */
export function makeServeDue({ say, store, settings, door }: ServingDue): ServeDue {
  return async (due, now, also) => {
    const place = await door?.whereIs(due.chat);
    const chat = place?.chat ?? due.chat;
    const { cellar } = due;
    const where = { ...place, ...(place && cellar !== chat && { isJoined: true as const }) };
    return store.turn(cellar, async (view) => {
      // Its hour may have been changed since it was handed out.
      if ((await view.due(due.id)) === undefined) return { writes: [], result: { chat, said: [] } };
      const { writes, replies } = await handleDue({ cellar, due, at: now, ...where }, view, settings);
      const result: Unasked = { chat, said: replies.map(say) };
      return { writes: also === undefined ? writes : [...writes, ...also(result, writes)], result };
    });
  };
}
