import type { Log } from '../logging.ts';
import type { BackOff } from './back-off.ts';
import { clientSignal, type Platform } from './platform.ts';

/** What greeting needs. */
export interface GreetOptions {
  readonly backOff: BackOff;
  readonly log: Log;
  readonly tell: (sentence: string) => void;
  readonly signal: AbortSignal;
}

/**
 * Asks the platform who we are, again and again until it answers. Gives back whether it did before the signal was
 * aborted.
 *
 * @throws OperatorError when the platform does not accept the token.
 */
export async function greet(
  platform: Platform,
  { backOff, log, tell, signal }: GreetOptions,
): Promise<boolean> {
  while (!signal.aborted) {
    try {
      const me = await platform.calls.getMe(clientSignal(signal));
      backOff.succeeded();
      log.info({ bot: me.username }, 'serving Telegram');
      tell(`Serving Telegram as @${me.username}.`);
      return true;
    } catch (error) {
      if (!signal.aborted) await backOff.failed(error);
    }
  }
  return false;
}
