import type { Learned } from '../binding/learned.ts';
import type { Stage } from '../wine.ts';
import type { AdditiveNoted, AmountNoted, WineTraits } from './entry.ts';

/** A fact with the moment (milliseconds since 1970) that it is of, and the entry that told it. */
export interface Known<T> {
  readonly value: T;
  readonly at: number;
  readonly entry: number;
}

/** The moment of an event, and its entry: of what is told of the same minute the entries say which came first. */
export interface Happened {
  readonly at: number;
  readonly entry: number;
}

/** Facts about the wine that stay until another is told or an event makes them void. */
export type KnownTraits = { readonly [K in keyof WineTraits]?: Known<NonNullable<WineTraits[K]>> };

/** A measured sample: pH, free and total SO2 in mg/L, temperature in °C. */
export interface SampleKept {
  readonly entry: number;
  readonly at: number;
  readonly ph?: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly temperature_C?: number;
}

/** An addition as the vessel keeps it: its own share where several vessels shared it. */
export interface AdditionKept extends AdditiveNoted, AmountNoted {
  readonly entry: number;
  readonly at: number;
  readonly by: number;
  readonly planned_mg_L?: number;
  readonly planned_free_mg_L?: number;
}

/** What the wine did with additions: free SO2 before and after in mg/L, what went in between, and the share that bound. */
export interface Landing {
  /** The reading that shows it. */
  readonly entry: number;
  readonly at: number;
  readonly additions: readonly number[];
  readonly added_at: number;
  readonly added_mg_L: number;
  /** When free SO2 was read before. */
  readonly before_at: number;
  readonly before_mg_L: number;
  readonly after_mg_L: number;
  /** 1 − rise ÷ addition; below 0 or above 1 where the figures cannot be right. */
  readonly bound_share: number;
  readonly planned_free_mg_L?: number;
}

/** An order that nobody has confirmed yet. */
export interface OpenOrder extends AdditiveNoted, AmountNoted {
  readonly entry: number;
  readonly at: number;
  readonly by: number;
}

/** What made a fact void, and when. */
export interface Voided {
  readonly event: 'fermentation' | 'malolactic' | 'blended' | 'acid' | 'racked' | 'topped' | 'moved';
  readonly at: number;
}

/**
 * What is known of a vessel: derived from the entries of the log and never kept otherwise. Volumes in litres,
 * concentrations in mg/L, times in milliseconds since 1970. The lists hold the newest last and are bounded, so that
 * it does not grow with the log.
 */
export interface Vessel {
  readonly vessel: string;
  /** When it was first heard of. */
  readonly since: number;
  /** The last entry that it rests on, by time and number. */
  readonly last_at: number;
  readonly last_entry: number;
  /** Since when it is empty; absent while it holds wine or may. */
  readonly empty?: number;
  readonly lot?: Known<string>;
  readonly volume_L?: Known<number>;
  readonly capacity_L?: Known<number>;
  readonly traits: KnownTraits;
  /** The additive that is used for it, where the vessel has one of its own. */
  readonly usual?: Known<AdditiveNoted>;
  readonly ph?: Known<number>;
  readonly free_mg_L?: Known<number>;
  readonly total_mg_L?: Known<number>;
  readonly voided: { readonly ph?: Voided; readonly volume_L?: Voided };
  readonly readings: readonly SampleKept[];
  readonly additions: readonly AdditionKept[];
  /** Additions since the last reading of free SO2: they have not landed yet. */
  readonly unlanded: readonly number[];
  /** mg/L of SO2 that went in since the last measured total, as far as it is known. */
  readonly added_since_total_mg_L: number;
  readonly landings: readonly Landing[];
  /** What the wines bound that it was mixed of, by volume. */
  readonly bound_before?: Learned;
  /** When the wine became another for the last time: it was blended, or fermented, or went through malolactic. */
  readonly changed?: Happened;
  /** When it was racked, moved, partly taken or bottled for the last time: air came to it, and it may lie otherwise than before. */
  readonly handled?: Happened;
  readonly orders: readonly OpenOrder[];
  readonly later?: number;
  readonly unwatched?: true;
}

/** The stages whose wine is not urged to be dosed. */
export const UNFINISHED_STAGES: readonly Stage[] = ['must', 'fermenting', 'malolactic', 'base'];
