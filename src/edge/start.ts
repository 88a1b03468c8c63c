import { handle } from '../chat/conversation/conversation.ts';
import type { IncomingMessage } from '../chat/conversation/ports.ts';
import type { Memory } from '../chat/conversation/memory.ts';
import { DEFAULT_SETTINGS } from '../chat/conversation/settings.ts';
import { makeSay } from '../chat/replies/say.ts';
import { makeAudit } from './audit-workings.ts';
import { systemClock as clock } from './clock.ts';
import { readConfig } from './config.ts';
import { loadEnvironment } from './environment.ts';
import { loadLocales } from './locales.ts';
import { createOperator } from './operator.ts';
import { stopSignal } from './stop-signal.ts';
import { createMemoryStore } from './store/memory.ts';

const STDOUT = 1;

/** Joins the parts and serves: on Telegram where a token is set, else in the terminal. Resolves at a clean stop. */
export async function start(): Promise<void> {
  let operator = createOperator(process.env['BOT_TOKEN']);
  process.on('uncaughtException', (fault) => operator.end(fault));

  const environment = loadEnvironment(process.cwd(), process.env);
  operator = createOperator(environment['BOT_TOKEN']);
  const config = await readConfig(environment);
  for (const name of config.notServedYet) operator.tell(`${name} is not served yet; it changes nothing.`);

  const audit = makeAudit(operator.tell);
  const conversation = {
    handle: (message: IncomingMessage, memory: Memory) => handle(message, memory, DEFAULT_SETTINGS),
    say: makeSay(loadLocales()),
    state: createMemoryStore(),
    signal: stopSignal(),
  };

  // Each edge is loaded only when it is the one that serves.
  const { botToken } = config;
  if (botToken === undefined) {
    const { runTerminal } = await import('./terminal/chat.ts');
    const { stdin: input, stdout: output } = process;
    const interactive = input.isTTY && output.isTTY;
    await runTerminal({
      ...conversation,
      input,
      output,
      now: clock.now,
      language: 'en',
      interactive,
      report: operator.report,
      // A pipe ends with its answer, and waits for nothing more.
      ...(interactive && { audit }),
    });
  } else {
    const { createLog } = await import('./logging.ts');
    const { serveTelegram } = await import('./telegram/serve-telegram.ts');
    const log = createLog({ level: config.logLevel, secret: botToken, to: STDOUT });
    const { tell } = operator;
    await serveTelegram({ ...conversation, config: { ...config, botToken }, log, clock, tell, audit });
  }
}
