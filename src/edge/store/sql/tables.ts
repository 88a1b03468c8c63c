import type { Generated, GeneratedAlways } from 'kysely';
import type { Arrived, Post } from '../../../core/cellar/mailbox.ts';

/** The tables, as the queries of Kysely know them. Times are milliseconds since 1970. */
export interface Tables {
  readonly cellar: { readonly cellar: string };
  readonly entry: EntryRow & { readonly additive: GeneratedAlways<string | null> };
  readonly touched: { readonly cellar: string; readonly vessel: string } & PlaceRow;
  readonly vessel: StandingRow;
  readonly waypoint: StandingRow;
  /** What of an additive stands on its shelf; `state` is JSON. */
  readonly shelf: { readonly cellar: string; readonly shelf: string; readonly state: string };
  readonly kept: {
    readonly cellar: string;
    readonly key: string;
    readonly text: string;
    readonly until: number | null;
  };
  readonly person: {
    readonly cellar: string;
    readonly number: number;
    readonly id: string | null;
    readonly name: string | null;
  };
  readonly due: DueRow;
  readonly arrived: ArrivedRow;
  readonly post: PostRow;
}

/** An entry; what it holds (its happening) is JSON. */
export interface EntryRow extends PlaceRow {
  readonly cellar: string;
  readonly key: string;
  readonly noted_at: number;
  readonly person: number;
  readonly kind: string;
  readonly corrects: number | null;
  readonly content: string;
}

/** How a vessel stood after an entry; `state` is JSON, null where it is forgotten. */
export interface StandingRow extends PlaceRow {
  readonly cellar: string;
  readonly vessel: string;
  readonly run: number;
  readonly state: string | null;
}

/** Something to be said. It may be handed out from `open_at` on: when it falls due, or its lease has ended. */
export interface DueRow {
  readonly cellar: string;
  readonly id: string;
  readonly chat: string;
  readonly at: number;
  readonly about: string;
  readonly leased_until: number;
  readonly open_at: number;
  readonly said: number;
}

/** Something that arrived; `handled_at` is null while it waits, `cause` unless it was put aside. */
export interface ArrivedRow extends Arrived {
  readonly tries: number;
  readonly handled_at: number | null;
  readonly cause: string | null;
}

/** Something to be sent; `place` gives the order. */
export interface PostRow extends Post {
  readonly place: Generated<number>;
}

interface PlaceRow {
  readonly at: number;
  readonly entry: number;
}
