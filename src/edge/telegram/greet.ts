import type { Log } from '../logging.ts';
import type { BackOff } from './back-off.ts';
import type { Me } from './me.ts';
import { clientSignal, type Platform } from './platform.ts';

/** What greeting needs. */
export interface GreetOptions {
  readonly backOff: BackOff;
  readonly log: Log;
  readonly tell: (sentence: string) => void;
  readonly signal: AbortSignal;
}

/**
 * Asks the platform who we are, again and again until it answers. Gives back undefined where the signal was aborted
 * before.
 *
 * @throws OperatorError when the platform does not accept the token.
 */
export async function greet(
  platform: Platform,
  { backOff, log, tell, signal }: GreetOptions,
): Promise<Me | undefined> {
  while (!signal.aborted) {
    try {
      const me = await platform.calls.getMe(clientSignal(signal));
      backOff.succeeded();
      // Where it does not see all of a group, the platform brings it what names it, answers it or is a command.
      log.info({ bot: me.username, seesAll: me.can_read_all_group_messages }, 'serving Telegram');
      tell(`Serving Telegram as @${me.username}.`);
      return { id: me.id, username: me.username };
    } catch (error) {
      if (!signal.aborted) await backOff.failed(error);
    }
  }
  return undefined;
}
