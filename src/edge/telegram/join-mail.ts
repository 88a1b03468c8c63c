import type { Mailbox } from '../../core/cellar/mailbox.ts';
import type { Meter } from '../http/meter.ts';
import { makeHandling, type AnswerOptions } from './answer-arrival.ts';
import { makeAnswerTyped, type TypedOptions } from './answer-typed.ts';
import { createInbox, type Inbox } from './inbox.ts';
import { makeCarryFiles, type CarryOptions } from './make-carry-files.ts';
import type { Me } from './me.ts';
import { createOutbox, type Outbox } from './outbox.ts';
import type { Limits } from './pace.ts';
import type { Platform } from './platform.ts';
import type { Receipts } from './receipts.ts';
import { sendPost } from './send-post.ts';
import { makeTellTapSeen } from './tell-tap-seen.ts';
import { chatNameOf } from './who-of.ts';

/** What inbox and outbox are joined from. */
export interface MailOptions
  extends
    Omit<AnswerOptions, 'send' | 'sendNow' | 'tellTapSeen' | 'store' | 'files'>,
    Pick<CarryOptions, 'fileWork' | 'config' | 'progress_s'>,
    Pick<TypedOptions, 'typedWork'> {
  readonly me: Me;
  /** A group goes by another name; resolves when its cellar has gone with it. Names are the conversation's. */
  readonly migrateChat?: (from: string, to: string) => Promise<void>;
  readonly store: AnswerOptions['store'] & Mailbox;
  readonly platform: Platform;
  readonly limits: Limits;
  readonly meter: Meter;
  readonly receipts: Receipts;
}

/** What comes in, and what goes out. */
export interface Mail {
  readonly inbox: Inbox;
  readonly outbox: Outbox;
  /** Whether so much is in hand that more has to stay with the platform. */
  readonly isFull: () => boolean;
}

const MOST_IN_HAND = 400;
const MOST_UNSENT = 5000;

/** Joins what arrives to its answer, and the answer to what is sent. */
export function joinMail(options: MailOptions): Mail {
  const { platform, log, signal, migrateChat, fileWork, receipts } = options;
  const sending = { api: platform.sends, receipts, signal };
  const move = async (from: number, to: number): Promise<void> =>
    migrateChat?.(chatNameOf(from), chatNameOf(to));
  const outbox = createOutbox({
    ...options,
    send: (post) => sendPost(post, sending),
    onMoved: (from, to) => {
      move(Number(from), Number(to)).catch((err: unknown) =>
        log.error({ err }, 'a group could not be moved'),
      );
    },
  });
  const handling = makeHandling({
    ...options,
    send: outbox.add,
    sendNow: async (posts) => {
      for (const post of posts) await sendPost(post, sending);
    },
    files: makeCarryFiles({ ...options, pass: outbox.pass }),
    ...(fileWork !== undefined && { isAdmitted: fileWork.isAdmitted }),
    tellTapSeen: makeTellTapSeen({ api: platform.calls, log, signal }),
  });
  const answerTyped = makeAnswerTyped(options);
  const inbox = createInbox({
    ...options,
    handling,
    onMoved: move,
    onTyped: (query) => void answerTyped(query),
  });
  return {
    inbox,
    outbox,
    isFull: () => inbox.count() > MOST_IN_HAND || outbox.count() > MOST_UNSENT,
  };
}
