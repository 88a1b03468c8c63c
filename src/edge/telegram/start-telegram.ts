import { handle } from '../../chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS as settings } from '../../chat/conversation/settings.ts';
import { makeSay } from '../../chat/replies/say.ts';
import { makeAudit } from '../audit-workings.ts';
import { systemClock as clock } from '../clock.ts';
import { isInside, makeDoor } from '../cellars/door.ts';
import { createRateLimit } from '../cellars/rate-limit.ts';
import { createRegistry } from '../cellars/registry.ts';
import type { Ground } from '../ground.ts';
import { loadLocales } from '../locales.ts';
import { createLog } from '../logging.ts';
import { createWakeUp } from '../reminders/wake-up.ts';
import { wakingTurn } from '../reminders/waking-turn.ts';
import { makeServeDue } from '../serve-due.ts';
import { makeServe, makeServeTurn } from '../serve-message.ts';
import { makeRunErrand } from '../run-errand.ts';
import { allowRuleOf } from './allow-rule-of.ts';
import { makeTypedWork } from './make-typed-work.ts';
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
  const registry = createRegistry(store);
  const door = makeDoor({ store, registry, rule, paceOf: createRateLimit(), handle });
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
  await serveTelegram({
    serve: makeServeTurn(serving),
    fileWork: { runErrand, settings, isAdmitted: async (message) => isInside(await door.admit(message)) },
    typedWork: makeTypedWork({ say, settings, rule, registry, now: clock.now }),
    migrateChat: registry.migrateChat,
    say,
    store,
    reminding: { serveDue: makeServeDue({ say, store, settings, door }), wakeUp },
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
