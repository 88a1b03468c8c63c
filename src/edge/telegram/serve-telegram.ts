import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { Audit } from '../audit-workings.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import type { WakeUp } from '../reminders/wake-up.ts';
import type { ServeDue } from '../serve-due.ts';
import type { ServeTurn } from '../serve-message.ts';
import type { TypedWork } from './answer-typed.ts';
import { createBackOff } from './back-off.ts';
import { CHANNEL } from './channel.ts';
import { confirmOffset } from './confirm-offset.ts';
import { greet } from './greet.ts';
import { joinMail } from './join-mail.ts';
import { keepReceipts, readReceipts } from './kept-receipts.ts';
import type { FileWork } from './make-carry-files.ts';
import { openDoor, type DoorAddress } from './open-door.ts';
import { USUAL_LIMITS, type Limits } from './pace.ts';
import { openPlatform } from './platform.ts';
import { poll } from './poll.ts';
import { pruneNowAndThen } from './prune-now-and-then.ts';
import { createReceipts } from './receipts.ts';
import { remind } from './remind.ts';
import { showCommands } from './show-commands.ts';

/** Everything that serving Telegram needs, handed in. */
export interface TelegramOptions {
  readonly serve: ServeTurn;
  readonly say: Say;
  readonly store: CellarStore;
  /** Says what falls due; without it nothing is said unasked. */
  readonly reminding?: { readonly serveDue: ServeDue; readonly wakeUp: WakeUp };
  /** Checks the workings once their replies are on their way. */
  readonly audit?: Audit;
  readonly log: Log;
  readonly clock: Clock;
  readonly config: { readonly botToken: string; readonly botApiRoot: string };
  /** Where others reach us; without a webhook in it updates are polled. */
  readonly door?: DoorAddress;
  /** Shows the operator a sentence. */
  readonly tell: (sentence: string) => void;
  /** Aborted when the program is asked to stop. */
  readonly signal: AbortSignal;
  readonly limits?: Limits;
  /** Absent: files are neither read nor sent. */
  readonly fileWork?: FileWork;
  /** Absent: nothing is answered outside the chats that the bot is in. */
  readonly typedWork?: TypedWork;
  /** Takes the cellar of a group along when that gets another name. */
  readonly migrateChat?: (from: string, to: string) => Promise<void>;
  readonly times?: Partial<Times>;
}

/** How long things may take, in seconds. */
export interface Times {
  readonly longPoll_s: number;
  readonly callTimeout_s: number;
  readonly sendTimeout_s: number;
  readonly watchdog_s: number;
  /** Somebody who waits for a file longer than this is told that it is worked on. */
  readonly progress_s: number;
  /** After the signal: for what is in hand, then for telling the platform. Together within 8 s. */
  readonly finish_s: number;
  readonly confirm_s: number;
}

const USUAL_TIMES: Times = {
  longPoll_s: 30,
  callTimeout_s: 45,
  sendTimeout_s: 20,
  watchdog_s: 60,
  progress_s: 0.5,
  finish_s: 6,
  confirm_s: 1.5,
};

/**
 * Serves chats until the signal is aborted, then finishes what is in hand; what there is no time for stays in
 * the store.
 *
 * @throws OperatorError when the platform does not accept the token, or the port cannot be had.
 */
export async function serveTelegram(options: TelegramOptions): Promise<void> {
  const { store, log, clock, config, tell, signal, limits = USUAL_LIMITS, reminding } = options;
  const times = { ...USUAL_TIMES, ...options.times };
  const { botToken: token, botApiRoot: root } = config;
  const platform = openPlatform({ token, root, ...times });
  const giveUp = new AbortController();
  const door = await openDoor({ ...options, platform });
  const background: Promise<void>[] = [];
  try {
    const backOff = createBackOff({ root, clock, log, tell, signal });
    const me = await greet(platform, { backOff, log, tell, signal });
    if (me === undefined) return;
    const receipts = createReceipts(await readReceipts(store));
    const { meter } = door;
    const { progress_s } = times;
    const mail = joinMail({
      ...options,
      me,
      platform,
      limits,
      meter,
      receipts,
      progress_s,
      signal: giveUp.signal,
    });
    const { inbox, outbox } = mail;
    door.watch(mail);
    void showCommands({ ...options, platform });
    background.push(pruneNowAndThen({ store, clock, log, signal }));
    outbox.add(await store.posts(CHANNEL));
    await inbox.recover();
    if (reminding !== undefined)
      background.push(remind({ ...reminding, store, send: outbox.add, clock, log, signal }));
    let offset = 0;
    if (door.takeUpdates !== undefined) await door.takeUpdates({ backOff, signal });
    else offset = await poll({ api: platform.calls, ...mail, backOff, clock, ...times, signal });
    const finished = Promise.all([inbox.idle(), ...background]).then(outbox.idle);
    await Promise.race([finished, clock.wait(1000 * times.finish_s, giveUp.signal)]);
    giveUp.abort();
    await Promise.all([inbox.idle(), outbox.idle()]);
    await keepReceipts(receipts.all(), { store, clock }).catch((err: unknown) =>
      log.warn({ err }, 'the numbers of the last messages could not be kept'),
    );
    const [left, unsent] = [inbox.count(), outbox.count()];
    if (left + unsent > 0) log.warn({ left, unsent }, 'there was no time left for some messages');
    await confirmOffset(offset, { api: platform.calls, clock, log, within_s: times.confirm_s });
  } finally {
    giveUp.abort();
    await door.close();
    platform.close();
  }
}
