import type { IncomingMessage } from '../../../src/chat/conversation/ports.ts';
import type { Place } from './bot.ts';
import type { Noted, Said } from './rules.ts';

/** A button that somebody saw under a reply. */
export interface Shown {
  readonly key: string;
  readonly chat: string;
  readonly shown_at: number;
  readonly vessel: string;
  /** What the dose above it says to weigh. */
  readonly mass_g?: number;
  /** When the addition above it was told. */
  readonly told_at?: number;
  /** When the sample above it was taken, when that was said, and whether a dose was wanted all the same. */
  readonly sampled_at?: number;
  readonly said_at?: number;
  readonly isAnyway?: boolean;
  /** The entry of the reading that it stands under. */
  readonly reading?: number;
}

/** Who is about to dose a vessel, since when. */
export interface Claimed {
  readonly by: string;
  readonly at: number;
}

/** Everything that was said so far, by the rules and by nothing else. */
export interface Model {
  /** When the next thing is said. */
  now: number;
  readonly log: Noted[];
  /** The entries that a button has made. */
  readonly made: Map<string, number[]>;
  readonly claims: Map<string, Claimed>;
  /** When it was last asked whether a volume is right, by who said it, where, and of which vessel. */
  readonly askedVolumes: Map<string, number>;
  /** What people have on their screens. */
  readonly shown: Shown[];
  /** What was delivered, and whether it noted something. */
  readonly delivered: { readonly message: IncomingMessage; hasNoted: boolean }[];
  /** What happened, to be read where it went wrong. */
  readonly story: string[];
}

/** Nothing was said yet. */
export function freshModel(now: number): Model {
  return {
    now,
    log: [],
    made: new Map(),
    claims: new Map(),
    askedVolumes: new Map(),
    shown: [],
    delivered: [],
    story: [],
  };
}

/** Notes something by the rules; `at` where it happened at another time than now. */
export function note(model: Model, said: Said, { person }: Place, at = model.now): Noted {
  const noted: Noted = { ...said, entry: model.log.length + 1, at, noted_at: model.now, by: person };
  model.log.push(noted);
  return noted;
}
