import type { Mailbox } from '../../core/cellar/mailbox.ts';
import type { Meter } from '../http/meter.ts';
import { makeHandling, type AnswerOptions } from './answer-arrival.ts';
import { createInbox, type Inbox } from './inbox.ts';
import { createOutbox, type Outbox } from './outbox.ts';
import type { Limits } from './pace.ts';
import type { Platform } from './platform.ts';
import { sendPost } from './send-post.ts';
import { makeTellTapSeen } from './tell-tap-seen.ts';

/** What inbox and outbox are joined from. */
export interface MailOptions extends Omit<AnswerOptions, 'send' | 'sendNow' | 'tellTapSeen' | 'store'> {
  readonly store: AnswerOptions['store'] & Mailbox;
  readonly platform: Platform;
  readonly limits: Limits;
  readonly meter: Meter;
}

/** What comes in, and what goes out. */
export interface Mail {
  readonly inbox: Inbox;
  readonly outbox: Outbox;
  /** Whether so much is in hand that more has to stay with the platform. */
  readonly isFull: () => boolean;
}

const MOST_IN_HAND = 2000;
const MOST_UNSENT = 5000;

/** Joins what arrives to its answer, and the answer to what is sent. */
export function joinMail(options: MailOptions): Mail {
  const { platform, log, signal } = options;
  const sending = { api: platform.sends, signal };
  const outbox = createOutbox({ ...options, send: (post) => sendPost(post, sending) });
  const handling = makeHandling({
    ...options,
    send: outbox.add,
    sendNow: async (posts) => {
      for (const post of posts) await sendPost(post, sending);
    },
    tellTapSeen: makeTellTapSeen({ api: platform.calls, log, signal }),
  });
  const inbox = createInbox({ ...options, handling });
  return {
    inbox,
    outbox,
    isFull: () => inbox.count() > MOST_IN_HAND || outbox.count() > MOST_UNSENT,
  };
}
