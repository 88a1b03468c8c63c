import type { CellarStore, Write } from '../core/cellar/cellar-store.ts';
import { faultReply } from '../chat/conversation/fault-reply.ts';
import type { Errand, Handle, Handled, IncomingMessage } from '../chat/conversation/ports.ts';
import type { Settings } from '../chat/conversation/settings.ts';
import type { Said, Say } from '../chat/replies/say.ts';
import type { Door } from './cellars/door.ts';
import { StoreError } from './store/store-error.ts';

/** What serving a message needs: the conversation, its words, and the store. */
export interface Serving {
  readonly handle: Handle;
  readonly say: Say;
  readonly store: Pick<CellarStore, 'turn'>;
  /** What holds where a cellar has set nothing. */
  readonly settings: Settings;
  /** Finds the cellar of a message; absent where the edge itself knows it. */
  readonly door?: Door;
  /** Tells whoever runs the program of a fault of ours, or of the world's. */
  readonly report: (fault: unknown) => void;
}

/** A message that was served: all that it wrote is durable, and these are the replies to send. */
export interface Served {
  readonly said: readonly Said[];
  readonly answers?: Handled['answers'];
  readonly understood?: Handled['understood'];
  readonly round?: Handled['round'];
  /** Something with files that is still to be done. */
  readonly errand?: Errand;
  /** The message with the cellar that it was handled in: an errand is for that one. */
  readonly message?: IncomingMessage;
}

/** Serves a message: handled in a turn of its cellar, and answered only once what it wrote is durable. Never rejects. */
export type Serve = (message: IncomingMessage) => Promise<Served>;

/**
 * Serves a message in a turn, and rejects where that fails: then nothing of it is kept. `also` gives what the turn
 * writes besides, made of what is said and of what it writes.
 */
export type ServeTurn = (
  message: IncomingMessage,
  also?: (served: Served, writes: readonly Write[]) => readonly Write[],
) => Promise<Served>;

/** So often a message is handled at most until it could be read. */
const MOST_PASSES = 3;

/** Makes the serving of messages for whoever tries again by themselves. */
export function makeServeTurn(serving: Omit<Serving, 'report'>): ServeTurn {
  const { say, store, settings, door } = serving;
  return async (incoming, also) => {
    const admitted = await door?.admit(incoming);
    const { message, handle } = admitted ?? { message: incoming, handle: serving.handle };
    for (let pass = 1; pass <= MOST_PASSES; pass += 1) {
      const served = await store.turn(message.cellar, async (view) => {
        const { writes, replies, answers, understood, round, errand, place, again } = await handle(
          message,
          view,
          settings,
        );
        if (again) return { writes, result: undefined };
        // The chat is moved first: should nothing else be kept, the same message moves it there again.
        if (place) await door?.move(message.chat, place);
        // Said inside the turn: what cannot be said is not kept either.
        const result: Served = {
          said: replies.map(say),
          ...(answers && { answers }),
          ...(understood && { understood }),
          ...(round && { round }),
          ...(errand && { errand, message }),
        };
        return { writes: also === undefined ? writes : [...writes, ...also(result, writes)], result };
      });
      if (served !== undefined) return served;
    }
    throw new RangeError('a message was to be handled again and again');
  };
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
