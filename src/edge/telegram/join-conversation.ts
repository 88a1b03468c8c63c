import { chatLanguageKey, languageKey } from '../../chat/conversation/keys.ts';
import { languagesOf } from '../../chat/conversation/languages-of.ts';
import type { Handle } from '../../chat/conversation/ports.ts';
import type { Settings } from '../../chat/conversation/settings.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import type { AllowRule } from '../cellars/allow-rule.ts';
import { isInside, makeDoor, type DoorOptions } from '../cellars/door.ts';
import { createRateLimit } from '../cellars/rate-limit.ts';
import { createRegistry } from '../cellars/registry.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { makeRunErrand } from '../run-errand.ts';
import { makeServeDue, type ServeDue } from '../serve-due.ts';
import { makeServe, makeServeTurn } from '../serve-message.ts';
import { makeTypedWork } from './make-typed-work.ts';
import type { TelegramOptions } from './serve-telegram.ts';

/** What the conversation is joined from. */
export interface ConversationParts {
  readonly handle: Handle;
  readonly say: Say;
  readonly store: CellarStore;
  readonly settings: Settings;
  readonly rule: AllowRule;
  /** How fast somebody may write; absent: as usual. */
  readonly paceOf?: DoorOptions['paceOf'];
  readonly clock: Clock;
  readonly log: Log;
}

/** What serving takes of the conversation, and what says the things that fall due. */
export interface Conversation extends Required<
  Pick<TelegramOptions, 'serve' | 'fileWork' | 'typedWork' | 'migrateChat'>
> {
  readonly serveDue: ServeDue;
}

/** Joins the conversation with its door: which cellar a chat is in, and who comes in how fast. */
export function joinConversation(parts: ConversationParts): Conversation {
  const { handle, say, store, settings, rule, clock, log, paceOf = createRateLimit() } = parts;
  const registry = createRegistry(store);
  const door = makeDoor({ store, registry, rule, paceOf, handle });
  const report = (err: unknown): void => log.error({ err }, 'an errand failed');
  const serving = { handle, say, store, settings, door };
  const runErrand = makeRunErrand({
    store,
    say,
    settings,
    serve: makeServe({ ...serving, report }),
    // Nothing of this machine is read because somebody wrote its name, and no backup is made from afar.
    readFile: async () => undefined,
    report,
  });
  return {
    serve: makeServeTurn(serving),
    serveDue: makeServeDue({ say, store, settings, door }),
    fileWork: {
      runErrand,
      settings,
      isAdmitted: async (message) => isInside(await door.admit(message)),
      languageOf: async (message) => {
        const { present } = await registry.cellarsOfChat(message.chat);
        const keys = [languageKey(message), chatLanguageKey(message.chat)];
        const kept = await store.look(present, (view) => view.keptOf(keys));
        return languagesOf(message, kept).language;
      },
    },
    typedWork: makeTypedWork({ say, settings, rule, registry, now: clock.now }),
    migrateChat: registry.migrateChat,
  };
}
