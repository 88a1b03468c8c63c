import type { Handled, IncomingMessage, StatePort } from '../../chat/conversation/ports.ts';
import { faultReply } from '../../chat/conversation/fault-reply.ts';
import type { Memory } from '../../chat/conversation/memory.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { Audit } from '../audit-workings.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { failureOf } from './failure.ts';
import { clientSignal, type Platform } from './platform.ts';
import { sendReplies } from './send-replies.ts';
import type { Arrival } from './to-message.ts';

/** The conversation, handed in: it computes and neither keeps nor sends. */
export interface Conversation {
  readonly handle: (message: IncomingMessage, memory: Memory) => Handled;
  readonly say: Say;
  /** Checks the workings once their replies are sent. */
  readonly audit?: Audit;
}

/** So long an answer waits for its tap to be acknowledged, in milliseconds. */
const LONGEST_TAP_WAIT_MS = 1000;

/** What answering needs. */
export interface AnswerOptions extends Conversation {
  readonly state: StatePort;
  readonly platform: Platform;
  readonly clock: Clock;
  readonly log: Log;
  /** Aborted when there is no time left. */
  readonly signal: AbortSignal;
}

/**
 * Answers one arrival: what has to be kept is kept first, then the replies are sent. Never rejects: what fails is
 * logged. Gives back whether the arrival is done with; if not, the platform has to deliver it again.
 */
export async function answerArrival(arrival: Arrival, options: AnswerOptions): Promise<boolean> {
  const { handle, say, state, platform, clock, log, signal, audit } = options;
  const { message, chatId, updateId, tapId } = arrival;
  if (signal.aborted) return false;
  const told = tapId === undefined ? undefined : tellTapSeen(tapId, options);
  try {
    const { writes, replies, answers } = handle(message, await state.load(message));
    const said = replies.map(say);
    await state.commit(writes);
    // Before the answer, but an acknowledgement that is slow to come holds nothing up.
    if (told !== undefined) await Promise.race([told, clock.wait(LONGEST_TAP_WAIT_MS)]);
    const sent = await sendReplies(chatId, said, { api: platform.patient, log, signal });
    audit?.(answers);
    return sent === 'ended';
  } catch (error) {
    log.error({ err: error, update: updateId }, 'a message could not be answered');
    const sorry = [say(faultReply(message.language))];
    return (await sendReplies(chatId, sorry, { api: platform.patient, log, signal })) === 'ended';
  }
}

/** Ends the waiting mark on a tapped button. One try: the answer itself counts, and an old tap is refused anyway. */
const tellTapSeen = async (tapId: string, { platform, log, signal }: AnswerOptions): Promise<void> => {
  try {
    await platform.once.answerCallbackQuery(tapId, {}, clientSignal(signal));
  } catch (error) {
    log.debug({ failure: failureOf(error) }, 'a tap could not be acknowledged');
  }
};
