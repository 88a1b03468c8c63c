import { DEFAULT_SETTINGS as settings } from '../../../src/chat/conversation/settings.ts';
import type { AllowRule } from '../../../src/edge/cellars/allow-rule.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { createMemoryCellars } from '../../../src/edge/store/memory-cellars.ts';
import { joinConversation } from '../../../src/edge/telegram/join-conversation.ts';
import { NO_LIMITS } from '../../../src/edge/telegram/pace.ts';
import type { TelegramOptions } from '../../../src/edge/telegram/serve-telegram.ts';
import { realConversation } from './real-conversation.ts';
import { hastyClock as clock } from './served-bot.ts';

/** All that the program joins, on a store in memory: to be handed to `serveBot`. */
export function wholeBot(
  rule: AllowRule = { is: 'open' },
): Pick<TelegramOptions, 'serve' | 'say' | 'store' | 'fileWork' | 'typedWork' | 'migrateChat' | 'limits'> {
  const store = createMemoryCellars({ now: clock.now });
  const log = createLog({ level: 'silent', to: { write: () => undefined } });
  const { say } = realConversation;
  const { serveDue: _, ...joined } = joinConversation({
    ...realConversation,
    store,
    settings,
    rule,
    clock,
    log,
  });
  return { ...joined, say, store, limits: NO_LIMITS };
}
