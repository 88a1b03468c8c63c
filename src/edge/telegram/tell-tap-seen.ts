import type { Api } from 'grammy';

import type { Log } from '../logging.ts';
import { failureOf } from './failure.ts';
import { clientSignal } from './platform.ts';

/** What telling needs. */
export interface TapOptions {
  readonly api: Api;
  readonly log: Log;
  readonly signal: AbortSignal;
}

/**
 * Makes what ends the waiting mark on a tapped button. One try: the answer itself counts, and an old tap is refused
 * anyway. Never rejects.
 */
export function makeTellTapSeen({ api, log, signal }: TapOptions): (tapId: string) => Promise<void> {
  return async (tapId) => {
    try {
      await api.answerCallbackQuery(tapId, {}, clientSignal(signal));
    } catch (error) {
      log.debug({ failure: failureOf(error) }, 'a tap could not be acknowledged');
    }
  };
}
