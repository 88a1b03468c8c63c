import { parseArgs } from 'node:util';
import { OperatorError } from './operator-error.ts';

/** What the program is to do: to serve, or to show an invented cellar, or to see to the cellar's file and end. */
export type StartOptions =
  | { readonly does: 'serve' }
  | { readonly does: 'demo' }
  | { readonly does: 'rebuild' | 'backup' }
  | { readonly does: 'restore'; readonly copy: string };

const USAGE = `npm start                      serves: in this terminal, or on Telegram when BOT_TOKEN is set
npm start -- --demo            a cellar that is invented, in this terminal
npm run backup                 copies the cellar's file, also while it is in use
npm run restore -- BACKUP      puts a backup in the place of the cellar's file
npm run rebuild                derives the vessels anew from the log`;

/**
 * Reads the command line.
 *
 * @throws OperatorError with a sentence for what is no option
 */
export function readStartOptions(args: readonly string[]): StartOptions {
  const { demo, rebuild, backup, restore } = parse(args);
  if ([demo, rebuild, backup, restore].filter((one) => one !== undefined).length > 1)
    throw new OperatorError(`One at a time, please.\n${USAGE}`);
  if (restore?.trim() === '') throw new OperatorError(`Which backup?\n${USAGE}`);
  if (restore !== undefined) return { does: 'restore', copy: restore };
  return { does: demo ? 'demo' : rebuild ? 'rebuild' : backup ? 'backup' : 'serve' };
}

function parse(args: readonly string[]) {
  try {
    return parseArgs({
      args: [...args],
      options: {
        demo: { type: 'boolean' },
        rebuild: { type: 'boolean' },
        backup: { type: 'boolean' },
        restore: { type: 'string' },
      },
    }).values;
  } catch (cause) {
    const reason = cause instanceof Error ? cause.message.split('. ')[0] : String(cause);
    throw new OperatorError(`${reason}.\n${USAGE}`, { cause });
  }
}
