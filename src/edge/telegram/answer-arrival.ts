import type { CellarStore, Write } from '../../core/cellar/cellar-store.ts';
import type { Post } from '../../core/cellar/mailbox.ts';
import { asideReply, faultReply } from '../../chat/conversation/fault-reply.ts';
import { leftReply } from '../../chat/conversation/left-reply.ts';
import type { Errand, IncomingMessage } from '../../chat/conversation/ports.ts';
import type { Reply } from '../../chat/replies/reply.ts';
import { joinReply } from '../../chat/conversation/join-reply.ts';
import type { Said, Say } from '../../chat/replies/say.ts';
import type { Audit } from '../audit-workings.ts';
import type { Clock } from '../clock.ts';
import { NO_METER, type Meter } from '../http/meter.ts';
import type { Log } from '../logging.ts';
import type { ServeTurn } from '../serve-message.ts';
import { StoreError } from '../store/store-error.ts';
import { makeTakeTurns } from '../store/take-turns.ts';
import type { Arrival } from './arrival.ts';
import type { CarryFiles } from './carry-files.ts';
import { CHANNEL } from './channel.ts';
import type { Handling } from './inbox.ts';
import { toPosts } from './to-posts.ts';
import { noteTopics } from './topics.ts';

/** What answering needs. */
export interface AnswerOptions {
  readonly serve: ServeTurn;
  readonly say: Say;
  readonly store: Pick<CellarStore, 'turn'>;
  /** Checks the workings once their replies are on their way. */
  readonly audit?: Audit;
  /** Takes what is to be sent, once it is durable. */
  readonly send: (posts: readonly Post[]) => void;
  /** Sends past the store, where that one fails. One try; never rejects. */
  readonly sendNow: (posts: readonly Post[]) => Promise<void>;
  readonly files: CarryFiles;
  /** Whether the bot serves this chat; absent: it serves any. */
  readonly isAdmitted?: (message: IncomingMessage) => Promise<boolean>;
  /** Ends the waiting mark on a tapped button. Never rejects. */
  readonly tellTapSeen: (tapId: string) => Promise<void>;
  readonly meter?: Meter;
  readonly clock: Clock;
  readonly log: Log;
  /** Aborted when there is no time left. */
  readonly signal: AbortSignal;
}

/** Waits between the tries of an answer that fails, in milliseconds: three tries in all. */
const TRY_WAITS_MS = [200, 1000] as const;
/** Waits while the store fails, in milliseconds. */
const STORE_WAITS_MS = [1000, 5000, 15_000, 60_000] as const;
const LONGEST_STORE_WAIT_MS = 60_000;
/** A cause is cut: it is for a look at it, and the log has the whole. */
const LONGEST_CAUSE = 500;

/**
 * Makes the handling of what arrived: served in a turn that also writes the posts and that it is handled, so that
 * nothing is answered twice and everything is answered.
 */
