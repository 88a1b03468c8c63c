import type { Mailbox, Post } from '../../core/cellar/mailbox.ts';
import type { Clock } from '../clock.ts';
import type { Log } from '../logging.ts';
import { NO_METER, type Depth, type Meter } from '../http/meter.ts';
import { CHANNEL } from './channel.ts';
import { mergePosts, type Parcel } from './merge-posts.ts';
import { createGate, createWindow, type Limits, type Passed, type Window } from './pace.ts';
import type { Sent } from './send-post.ts';
import { makeSettleTogether } from './settle-together.ts';
import { createSlowDowns } from './slow-downs.ts';

/** What sending needs. */
export interface OutboxOptions {
  readonly store: Pick<Mailbox, 'settle' | 'readdress'>;
  readonly send: (parcel: { readonly chat: string; readonly body: string }) => Promise<Sent>;
  readonly limits: Limits;
  readonly clock: Clock;
  readonly log: Log;
  readonly meter?: Meter;
  /** Told that a group has got another name: its cellar goes with it. */
  readonly onMoved?: (from: string, to: string) => void;
  /** Aborted when there is no time left: what is not sent stays in the store. */
  readonly signal: AbortSignal;
}

/** Sends what is durable, in order within a chat and side by side across chats. */
export interface Outbox {
  /** Takes posts that the store keeps. */
  readonly add: (posts: readonly Post[]) => void;
  /** Resolves when something that is no post, as a file, may be sent to a chat. */
  readonly pass: (chat: string) => Promise<Passed>;
  readonly count: () => number;
  readonly depth: () => Depth;
  /** Resolves when nothing waits, or when there is no time left. */
  readonly idle: () => Promise<void>;
}

/** A chat that something waits for. */
interface Lane {
  chat: string;
  readonly posts: Post[];
  /** Nothing is sent before then, in milliseconds since 1970. */
  notBefore: number;
  failures: number;
}

/** Waits after a sending that failed, in seconds. */
const WAITS_S = [1, 2, 4, 8, 15, 30] as const;
const LONGEST_WAIT_S = 30;
/** So many windows of chats are remembered before those that are open again are dropped. */
const MOST_WINDOWS = 5000;

