import type { Write } from '../../../core/cellar/cellar-store.ts';
import type { Arrived, Mailbox, Post } from '../../../core/cellar/mailbox.ts';
import type { Undoable } from './undoable.ts';

/** Something that arrived, and what became of it. */
interface ArrivedKept extends Arrived {
  readonly tries: number;
  readonly handled_at?: number;
  readonly cause?: string;
}

/** What came in and what is to be sent, by the channel and the name in it. */
export interface MemoryMail {
  readonly arrived: Map<string, ArrivedKept>;
  /** In the order in which they were written. */
  readonly posts: Map<string, Post>;
}

const keyOf = (channel: string, name: string | number): string => JSON.stringify([channel, name]);

/** A mailbox with nothing in it. */
export const emptyMail = (): MemoryMail => ({ arrived: new Map(), posts: new Map() });

/** The mailbox of a store in memory. */
export function createMemoryMailbox({ arrived: all, posts }: MemoryMail): Mailbox {
  const arrivedOf = (channel: string): ArrivedKept[] =>
    [...all.values()].filter((one) => one.channel === channel);
  return {
    receive: async (arrived, onWritten) => {
      const fresh = arrived.filter((one) => {
        const key = keyOf(one.channel, one.number);
        if (all.has(key)) return false;
        all.set(key, { ...one, tries: 0 });
        return true;
      });
      onWritten?.(fresh);
      return fresh;
    },
    waiting: async (channel) =>
      arrivedOf(channel)
        .filter(({ handled_at }) => handled_at === undefined)
        .sort((one, other) => one.number - other.number)
        .map(({ number, body, received_at, tries }) => ({ channel, number, body, received_at, tries })),
    countTry: async (channel, numbers) => {
      for (const one of numbers.map((number) => all.get(keyOf(channel, number))))
        if (one !== undefined) all.set(keyOf(channel, one.number), { ...one, tries: one.tries + 1 });
    },
    posts: async (channel) => [...posts.values()].filter((post) => post.channel === channel),
    settle: async (channel, ids) => {
      for (const id of ids) posts.delete(keyOf(channel, id));
    },
    readdress: async (channel, ids, chat) => {
      for (const key of ids.map((id) => keyOf(channel, id))) {
        const post = posts.get(key);
        if (post !== undefined) posts.set(key, { ...post, chat });
      }
    },
    prune: async (channel, { handled_at: handledBefore, aside_at: asideBefore, most }) => {
      const ended = arrivedOf(channel).sort((one, other) => (one.handled_at ?? 0) - (other.handled_at ?? 0));
      const isOld = ({ handled_at = Infinity, cause }: ArrivedKept, isAside: boolean): boolean =>
        (cause !== undefined) === isAside && handled_at < (isAside ? asideBefore : handledBefore);
      const gone = [false, true].flatMap((isAside) =>
        ended.filter((one) => isOld(one, isAside)).slice(0, most),
      );
      for (const one of gone) all.delete(keyOf(channel, one.number));
      return gone.length;
    },
  };
}

/** Writes what a turn says of posts and of what arrived. `now` is milliseconds since 1970. */
export function writeMail(
  mail: MemoryMail,
  write: Extract<Write, { kind: 'post' | 'handled' }>,
  { change, now }: { readonly change: Undoable; readonly now: number },
): void {
  if (write.kind === 'post') {
    const key = keyOf(write.post.channel, write.post.id);
    if (!mail.posts.has(key)) change.set(mail.posts, key, { ...write.post });
    return;
  }
  const { channel, number, cause } = write;
  const key = keyOf(channel, number);
  const one = mail.arrived.get(key);
  if (one === undefined || one.handled_at !== undefined)
    throw new RangeError(`${channel} ${number} does not wait to be handled`);
  const kept = cause === undefined ? { body: '' } : { cause };
  change.set(mail.arrived, key, { ...one, ...kept, handled_at: now });
}
