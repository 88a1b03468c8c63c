import type { CellarStore, Write } from '../core/cellar/cellar-store.ts';
import { faultReply } from '../chat/conversation/fault-reply.ts';
import type { Errand, Handle, Handled, IncomingMessage } from '../chat/conversation/ports.ts';
import type { Settings } from '../chat/conversation/settings.ts';
import type { Said, Say } from '../chat/replies/say.ts';
import { StoreError } from './store/store-error.ts';

/** What serving a message needs: the conversation, its words, and the store. */
export interface Serving {
  readonly handle: Handle;
  readonly say: Say;
  readonly store: Pick<CellarStore, 'turn'>;
  /** What holds where a cellar has set nothing. */
  readonly settings: Settings;
  /** Tells whoever runs the program of a fault of ours, or of the world's. */
  readonly report: (fault: unknown) => void;
}

/** A message that was served: all that it wrote is durable, and these are the replies to send. */
export interface Served {
  readonly said: readonly Said[];
  readonly answers?: Handled['answers'];
  readonly understood?: Handled['understood'];
  /** Something with files that is still to be done. */
  readonly errand?: Errand;
}

/** Serves a message: handled in a turn of its cellar, and answered only once what it wrote is durable. Never rejects. */
export type Serve = (message: IncomingMessage) => Promise<Served>;

/**
 * Serves a message in a turn, and rejects where that fails: then nothing of it is kept. `also` gives what the turn
 * writes besides, made of what is said.
 */
export type ServeTurn = (
  message: IncomingMessage,
  also?: (served: Served) => readonly Write[],
) => Promise<Served>;

/** Makes the serving of messages for whoever tries again by themselves. */
export function makeServeTurn({ handle, say, store, settings }: Omit<Serving, 'report'>): ServeTurn {
  return (message, also) =>
    store.turn(message.cellar, async (view) => {
      const { writes, replies, answers, understood, errand } = await handle(message, view, settings);
      // Said inside the turn: what cannot be said is not kept either.
      const result: Served = {
        said: replies.map(say),
        ...(answers && { answers }),
        ...(understood && { understood }),
        ...(errand && { errand }),
      };
      return { writes: also === undefined ? writes : [...writes, ...also(result)], result };
    });
}

/** Makes the serving of messages. */
export function makeServe(serving: Serving): Serve {
  const { say, report } = serving;
  const serveTurn = makeServeTurn(serving);
  return async (message) => {
    try {
      return await serveTurn(message);
    } catch (fault) {
      report(fault);
      return { said: [say(faultReply(message.language, fault instanceof StoreError))] };
    }
  };
}
