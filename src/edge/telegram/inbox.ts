import type { Mailbox, Waiting } from '../../core/cellar/mailbox.ts';
import type { Clock } from '../clock.ts';
import { NO_METER, type Depth, type Meter } from '../http/meter.ts';
import { CHANNEL } from './channel.ts';
import { createChatQueues } from './chat-queues.ts';
import type { Arrival } from './arrival.ts';
import type { Me } from './me.ts';
import { toMessage } from './to-message.ts';
import type { TelegramInlineQuery, TelegramUpdate } from './update.ts';

/** What receiving needs. */
export interface InboxOptions {
  readonly store: Pick<Mailbox, 'receive' | 'waiting' | 'countTry'>;
  readonly handling: Handling;
  readonly me: Me;
  /** Told that a group goes by another name; resolves when its cellar has gone with it. */
  readonly onMoved?: (from: number, to: number) => Promise<void>;
  /** Told what is typed behind our name: it is answered at once or never, and nothing of it is kept. */
  readonly onTyped?: (query: TelegramInlineQuery) => void;
  readonly clock: Clock;
  readonly meter?: Meter;
  /** Aborted when there is no time left: what is not handled stays in the store. */
  readonly signal: AbortSignal;
}

/** What becomes of what arrived. None of these rejects. */
export interface Handling {
  readonly answer: (arrival: Arrival) => Promise<void>;
  /** Leaves unread what is too old, all of one chat. */
  readonly leave: (arrivals: readonly [Arrival, ...Arrival[]]) => Promise<void>;
  /** Puts aside what cannot be answered. */
  readonly putAside: (arrival: Arrival, cause: unknown) => Promise<void>;
  /** Resolves when the errands of what was answered are done, or when there is no time left. */
  readonly idle: () => Promise<void>;
}

/** Keeps what arrives until it is handled: in order within a chat, side by side across chats. */
export interface Inbox {
  /** Resolves when it is durable; only then may the platform be told. Rejects where the store fails. */
  readonly receive: (updates: readonly TelegramUpdate[]) => Promise<void>;
  /** Takes up what an earlier process has left. */
  readonly recover: () => Promise<void>;
  readonly count: () => number;
  readonly depth: () => Depth;
  /** Resolves when nothing is in hand, or when there is no time left. */
  readonly idle: () => Promise<void>;
}

/** What was in hand alone in so many processes that ended badly is what ended them. */
const MOST_TRIES = 4;
/** What was sent longer ago is answered no more: the wine is another by now. */
const STALE_MS = 12 * 60 * 60 * 1000;

/** Makes an inbox. */
export function createInbox(options: InboxOptions): Inbox {
  const { store, handling, me, onMoved, onTyped, clock, meter = NO_METER, signal } = options;
  const isStale = ({ message }: Arrival): boolean => message.at < clock.now() - STALE_MS;
  const queues = createChatQueues<Arrival>(async (queue) => {
    if (signal.aborted) return 0;
    const [first] = queue;
    const fresh = queue.findIndex((arrival) => !isStale(arrival));
    const stale = fresh === -1 ? [...queue] : queue.slice(0, fresh);
    if (stale.length === 0) {
      await handling.answer(first);
      return 1;
    }
    const areKept = await Promise.all(stale.map(async ({ isKept = true }) => isKept));
    // What could not be kept the platform brings again.
    const [oldest, ...others] = stale.filter((_, at) => areKept[at]);
    if (oldest !== undefined) await handling.leave([oldest, ...others]);
    return stale.length;
  });

  /** What may have ended the process before is handled alone, so that it harms nothing else. */
  const handleAlone = async (arrival: Arrival, { number, tries }: Waiting): Promise<void> => {
    await store.countTry(CHANNEL, [number]);
    if (isStale(arrival)) await handling.leave([arrival]);
    else if (tries < MOST_TRIES) await handling.answer(arrival).then(handling.idle);
    else await handling.putAside(arrival, new Error('the process ended while this was in hand'));
  };

  return {
    receive: async (updates) => {
      const received_at = clock.now();
      // Before anything else of the group is handled; what was done of it before does no harm.
      for (const [from, to] of updates.flatMap(moveOf)) await onMoved?.(from, to);
      for (const { inline_query: query } of updates) if (query !== undefined) onTyped?.(query);
      const known = new Map<number, Arrival>();
      const arrived = updates.flatMap((update) => {
        const arrival = toMessage(update, { received_at, me });
        // What needs no answer needs no memory: should it come again, it needs none again.
        if (arrival === undefined) return [];
        known.set(update.update_id, arrival);
        return [{ channel: CHANNEL, number: update.update_id, body: JSON.stringify(update), received_at }];
      });
      const { promise: isKept, resolve: tell } = Promise.withResolvers<boolean>();
      try {
        // Handled while it is written: what it writes then goes to the disk together with it.
        const fresh = await store.receive(arrived, (written) => {
          for (const { number } of written) {
            const arrival = known.get(number);
            if (arrival !== undefined) queues.add(arrival.chatId, { ...arrival, isKept });
          }
        });
        tell(true);
        meter.received(fresh.length);
      } catch (error) {
        tell(false);
        throw error;
      }
    },
    recover: async () => {
      const waiting = await store.waiting(CHANNEL);
      const left = waiting.flatMap((one) => {
        const arrival = toMessage(JSON.parse(one.body) as TelegramUpdate, {
          received_at: one.received_at,
          me,
        });
        return arrival === undefined ? [] : [{ one, arrival }];
      });
      for (const { one, arrival } of left)
        if (one.tries > 0 && !signal.aborted) await handleAlone(arrival, one);
      const others = left.filter(({ one }) => one.tries === 0);
      if (others.length === 0 || signal.aborted) return;
      await store.countTry(
        CHANNEL,
        others.map(({ one }) => one.number),
      );
      for (const { arrival } of others) queues.add(arrival.chatId, arrival);
    },
    count: queues.count,
    depth: queues.depth,
    idle: () => queues.idle().then(handling.idle),
  };
}

/** The old and the new name of a group, told in the old chat and in the new one. */
function moveOf({ message }: TelegramUpdate): (readonly [from: number, to: number])[] {
  if (message === undefined) return [];
  const { chat, migrate_to_chat_id: to, migrate_from_chat_id: from } = message;
  if (to !== undefined) return [[chat.id, to]];
  return from === undefined ? [] : [[from, chat.id]];
}
