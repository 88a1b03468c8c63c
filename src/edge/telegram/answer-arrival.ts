import type { Audit } from '../audit-workings.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import type { Serve } from '../serve-message.ts';
import { failureOf } from './failure.ts';
import { clientSignal, type Platform } from './platform.ts';
import { sendReplies } from './send-replies.ts';
import type { Arrival } from './to-message.ts';

/** So long an answer waits for its tap to be acknowledged, in milliseconds. */
const LONGEST_TAP_WAIT_MS = 1000;

/** What answering needs. */
export interface AnswerOptions {
  readonly serve: Serve;
  /** Checks the workings once their replies are sent. */
  readonly audit?: Audit;
  readonly platform: Platform;
  readonly clock: Clock;
  readonly log: Log;
  /** Aborted when there is no time left. */
  readonly signal: AbortSignal;
}

/**
 * Answers one arrival: it is served, and once what it wrote is durable the replies are sent. Never rejects: what fails
 * is logged. Gives back whether the arrival is done with; if not, the platform has to deliver it again.
 */
export async function answerArrival(arrival: Arrival, options: AnswerOptions): Promise<boolean> {
  const { serve, platform, clock, log, signal, audit } = options;
  const { message, chatId, tapId } = arrival;
  if (signal.aborted) return false;
  const told = tapId === undefined ? undefined : tellTapSeen(tapId, options);
  const { said, answers } = await serve(message);
  // Before the answer, but an acknowledgement that is slow to come holds nothing up.
  if (told !== undefined) await Promise.race([told, clock.wait(LONGEST_TAP_WAIT_MS)]);
  const sent = await sendReplies(chatId, said, { api: platform.patient, log, signal });
  audit?.(answers);
  return sent === 'ended';
}

/** Ends the waiting mark on a tapped button. One try: the answer itself counts, and an old tap is refused anyway. */
const tellTapSeen = async (tapId: string, { platform, log, signal }: AnswerOptions): Promise<void> => {
  try {
    await platform.once.answerCallbackQuery(tapId, {}, clientSignal(signal));
  } catch (error) {
    log.debug({ failure: failureOf(error) }, 'a tap could not be acknowledged');
  }
};
