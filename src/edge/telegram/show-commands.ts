import type { Language } from '../../chat/reader/understood.ts';
import { LISTED_COMMANDS } from '../../chat/reader/words/listed-commands.ts';
import type { Say } from '../../chat/replies/say.ts';
import { SPOKEN } from '../../chat/replies/spoken.ts';
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

/** What is listed, in this order; a person sends `start` without looking for it. */
const SHOWN = LISTED_COMMANDS.filter((command) => command !== 'start');

/** Each word with what it does, told in a language. */
const commandsIn = (language: Language, say: Say): { command: string; description: string }[] =>
  SHOWN.map((command) => {
    const lines = [{ room: 'first' as const, key: `command-${command}`, values: {} }];
    return { command, description: say({ language, lines, buttons: [] }).text };
  });

/**
 * Has the platform list the bot's words to whoever types a slash, to each in their language, and in English where none is
 * known. Without the list they are read all the same. Never rejects.
 */
export async function showCommands({ platform, say, log, signal }: CommandOptions): Promise<void> {
  try {
    const { calls } = platform;
    await calls.setMyCommands(commandsIn('en', say), {}, clientSignal(signal));
    for (const language of SPOKEN.filter((one) => one !== 'en'))
      await calls.setMyCommands(commandsIn(language, say), { language_code: language }, clientSignal(signal));
  } catch (error) {
    log.debug({ failure: failureOf(error) }, 'the commands could not be listed');
  }
}
