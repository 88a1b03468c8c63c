import type { CellarStore, Write } from '../../core/cellar/cellar-store.ts';
import type { Post } from '../../core/cellar/mailbox.ts';
import { asideReply, faultReply } from '../../chat/conversation/fault-reply.ts';
import { leftReply } from '../../chat/conversation/left-reply.ts';
import type { Language } from '../../chat/reader/understood.ts';
import type { Reply } from '../../chat/replies/reply.ts';
import type { Say } from '../../chat/replies/say.ts';
import type { Audit } from '../audit-workings.ts';
import type { Clock } from '../clock.ts';
import { NO_METER, type Meter } from '../http/meter.ts';
import type { Log } from '../logging.ts';
import type { ServeTurn } from '../serve-message.ts';
import { StoreError } from '../store/store-error.ts';
import { CHANNEL } from './channel.ts';
import type { Handling } from './inbox.ts';
import type { Arrival } from './to-message.ts';
import { toPosts } from './to-posts.ts';

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
    tellTapSeen,
    clock,
    log,
    signal,
    meter = NO_METER,
  } = options;

  const answer = async (arrival: Arrival): Promise<void> => {
    if (arrival.tapId !== undefined) void tellTapSeen(arrival.tapId);
    const begun = performance.now();
    let failure: unknown;
    for (const wait_ms of [0, ...TRY_WAITS_MS]) {
      if (wait_ms > 0) await clock.wait(wait_ms, signal);
      if (signal.aborted) return;
      let posts: Post[] = [];
      try {
        const { answers } = await serve(arrival.message, ({ said, errand }) => {
          // Files are not handed over here yet, and silence would be taken for work.
          const all = errand === undefined ? said : [...said, say(errandReply(arrival.message.language))];
          posts = toPosts(all, { ...arrival, to: arrival.message.id, now: clock.now() });
          return [handled(arrival), ...posts.map(writePost)];
        });
        send(posts);
        meter.handled('answered', (performance.now() - begun) / 1000);
        audit?.(answers);
        return;
      } catch (error) {
        failure = error;
      }
    }
    await putAside(arrival, failure);
  };

  const putAside = async (arrival: Arrival, cause: unknown): Promise<void> => {
    log.error({ err: cause, update: arrival.updateId }, 'a message could not be answered');
    const { language } = arrival.message;
    const reply = cause instanceof StoreError ? faultReply(language, true) : asideReply(language);
    meter.handled('aside', 0);
    await end([arrival], reply, String(cause).slice(0, LONGEST_CAUSE));
  };

  const leave: Handling['leave'] = async (arrivals) => {
    log.warn({ left: arrivals.length }, 'messages of long ago are left unread');
    for (const _ of arrivals) meter.handled('left', 0);
    await end(arrivals, leftReply(arrivals[0].message.language, arrivals.length));
  };

  /** Ends what is not answered as it should be, and says so. */
  const end = async (
    arrivals: readonly [Arrival, ...Arrival[]],
    reply: Reply,
    cause?: string,
  ): Promise<void> => {
    const [{ chatId, message }] = arrivals;
    const posts = toPosts([say(reply)], { chatId, to: `${message.id} ended`, now: clock.now() });
    const done = arrivals.map((arrival) => handled(arrival, cause));
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

  return { answer, leave, putAside };
}

const errandReply = (language: Language): Reply => ({
  language,
  lines: [{ room: 'first', key: 'errand-failed', values: {} }],
  buttons: [],
});

const handled = ({ updateId }: Arrival, cause?: string): Write => ({
  kind: 'handled',
  channel: CHANNEL,
  number: updateId,
  ...(cause !== undefined && { cause }),
});

const writePost = (post: Post): Write => ({ kind: 'post', post });
