import type { CellarStore } from '../core/cellar/cellar-store.ts';
import { faultReply } from '../chat/conversation/fault-reply.ts';
import type { Errand, Handle, Handled, IncomingMessage } from '../chat/conversation/ports.ts';
import type { Settings } from '../chat/conversation/settings.ts';
import type { Said, Say } from '../chat/replies/say.ts';
import { StoreError } from './store/store-error.ts';

/** What serving a message needs: the conversation, its words, and the store. */
export interface Serving {
  readonly handle: Handle;
  readonly say: Say;
  readonly store: CellarStore;
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

/** Makes the serving of messages. */
export function makeServe({ handle, say, store, settings, report }: Serving): Serve {
  return async (message) => {
    try {
      return await store.turn(message.cellar, async (view) => {
        const { writes, replies, answers, understood, errand } = await handle(message, view, settings);
        // Said inside the turn: what cannot be said is not kept either.
        const said = replies.map(say);
        return {
          writes,
          result: {
            said,
            ...(answers && { answers }),
            ...(understood && { understood }),
            ...(errand && { errand }),
          },
        };
      });
    } catch (fault) {
      report(fault);
      return { said: [say(faultReply(message.language, fault instanceof StoreError))] };
    }
  };
}
