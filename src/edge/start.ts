import { systemClock as clock } from './clock.ts';
import { readConfig } from './config.ts';
import { loadEnvironment } from './environment.ts';
import { createOperator } from './operator.ts';
import { readStartOptions } from './start-options.ts';
import { stopSignal } from './stop-signal.ts';
import { withdrawSecrets } from './withdraw-secrets.ts';

/**
 * Does what the command line asks for. Mostly it joins the parts and serves: on Telegram where a token is set, else in the
 * terminal, and the demo there always. Resolves at a clean stop.
 */
export async function start(args: readonly string[]): Promise<void> {
  const set = withdrawSecrets();
  let operator = createOperator(set['BOT_TOKEN']);
  process.on('uncaughtException', (fault) => operator.end(fault));

  const options = readStartOptions(args);
  if (options.does === 'demo') {
    const { startDemo } = await import('./demo/start-demo.ts');
    // Nothing that is set for a real cellar is looked at.
    return startDemo({ environment: set, operator, signal: stopSignal() });
  }
  const environment = loadEnvironment(process.cwd(), set);
  operator = createOperator(environment['BOT_TOKEN']);
  const config = await readConfig(environment);

  if (options.does !== 'serve') {
    const { runUpkeep } = await import('./upkeep/run-upkeep.ts');
    process.stdout.write(`${await runUpkeep(options, { dataFile: config.dataFile, operator })}\n`);
    return;
  }
  const { openSqliteStore } = await import('./store/sqlite/open-sqlite-store.ts');
  const store = await openSqliteStore(config.dataFile, {
    now: clock.now,
    report: (damage) => operator.tell(damage.message),
  });
  try {
    const ground = { config, environment, operator, store, signal: stopSignal() };
    // Each chat is loaded only when it is the one that serves.
    if (config.botToken !== undefined) {
      const { startTelegram } = await import('./telegram/start-telegram.ts');
      return await startTelegram(ground, config.botToken);
    }
    const { startTerminal } = await import('./terminal/start-terminal.ts');
    await startTerminal({ ...ground, dataFile: config.dataFile });
  } finally {
    await store.close();
  }
}
