import { handle } from '../chat/conversation/conversation.ts';
import { DEFAULT_SETTINGS } from '../chat/conversation/settings.ts';
import { makeSay } from '../chat/replies/say.ts';
import { makeAudit } from './audit-workings.ts';
import { systemClock as clock } from './clock.ts';
import { readConfig } from './config.ts';
import type { Ground } from './ground.ts';
import { loadEnvironment } from './environment.ts';
import { loadLocales } from './locales.ts';
import { createOperator } from './operator.ts';
import { makeServe } from './serve-message.ts';
import { stopSignal } from './stop-signal.ts';

const STDOUT = 1;

/** Joins the parts and serves: on Telegram where a token is set, else in the terminal. Resolves at a clean stop. */
export async function start(): Promise<void> {
  let operator = createOperator(process.env['BOT_TOKEN']);
  process.on('uncaughtException', (fault) => operator.end(fault));

  const environment = loadEnvironment(process.cwd(), process.env);
  operator = createOperator(environment['BOT_TOKEN']);
  const config = await readConfig(environment);
  for (const name of config.notServedYet) operator.tell(`${name} is not served yet; it changes nothing.`);

  const { openSqliteStore } = await import('./store/sqlite/open-sqlite-store.ts');
  const store = await openSqliteStore(config.dataFile, {
    now: clock.now,
    report: (damage) => operator.tell(damage.message),
  });
  try {
    const ground = { config, environment, operator, store, signal: stopSignal() };
    // Each chat is loaded only when it is the one that serves.
    if (config.botToken !== undefined) return await startTelegram(ground, config.botToken);
    const { startTerminal } = await import('./terminal/start-terminal.ts');
    await startTerminal(ground);
  } finally {
    await store.close();
  }
}

async function startTelegram({ config, operator, store, signal }: Ground, botToken: string): Promise<void> {
  const { createLog } = await import('./logging.ts');
  const { serveTelegram } = await import('./telegram/serve-telegram.ts');
  const log = createLog({ level: config.logLevel, secret: botToken, to: STDOUT });
  const { tell } = operator;
  const report = (err: unknown): void => log.error({ err }, 'a message could not be answered');
  const say = makeSay(loadLocales());
  await serveTelegram({
    serve: makeServe({ handle, say, store, settings: DEFAULT_SETTINGS, report }),
    config: { ...config, botToken },
    log,
    clock,
    tell,
    audit: makeAudit(tell),
    signal,
  });
}