export function makeHandling(options: AnswerOptions): Handling {
  const {
    serve,
    say,
    store,
    audit,
    send,
    sendNow,
    files,
    tellTapSeen,
    clock,
    log,
    signal,
    isAdmitted = async () => true,
    meter = NO_METER,
  } = options;
  const errandTurns = makeTakeTurns();
  const errands = new Set<Promise<void>>();

  const answer = async (arrival: Arrival): Promise<void> => {
    if (arrival.tapId !== undefined) void tellTapSeen(arrival.tapId);
    if (arrival.isJoin) return greetGroup(arrival);
    const begun = performance.now();
    let failure: unknown;
    for (const wait_ms of [0, ...TRY_WAITS_MS]) {
      if (wait_ms > 0) await clock.wait(wait_ms, signal);
      if (signal.aborted) return;
      let posts: Post[] = [];
      try {
        const message = arrival.file === undefined ? arrival.message : await files.read(arrival);
        const {
          answers,
          errand,
          message: handledIn,
        } = await serve(message, (served, writes) => {
          posts = toPosts(served.said, { spot: arrival, to: message.id, now: clock.now() });
          // With an errand it is handled when that is done: should the process end before, it is done once more.
          const ended = served.errand === undefined ? [handled(arrival)] : [];
          return [...ended, ...posts.map(writePost), ...noteTopics(arrival, writes)];
        });
        send(posts);
        audit?.(answers);
        if (errand !== undefined) return startErrand(arrival, errand, handledIn ?? message);
        return meter.handled('answered', (performance.now() - begun) / 1000);
      } catch (error) {
        failure = error;
        // What could not be kept the platform brings again.
        if ((await arrival.isKept) === false) return;
      }
    }
    await putAside(arrival, failure);
  };

  const greetGroup = async (arrival: Arrival): Promise<void> => {
    const { message, isKept } = arrival;
    if ((await isKept) === false) return;
    // Among strangers nothing is said.
    const isWelcome = await isAdmitted(message).catch(() => false);
    await end([arrival], isWelcome ? [say(joinReply(message.language))] : []);
  };

  /** One errand of a chat after the other, while what is said there goes on being answered. */
  const startErrand = (arrival: Arrival, errand: Errand, message: IncomingMessage): void => {
    const done = errandTurns(String(arrival.chatId), () => runErrand(arrival, errand, message));
    errands.add(done);
    void done.finally(() => errands.delete(done));
  };

  /** Off the turn, as it takes long. At a stop it is left, and done anew by the next process. */
  const runErrand = async (arrival: Arrival, errand: Errand, message: IncomingMessage): Promise<void> => {
    const begun = performance.now();
    const said = await Promise.race([files.run(arrival, errand, message), aborted(signal)]);
    if (said === undefined) return;
    await end([arrival], said);
    meter.handled('answered', (performance.now() - begun) / 1000);
  };

  const putAside = async (arrival: Arrival, cause: unknown): Promise<void> => {
    log.error({ err: cause, update: arrival.updateId }, 'a message could not be answered');
    const { language } = arrival.message;
    const reply = cause instanceof StoreError ? faultReply(language, true) : asideReply(language);
    meter.handled('aside', 0);
    await end([arrival], sayTo([arrival], reply), String(cause).slice(0, LONGEST_CAUSE));
  };

  const leave: Handling['leave'] = async (arrivals) => {
    log.warn({ left: arrivals.length }, 'messages of long ago are left unread');
    for (const _ of arrivals) meter.handled('left', 0);
    const meant = arrivals.filter(isForUs);
    await end(arrivals, sayTo(arrivals, leftReply(arrivals[0].message.language, meant.length)));
  };

  /** Nothing is said of what was not for us. */
  const sayTo = (arrivals: readonly Arrival[], reply: Reply): Said[] =>
    arrivals.some(isForUs) ? [say(reply)] : [];

  /** Ends what is not answered by its turn, and says so. */
  const end = async (
    arrivals: readonly [Arrival, ...Arrival[]],
    toSay: readonly Said[],
    cause?: string,
  ): Promise<void> => {
    const [arrival] = arrivals;
    const { message } = arrival;
    const posts = toPosts(toSay, { spot: arrival, to: `${message.id} ended`, now: clock.now() });
    const done = arrivals.map((one) => handled(one, cause));
    for (let failures = 0; !signal.aborted; failures += 1) {
      // What was sent past the store is not sent a second time.
      const said = failures === 0 ? posts : [];
      try {
        const writes = [...done, ...said.map(writePost)];
        await store.turn(message.cellar, async () => ({ writes, result: undefined }));
        return send(said);
      } catch (err) {
        log.error({ err }, 'the store failed');
        if (failures === 0) await sendNow(posts);
        await clock.wait(STORE_WAITS_MS[failures] ?? LONGEST_STORE_WAIT_MS, signal);
      }
    }
  };

  return { answer, leave, putAside, idle: async () => void (await Promise.all(errands)) };
}

const isForUs = ({ message, isJoin }: Arrival): boolean => message.addressed !== 'overheard' && !isJoin;

const aborted = (signal: AbortSignal): Promise<undefined> =>
  new Promise((resolve) => {
    if (signal.aborted) resolve(undefined);
    else signal.addEventListener('abort', () => resolve(undefined), { once: true });
  });

const handled = ({ updateId }: Arrival, cause?: string): Write => ({
  kind: 'handled',
  channel: CHANNEL,
  number: updateId,
  ...(cause !== undefined && { cause }),
});

const writePost = (post: Post): Write => ({ kind: 'post', post });
