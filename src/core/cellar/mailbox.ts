/** Something that a platform delivered, kept until it is handled. `channel` and `number` name it. */
export interface Arrived {
  readonly channel: string;
  /** The platform's own number of it. */
  readonly number: number;
  /** What came, as the edge reads it again (JSON). */
  readonly body: string;
  /** Milliseconds since 1970. */
  readonly received_at: number;
}

/** Something that arrived and is not handled yet. */
export interface Waiting extends Arrived {
  /** So often it was begun by a process that came after the one that received it. */
  readonly tries: number;
}

/**
 * Something that is to be sent. `id` names it in its channel, made of what it answers: written again while it waits it
 * is the same one.
 */
export interface Post {
  readonly id: string;
  readonly channel: string;
  /** The platform's own name of the chat. Of one chat the earlier written is sent first. */
  readonly chat: string;
  /** What is sent, as the edge wrote it (JSON). */
  readonly body: string;
  /** When it was written, in milliseconds since 1970. */
  readonly at: number;
}

/**
 * What came in from platforms and what is to be sent to them. A turn says that something is handled and what is to be
 * sent in the same transaction as whatever else it writes. Every method rejects with a `StoreError` when the world
 * fails, and then nothing of that call is kept.
 */
export interface Mailbox {
  /**
   * Keeps what arrived, all of it or none; resolves when it is durable, with what was not known. `onWritten` is told of that
   * earlier: a turn that handles it then is durable no sooner than it, and fails where it is not kept.
   */
  receive(
    arrived: readonly Arrived[],
    onWritten?: (fresh: readonly Arrived[]) => void,
  ): Promise<readonly Arrived[]>;
  /** What is not handled yet, the lowest number first. */
  waiting(channel: string): Promise<readonly Waiting[]>;
  /** Counts a try of each; resolves when that is durable. */
  countTry(channel: string, numbers: readonly number[]): Promise<void>;
  /** What is still to be sent, the earliest written first. */
  posts(channel: string): Promise<readonly Post[]>;
  /** Forgets posts that are sent or given up; resolves when that is durable. */
  settle(channel: string, ids: readonly string[]): Promise<void>;
  /** Gives posts another chat: it has got another name. */
  readdress(channel: string, ids: readonly string[], chat: string): Promise<void>;
  /**
   * Forgets what was handled before `handled_at` and what was put aside before `aside_at` (milliseconds since 1970), at most
   * `most` of each. Gives back how many.
   */
  prune(
    channel: string,
    before: { readonly handled_at: number; readonly aside_at: number; readonly most: number },
  ): Promise<number>;
}
