/** The rest of `bot-child.ts`: joined as the program joins it, without the limit of each person. */
import { handle } from '../../../src/chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS as settings } from '../../../src/chat/conversation/settings.ts';
import { makeSay } from '../../../src/chat/replies/say.ts';
import { systemClock as clock } from '../../../src/edge/clock.ts';
import { loadLocales } from '../../../src/edge/locales.ts';
import { createLog } from '../../../src/edge/logging.ts';
import { createWakeUp } from '../../../src/edge/reminders/wake-up.ts';
import { wakingTurn } from '../../../src/edge/reminders/waking-turn.ts';
import { stopSignal } from '../../../src/edge/stop-signal.ts';
import { openSqliteStore } from '../../../src/edge/store/sqlite/open-sqlite-store.ts';
import { joinConversation } from '../../../src/edge/telegram/join-conversation.ts';
import { NO_LIMITS, USUAL_LIMITS } from '../../../src/edge/telegram/pace.ts';
import { serveTelegram } from '../../../src/edge/telegram/serve-telegram.ts';
import { TOKEN } from '../../edge/telegram/token.ts';

const [root = '', file = '', port] = process.argv.slice(2);
const STDOUT = 1;

const fail = (damage: Error): never => {
  throw damage;
};
const opened = await openSqliteStore(file, { now: clock.now, report: fail });
const wakeUp = createWakeUp();
const store = { ...opened, turn: wakingTurn(opened, wakeUp) };
const say = makeSay(loadLocales());
const log = createLog({ level: 'warn', secret: TOKEN, to: STDOUT });
const { serveDue, ...conversation } = joinConversation({
  handle,
  say,
  store,
  settings,
  rule: { is: 'open' },
  paceOf: () => 'fine',
  clock,
  log,
});
await serveTelegram({
  ...conversation,
  say,
  store,
  reminding: { serveDue, wakeUp },
  log,
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
