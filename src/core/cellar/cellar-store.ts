import type { LoggedEntry, NewEntry } from './entry.ts';
import type { Mailbox, Post } from './mailbox.ts';
import type { Shelf } from './shelf.ts';
import type { Vessel } from './vessel.ts';

/** Somebody who notes things: a number in this cellar, and the name that is shown. */
export interface Person {
  readonly number: number;
  /** Undefined when they asked to be forgotten, or never had one. */
  readonly name?: string;
}

/** Which entries are wanted; times in milliseconds since 1970, `from` included and `to` not. Oldest first. */
export interface EntryQuery {
  readonly from?: number;
  readonly to?: number;
  readonly vessel?: string;
  /** At most so many: the newest of them. */
  readonly last?: number;
}

/**
 * Something that is to be said at a moment (milliseconds since 1970). `id` makes it one of its kind in its cellar:
 * written again it replaces what is not said yet (whoever has it in hand keeps it), and once it was said nothing comes
 * back.
 */
export interface Due {
  readonly id: string;
  readonly chat: string;
  readonly at: number;
  /** What it is about, as the conversation wrote it (JSON). */
  readonly about: string;
}

/** What a turn sees of its cellar: all that earlier turns wrote. */
export interface CellarView {
  /** The number that the next entry gets. */
  nextEntry(): Promise<number>;
  entry(number: number): Promise<LoggedEntry | undefined>;
  /** The entry with that key; a correction of it is told. */
  entryOfKey(key: string): Promise<LoggedEntry | undefined>;
  /** The entries whose keys begin with these letters, oldest first. */
  entriesOfKeys(begin: string): Promise<readonly LoggedEntry[]>;
  entries(query: EntryQuery): Promise<readonly LoggedEntry[]>;
  /** The entry that a person noted last and nobody took back; corrections do not count. */
  lastEntryBy(person: number): Promise<LoggedEntry | undefined>;
  vessel(name: string): Promise<Vessel | undefined>;
  /** All vessels, by name. */
  vessels(): Promise<readonly Vessel[]>;
  /** The shelves of the chemical store, by name; none where nothing was ever received or counted. */
  shelves(): Promise<readonly Shelf[]>;
  /** The person that the platform knows by this id; undefined where they are new here. */
  person(id: string): Promise<Person | undefined>;
  people(): Promise<readonly Person[]>;
  /** The text that was kept under a key and has not lapsed. */
  kept(key: string): Promise<string | undefined>;
  /** The texts that are kept under these keys and have not lapsed, by key: in one look. */
  keptOf(keys: readonly string[]): Promise<ReadonlyMap<string, string>>;
  /** All that is kept under keys that begin with these letters, by key. */
  keptUnder(begin: string): Promise<readonly { readonly key: string; readonly text: string }[]>;
  due(id: string): Promise<Due | undefined>;
  /** What is still to be said in this cellar, the earliest first. */
  allDue(): Promise<readonly Due[]>;
}

/**
 * What a turn writes: all of it is kept or none. An entry whose key there is already, a correction of what is no entry,
 * is one itself or is taken back already, and a person whose id has another number are a RangeError: the conversation
 * has looked before; so is something handled that does not wait to be. What is kept `until` a moment (milliseconds since
 * 1970) lapses then. `said` also for what need not be said any more.
 */
export type Write =
  | { readonly kind: 'entry'; readonly entry: NewEntry }
  | { readonly kind: 'keep'; readonly key: string; readonly text: string; readonly until?: number }
  | { readonly kind: 'drop'; readonly key: string }
  | { readonly kind: 'person'; readonly id: string; readonly number: number; readonly name?: string }
  /** The platform's id and the name go; the number and what it noted stay. */
  | { readonly kind: 'forget-person'; readonly number: number }
  | { readonly kind: 'due'; readonly due: Due }
  | { readonly kind: 'said'; readonly id: string }
  | { readonly kind: 'post'; readonly post: Post }
  /** What arrived needs nothing more; with a `cause` it was put aside, and what came is kept for a while. */
  | { readonly kind: 'handled'; readonly channel: string; readonly number: number; readonly cause?: string };

/** What the work of a turn comes to. */
export interface TurnResult<T> {
  readonly writes: readonly Write[];
  readonly result: T;
}

/** A due thing that was handed out to be said, with its cellar. */
export interface TakenDue extends Due {
  readonly cellar: string;
}

/**
 * Where cellars are kept: the log, what is derived from it, and what conversations keep. One port, several stores.
 * Every method rejects with a `StoreError` when the world fails, and then nothing of that call is kept.
 */
export interface CellarStore extends Mailbox {
  /**
   * Does a turn alone in its cellar. Resolves only when what it wrote (and all that it read) is durable. What `work`
   * throws it rejects with, and nothing is kept. A turn must not wait for another one of its cellar.
   */
  turn<T>(cellar: string, work: (view: CellarView) => Promise<TurnResult<T>>): Promise<T>;
  /** Reads without writing and without holding anybody up; sees durable things only. */
  look<T>(cellar: string, work: (view: CellarView) => Promise<T>): Promise<T>;
  /** The names of all cellars. */
  cellars(): Promise<readonly string[]>;
  /** When the next due thing can be handed out: it falls due, or its lease ends; undefined where there is none. */
  nextDue(): Promise<number | undefined>;
  /** Hands out what is due by `now`, each for `lease_ms`: nobody else gets it within that time. */
  takeDue(
    now: number,
    options: { readonly lease_ms: number; readonly most: number },
  ): Promise<readonly TakenDue[]>;
  /** Derives all vessels of a cellar anew from its log; tells whether they differed from what was kept. */
  rebuild(cellar: string): Promise<{ readonly vessels: number; readonly differed: readonly string[] }>;
  /** Copies the store while it runs, to a file that must not exist yet. */
  backup(path: string): Promise<void>;
  close(): Promise<void>;
}
