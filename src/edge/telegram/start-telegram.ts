import { handle } from '../../chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS as settings } from '../../chat/conversation/settings.ts';
import { makeSay } from '../../chat/replies/say.ts';
import { makeAudit } from '../audit-workings.ts';
import { systemClock as clock } from '../clock.ts';
import type { Ground } from '../ground.ts';
import { loadLocales } from '../locales.ts';
import { createLog } from '../logging.ts';
import { createWakeUp } from '../reminders/wake-up.ts';
import { wakingTurn } from '../reminders/waking-turn.ts';
import { warmUpSoon } from '../warm-up-soon.ts';
import { allowRuleOf } from './allow-rule-of.ts';
import { joinConversation } from './join-conversation.ts';
import { serveTelegram } from './serve-telegram.ts';

const STDOUT = 1;

/** Joins the parts and serves Telegram until a stop. */
export async function startTelegram(ground: Ground, botToken: string): Promise<void> {
  const { config, signal } = ground;
  const { tell } = ground.operator;
  const log = createLog({ level: config.logLevel, secret: botToken, to: STDOUT });
  const say = makeSay(loadLocales());
  const wakeUp = createWakeUp();
  const store = { ...ground.store, turn: wakingTurn(ground.store, wakeUp) };
  const rule = allowRuleOf(config.allow);
  const parts = { handle, say, store, settings, rule, clock, log };
  const { serveDue, ...conversation } = joinConversation(parts);
  warmUpSoon(settings);
  await serveTelegram({
    ...conversation,
    say,
    store,
    reminding: { serveDue, wakeUp },
    audit: makeAudit(tell),
    config: { ...config, botToken },
    ...(config.port !== undefined && {
      door: { port: config.port, ...(config.webhook !== undefined && { webhook: config.webhook }) },
    }),
    log,
    clock,
    tell,
    signal,
  });
}
