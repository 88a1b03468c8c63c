import { handle } from '../../chat/conversation/conversation.ts';
import { makeSay } from '../../chat/replies/say.ts';
import { makeAudit } from '../audit-workings.ts';
import { systemClock as clock } from '../clock.ts';
import type { Ground } from '../ground.ts';
import { loadLocales } from '../locales.ts';
import { runReminders } from '../reminders/run-reminders.ts';
import { createWakeUp } from '../reminders/wake-up.ts';
import { wakingTurn } from '../reminders/waking-turn.ts';
import { makeRunErrand } from '../run-errand.ts';
import { makeServe } from '../serve-message.ts';
import { makeServeDue } from '../serve-due.ts';
import { shownName } from '../shown-name.ts';
import { AT_TERMINAL, runTerminal, showUnasked } from './chat.ts';
import { backupPathOf, readNamedFile, writeExport } from './errand-files.ts';
import { terminalSettings } from './terminal-settings.ts';
import { warmUpSoon } from '../warm-up-soon.ts';

/** What a chat on the keyboard stands on. */
export interface TerminalGround extends Pick<Ground, 'environment' | 'operator' | 'store' | 'signal'> {
  /** Beside it go exports, and backups of it. */
  readonly dataFile: string;
  /** Whether that is a file, of which backups can be made; else the store is in memory. */
  readonly isFile?: boolean;
  /** The greeting, in the keys of its sentences; the usual one where it is absent. */
  readonly welcome?: readonly string[];
}

/** Serves the chat on the keyboard, and says there what falls due, until the input ends or the program is stopped. */
export async function startTerminal(ground: TerminalGround): Promise<void> {
  const { environment, operator, store, signal, dataFile, isFile = true, welcome } = ground;
  const { stdin: input, stdout: output } = process;
  const interactive = input.isTTY && output.isTTY;
  const { USER, USERNAME, LOGNAME } = environment;
  const name = shownName(USER ?? USERNAME ?? LOGNAME);
  const settings = terminalSettings();
  const say = makeSay(loadLocales());
  const { tell, report } = operator;

  const wakeUp = createWakeUp();
  const turn = wakingTurn(store, wakeUp);
  const serve = makeServe({ handle, say, store: { turn }, settings, report });
  const serveDue = makeServeDue({ say, store: { turn }, settings });
  const runErrand = makeRunErrand({
    store,
    say,
    serve,
    settings,
    readFile: readNamedFile,
    ...(isFile && { backupPath: (now: number) => backupPathOf(dataFile, now) }),
    handOver: (file) => writeExport(dataFile, file),
    report,
  });

  const ended = new AbortController();
  const reminders = runReminders({
    store,
    clock,
    wakeUp,
    signal: ended.signal,
    log: { error: ({ err }: { err: unknown }) => report(err), warn: () => undefined },
    say: async (due) => {
      // What is for another chat waits until that chat is served again.
      if (due.chat !== AT_TERMINAL.chat) return;
      const { said } = await serveDue(due, clock.now());
      showUnasked(said, output, interactive);
    },
  });
  if (interactive) warmUpSoon(settings);
  await runTerminal({
    serve,
    runErrand: async (errand, message) => (await runErrand(errand, message)).said,
    say,
    input,
    output,
    now: clock.now,
    language: 'en',
    interactive,
    signal,
    ...(name !== undefined && { name }),
    ...(welcome !== undefined && { welcome }),
    // A pipe ends with its answer, and waits for nothing more.
    ...(interactive && { audit: makeAudit(tell) }),
  });
  ended.abort();
  await reminders;
}
