import { handle } from '../../chat/conversation/conversation.ts';
import type { IncomingMessage } from '../../chat/conversation/ports.ts';
import type { Settings } from '../../chat/conversation/settings.ts';
import { zoneOf } from '../../chat/conversation/zone.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import { makeServeTurn, type Served } from '../serve-message.ts';
import { createMemoryCellars } from '../store/memory-cellars.ts';
import { demoMessages } from './demo-messages.ts';

/** What the invented cellar is made with. */
export interface DemoOptions {
  readonly say: Say;
  readonly settings: Settings;
  /** The time in milliseconds since 1970. */
  readonly now: () => number;
  /** Told of each message and its answer. */
  readonly each?: (message: IncomingMessage, served: Served) => void;
}

/**
 * Makes the invented cellar in memory: all that its people wrote goes through the conversation, as if it came in at its
 * time, so that the demo shows what the program does.
 */
export async function openDemo({ say, settings, now, each }: DemoOptions): Promise<CellarStore> {
  let past: number | undefined;
  const store = createMemoryCellars({ now: () => past ?? now() });
  const serve = makeServeTurn({ handle, say, store, settings });
  for (const message of demoMessages({ at: now(), zone: zoneOf(settings) })) {
    past = message.at;
    const served = await serve(message);
    each?.(message, served);
  }
  past = undefined;
  return store;
}