/** Makes an outbox; a chat for which nothing waits takes next to no memory. */
export function createOutbox(options: OutboxOptions): Outbox {
  const { store, send, limits, clock, log, signal, onMoved, meter = NO_METER } = options;
  const lanes = new Map<string, Lane>();
  const running = new Set<Promise<void>>();
  const windows = new Map<string, Window>();
  const gate = createGate(createWindow(limits.all), clock);
  const slowDowns = createSlowDowns();
  let count = 0;

  const windowOf = (chat: string): Window => {
    const known = windows.get(chat);
    if (known !== undefined) return known;
    if (windows.size >= MOST_WINDOWS)
      for (const [name, { opensAt }] of windows)
        if (opensAt(clock.now()) <= clock.now()) windows.delete(name);
    // The platform gives groups negative numbers.
    const made = createWindow(chat.startsWith('-') ? limits.group : limits.person);
    windows.set(chat, made);
    return made;
  };

  /** Waits until the chat may get something; tells whether it had to. */
  const waitForChat = async (lane: Pick<Lane, 'chat' | 'notBefore'>): Promise<boolean> => {
    const opensAt = Math.max(windowOf(lane.chat).opensAt(clock.now()), lane.notBefore);
    const wait_ms = opensAt - clock.now();
    if (wait_ms > 0) await clock.wait(wait_ms, signal);
    return wait_ms > 0;
  };

  const passGate = async (chat: string): Promise<Passed> => {
    const passed = await gate.pass(signal);
    const inChat = windowOf(chat).note(clock.now());
    return {
      arrived: () => {
        passed.arrived();
        inChat.arrived(clock.now());
      },
    };
  };

  const run = async (lane: Lane): Promise<void> => {
    for (;;) {
      const waited = await waitForChat(lane);
      const passed = await passGate(lane.chat);
      const [first] = lane.posts;
      if (first === undefined || signal.aborted) break;
      const parcel = waited ? mergePosts(first, lane.posts) : { posts: [first], body: first.body };
      const sent = await send({ chat: lane.chat, body: parcel.body });
      passed.arrived();
      if (sent.kind === 'sent') meter.sent();
      else if (!signal.aborted) meter.refused(sent.kind);
      await react(lane, parcel, sent);
      if (lane.posts.length === 0) break;
    }
    if (lane.posts.length === 0 && lanes.get(lane.chat) === lane) lanes.delete(lane.chat);
  };

  const react = async (lane: Lane, parcel: Parcel, sent: Sent): Promise<void> => {
    const { chat } = lane;
    if (sent.kind === 'sent') slowDowns.succeeded();
    switch (sent.kind) {
      case 'sent':
        lane.failures = 0;
        return settle(lane, parcel.posts);
      case 'slow down': {
        const until = clock.now() + 1000 * sent.wait_s;
        lane.notBefore = until;
        if (slowDowns.note(chat)) gate.closeUntil(until);
        return log.warn({ wait_s: sent.wait_s }, 'the Bot API asks us to slow down');
      }
      case 'failed': {
        if (signal.aborted) return;
        lane.notBefore = clock.now() + 1000 * (WAITS_S[lane.failures] ?? LONGEST_WAIT_S);
        lane.failures += 1;
        return log.warn({ failure: sent.failure }, 'a message could not be sent yet');
      }
      case 'closed':
        log.info({ failure: sent.failure }, 'a chat takes nothing from us any more');
        return settle(lane, [...lane.posts]);
      case 'moved':
        return move(lane, sent.chat);
      case 'refused':
        log.error({ failure: sent.failure }, 'a message could not be sent');
        return settle(lane, parcel.posts);
    }
  };

  /** Durable before the next one of the chat leaves, so that after a crash one at most is sent again. */
  const settle = async (lane: Lane, posts: readonly Post[]): Promise<void> => {
    const ids = posts.map(({ id }) => id);
    await settleTogether(ids, lane.posts.length > posts.length);
    lane.posts.splice(0, posts.length);
    count -= posts.length;
  };

  const settleTogether = makeSettleTogether((ids) => persist(() => store.settle(CHANNEL, ids)), clock);

  const move = async (lane: Lane, chat: string): Promise<void> => {
    const { chat: from, posts } = lane;
    const ids = posts.map(({ id }) => id);
    await persist(() => store.readdress(CHANNEL, ids, chat));
    onMoved?.(from, chat);
    lanes.delete(from);
    count -= posts.length;
    add(posts.splice(0).map((post) => ({ ...post, chat })));
  };

  /** What was sent is not sent again by this process, however long the store takes to keep that it was. */
  const persist = async (write: () => Promise<void>): Promise<void> => {
    for (let failures = 0; !signal.aborted; failures += 1) {
      try {
        return await write();
      } catch (err) {
        log.error({ err }, 'what was sent could not be noted');
        await clock.wait(1000 * (WAITS_S[failures] ?? LONGEST_WAIT_S), signal);
      }
    }
  };

  const add = (posts: readonly Post[]): void => {
    count += posts.length;
    for (const post of posts) {
      const known = lanes.get(post.chat);
      if (known !== undefined) {
        known.posts.push(post);
        continue;
      }
      const lane: Lane = { chat: post.chat, posts: [post], notBefore: -Infinity, failures: 0 };
      lanes.set(post.chat, lane);
      const run_ = run(lane).catch((err: unknown) => log.error({ err }, 'sending to a chat failed'));
      running.add(run_);
      void run_.then(() => running.delete(run_));
    }
  };

  return {
    add,
    pass: async (chat) => {
      while (await waitForChat({ chat, notBefore: lanes.get(chat)?.notBefore ?? -Infinity }))
        if (signal.aborted) break;
      return passGate(chat);
    },
    count: () => count,
    depth: () => {
      const firsts = [...lanes.values()].flatMap(({ posts: [first] }) =>
        first === undefined ? [] : [first],
      );
      if (firsts.length === 0) return { count };
      return { count, oldest_at: Math.min(...firsts.map(({ at }) => at)) };
    },
    idle: async () => {
      while (running.size > 0) await Promise.all(running);
    },
  };
}
