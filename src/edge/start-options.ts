import { parseArgs } from 'node:util';
import { OperatorError } from './operator-error.ts';

/** What `npm start` is told on the command line. */
export interface StartOptions {
  /** The chat is with an invented cellar, in this terminal. */
  readonly demo: boolean;
}

const USAGE = 'npm start, or npm start -- --demo for a cellar that is invented';

/**
 * Reads the command line.
 *
 * @throws OperatorError with a sentence for what is no option
 */
export function readStartOptions(args: readonly string[]): StartOptions {
  try {
    const { values } = parseArgs({ args: [...args], options: { demo: { type: 'boolean' } } });
    return { demo: values.demo ?? false };
  } catch (cause) {
    const reason = cause instanceof Error ? cause.message.split('. ')[0] : String(cause);
    throw new OperatorError(`${reason}. There is: ${USAGE}.`, { cause });
  }
}
