/**
 * The bot as a process of its own, without the platform's limits unless LIMITS is set, so that a run is short:
 * `node bot-child.ts ROOT FILE [PORT]`. With a port it is brought its updates, else it polls. Its log goes to stdout.
 */
import { handle } from '../../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS as settings } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { systemClock as clock } from '../../../src/edge/clock.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { makeServeTurn } from '../../../src/edge/serve-message.ts';
import { stopSignal } from '../../../src/edge/stop-signal.ts';
import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { NO_LIMITS, USUAL_LIMITS } from '../../../src/edge/telegram/pace.ts';
import { serveTelegram } from '../../../src/edge/telegram/serve-telegram.ts';
import { TOKEN } from '../../edge/telegram/token.ts';

const [root = '', file = '', port] = process.argv.slice(2);
const STDOUT = 1;

const fail = (damage: Error): never => {
  throw damage;
};
const store = await openSqliteStore(file, { now: clock.now, report: fail });
const say = makeSay(loadLocales());
await serveTelegram({
  serve: makeServeTurn({ handle, say, store, settings }),
  say,
  store,
  log: createLog({ level: 'warn', secret: TOKEN, to: STDOUT }),
  clock,
  config: { botToken: TOKEN, botApiRoot: root },
  ...(port !== undefined && {
    door: { port: Number(port), webhook: { url: 'https://bot.example/a-word', secret: 'made-up' } },
  }),
  tell: () => undefined,
  signal: stopSignal(),
  limits: process.env['LIMITS'] === 'usual' ? USUAL_LIMITS : NO_LIMITS,
});
await store.close();
