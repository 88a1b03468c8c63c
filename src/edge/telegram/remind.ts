import type { CellarStore } from '../../core/cellar/cellar-store.ts';
import type { Post } from '../../core/cellar/mailbox.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { runReminders } from '../reminders/run-reminders.ts';
import type { WakeUp } from '../reminders/wake-up.ts';
import type { ServeDue } from '../serve-due.ts';
import { toPosts } from './to-posts.ts';
import { forgetTopic, topicOf } from './topics.ts';
import { chatIdOf } from './who-of.ts';

/** What reminding on this platform needs. */
export interface RemindOptions {
  readonly serveDue: ServeDue;
  readonly store: Pick<CellarStore, 'nextDue' | 'takeDue' | 'look'>;
  readonly wakeUp: WakeUp;
  /** Takes what is to be sent, once it is durable. */
  readonly send: (posts: readonly Post[]) => void;
  readonly clock: Clock;
  readonly log: Log;
  readonly signal: AbortSignal;
}

/** Says what falls due: the turn that notes that it was said also writes what is to be sent. Never rejects. */
export function remind({ serveDue, send, ...options }: RemindOptions): Promise<void> {
  const { clock, store } = options;
  return runReminders({
    ...options,
    say: async (due) => {
      // A chat of another platform is for whoever serves that one.
      if (chatIdOf(due.chat) === undefined) return;
      let posts: Post[] = [];
      const threadId = await topicOf(due, store);
      await serveDue(due, clock.now(), ({ said, chat }, writes) => {
        const chatId = chatIdOf(chat);
        if (chatId === undefined) return [];
        const to = `due ${due.cellar} ${due.id} ${due.at}`;
        const spot = { chatId, ...(threadId !== undefined && { threadId }) };
        posts = toPosts(said, { spot, to, now: clock.now() });
        return [...posts.map((post) => ({ kind: 'post', post }) as const), ...forgetTopic(due, writes)];
      });
      send(posts);
    },
  });
}
