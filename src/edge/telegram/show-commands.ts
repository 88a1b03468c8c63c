import type { Say } from '../../chat/replies/say.ts';
import type { Log } from '../logging.ts';
import { failureOf } from './failure.ts';
import { clientSignal, type Platform } from './platform.ts';

/** What showing needs. */
export interface CommandOptions {
  readonly platform: Platform;
  readonly say: Say;
  readonly log: Log;
  readonly signal: AbortSignal;
}

/** Words that the conversation reads, each with the sentence that tells what it does. */
const COMMANDS = [
  ['today', 'command-today'],
  ['due', 'command-due'],
  ['vessels', 'command-vessels'],
  ['open', 'command-open'],
  ['settings', 'command-settings'],
  ['help', 'command-help'],
] as const;

/** Has the platform list the bot's words to whoever types a slash. Without the list they are read all the same. Never rejects. */
export async function showCommands({ platform, say, log, signal }: CommandOptions): Promise<void> {
  try {
    const commands = COMMANDS.map(([command, key]) => {
      const lines = [{ room: 'first' as const, key, values: {} }];
      return { command, description: say({ language: 'en', lines, buttons: [] }).text };
    });
    await platform.calls.setMyCommands(commands, {}, clientSignal(signal));
  } catch (error) {
    log.debug({ failure: failureOf(error) }, 'the commands could not be listed');
  }
}
