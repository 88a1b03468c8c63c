import type { Audit } from '../audit-workings.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import type { Serve } from '../serve-message.ts';
import { answerArrival } from './answer-arrival.ts';
import { createBackOff } from './back-off.ts';
import { createChatQueues } from './chat-queues.ts';
import { confirmOffset } from './confirm-offset.ts';
import { greet } from './greet.ts';
import { createMemoryIntake, type Intake } from './intake.ts';
import { openPlatform } from './platform.ts';
import { poll } from './poll.ts';
import { toMessage } from './to-message.ts';
import type { TelegramUpdate } from './update.ts';

/** Everything that serving Telegram needs, handed in. */
export interface TelegramOptions {
  readonly serve: Serve;
  /** Checks the workings once their replies are sent. */
  readonly audit?: Audit;
  readonly log: Log;
  readonly clock: Clock;
  readonly config: { readonly botToken: string; readonly botApiRoot: string };
  /** Shows the operator a sentence. */
  readonly tell: (sentence: string) => void;
  /** Aborted when the program is asked to stop. */
  readonly signal: AbortSignal;
  readonly intake?: Intake;
  readonly times?: Partial<Times>;
}

/** How long things may take, in seconds. */
export interface Times {
  readonly longPoll_s: number;
  readonly callTimeout_s: number;
  readonly watchdog_s: number;
  /** After the signal: for what is in hand, then for telling the platform. Together within 8 s. */
  readonly finish_s: number;
  readonly confirm_s: number;
}

const USUAL_TIMES: Times = {
  longPoll_s: 30,
  callTimeout_s: 45,
  watchdog_s: 60,
  finish_s: 6.5,
  confirm_s: 1.5,
};

/**
 * Serves private chats by long polling until the signal is aborted, then finishes what is in hand.
 *
 * @throws OperatorError when the platform does not accept the token.
 */
export async function serveTelegram(options: TelegramOptions): Promise<void> {
  const { log, clock, config, tell, signal, intake = createMemoryIntake() } = options;
  const times = { ...USUAL_TIMES, ...options.times };
  const { botToken: token, botApiRoot: root } = config;
  const platform = openPlatform({ token, root, callTimeout_s: times.callTimeout_s, clock });
  const queues = createChatQueues();
  const giveUp = new AbortController();
  const answering = { ...options, platform, signal: giveUp.signal };
  const finish = (updateId: number): Promise<void> =>
    intake.done(updateId).catch((err: unknown) => log.error({ err, update: updateId }, 'the intake failed'));
  const accept = (update: TelegramUpdate): void => {
    const arrival = toMessage(update, clock.now());
    const { update_id: id } = update;
    // What is not answered still goes through a queue of its own, so that a stop waits for its end.
    queues.add(arrival?.chatId ?? 0, async () => {
      if (arrival === undefined || (await answerArrival(arrival, answering))) await finish(id);
    });
  };
  try {
    const backOff = createBackOff({ root, clock, log, tell, signal });
    if (!(await greet(platform, { backOff, log, tell, signal }))) return;
    const { longPoll_s, watchdog_s } = times;
    const polling = { api: platform.once, intake, accept, backOff, clock, longPoll_s, watchdog_s, signal };
    const offset = await poll(polling);
    await Promise.race([queues.idle(), clock.wait(1000 * times.finish_s, giveUp.signal)]);
    giveUp.abort();
    await queues.idle();
    const left = await intake.unfinished();
    if (left.length > 0) log.warn({ left: left.length }, 'there was no time left for some messages');
    await confirmOffset(left[0] ?? offset, { api: platform.once, clock, log, within_s: times.confirm_s });
  } finally {
    giveUp.abort();
    platform.close();
  }
}
