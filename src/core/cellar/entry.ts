import type { AdditiveId } from '../additives/additive-id.ts';
import type { Category, Product, Stage, Style } from '../wine.ts';

/** What is told of a wine beside its readings. Alcohol in % vol, sugar in g/L, density in kg/L, SO2 in mg/L. */
export interface WineTraits {
  readonly style?: Style;
  readonly category?: Category;
  readonly product?: Product;
  readonly organic?: boolean;
  readonly stage?: Stage;
  readonly alcohol_percent?: number;
  readonly sugar_g_L?: number;
  /** The step of the law for wines of a designation, where somebody says that it is one: never inferred. */
  readonly designated_mg_L?: number;
  /** The authority has declared the year, so that more is allowed. */
  readonly uplift?: boolean;
  /** A sparkling wine of the class that the law calls quality. */
  readonly quality?: boolean;
  /** A wine of the national scheme for protected names. */
  readonly pdo?: boolean;
  /** Bulk wine for export. */
  readonly bulk?: boolean;
  readonly density_kg_L?: number;
  /** What is kept of the room below the limit for an addition that is still to come, at bottling. */
  readonly reserve_mg_L?: number;
}

/** An additive at hand as an entry keeps it: strength in %, a tablet's size in grams, the lot on its label. */
export interface AdditiveNoted {
  readonly additive?: AdditiveId;
  readonly strength_percent?: number;
  readonly strength_of?: 'salt';
  readonly tablet_SO2_g?: number;
  readonly tablet_salt_g?: number;
  readonly chemical_lot?: string;
}

/** How much: the additive in g, mL or tablets; what that is in SO2 (g, and mg/L of the wine's volume in L). */
export interface AmountNoted {
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  readonly tablets?: number;
  readonly SO2_g?: number;
  readonly added_mg_L?: number;
  readonly volume_L?: number;
}

/** An addition of sulphur dioxide that went in. */
export interface Addition extends AdditiveNoted, AmountNoted {
  readonly kind: 'addition';
  /** One vessel, or several equal ones that share the amount. */
  readonly vessels: readonly string[];
  /** What had been reckoned for it: mg/L of SO2, and the free SO2 (mg/L) that it should lead to. */
  readonly planned_mg_L?: number;
  readonly planned_free_mg_L?: number;
  /** The order that it carries out, by its number. */
  readonly order?: number;
  /** The rule of the law that it was known to pass when it was asked for all the same. */
  readonly over_rule?: string;
  readonly remark?: string;
}

/** What was measured in a sample. `at` of the entry is the time of sampling. */
export interface Measurement extends WineTraits {
  readonly kind: 'reading';
  readonly vessels: readonly string[];
  readonly ph?: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly temperature_C?: number;
  /** Litres in each vessel, where they were told beside it. */
  readonly volume_L?: number;
  readonly remark?: string;
}

/** What happened to a vessel or was told of it; `moved` and `blended` bring wine into `to`. */
export type VesselEvent =
  | 'told' // traits, volume or capacity as they are
  | 'racked'
  | 'topped'
  | 'acid' // an acid or a deacidification: the pH is another
  | 'moved' // all of it, or `volume_L` of it, into `to`, which was empty or unknown
  | 'blended' // into `to`, which held wine
  | 'emptied'
  | 'lot'
  | 'later' // no check before `until`
  | 'unwatched' // no checks from now on
  | 'watched'
  | 'forgotten'; // what is known of it is forgotten, its entries stay

/** Something that happened to a vessel. Volumes in litres, `until` in milliseconds since 1970. */
export interface VesselChange extends WineTraits {
  readonly kind: 'vessel';
  readonly event: VesselEvent;
  readonly vessels: readonly string[];
  readonly to?: string;
  readonly volume_L?: number;
  readonly capacity_L?: number;
  readonly lot?: string;
  readonly until?: number;
  readonly usual?: AdditiveNoted;
  readonly remark?: string;
}

/** An addition that somebody asks for; open until a hand confirms what really went in, or it is struck. */
export interface Order extends AdditiveNoted, AmountNoted {
  readonly kind: 'order';
  readonly vessels: readonly string[];
  readonly remark?: string;
}

/** Takes back an entry, which stays. */
export interface Correction {
  readonly kind: 'correction';
  readonly vessels: readonly string[];
  readonly corrects: number;
  readonly reason: string;
}

/** Anything else that went in, as it was written; nothing is computed from it. */
export interface OtherAddition {
  readonly kind: 'other';
  readonly vessels: readonly string[];
  readonly remark: string;
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
}

/** What happened to the chemical store. */
export type StockEvent =
  | 'received'
  | 'used' // for equipment, or for a solution that is made up: for no wine
  | 'discarded'
  | 'counted'; // what there is, whatever the log says

/** What came into the chemical store, went out of it otherwise than into wine, or was counted; in g, mL or tablets. */
export interface StockMovement extends AdditiveNoted {
  readonly kind: 'stock';
  readonly event: StockEvent;
  readonly vessels: readonly string[];
  readonly mass_g?: number;
  readonly additive_volume_mL?: number;
  readonly tablets?: number;
  readonly supplier?: string;
  readonly remark?: string;
}

/** What an entry of the log holds. */
export type Happening =
  Addition | Measurement | VesselChange | Order | Correction | OtherAddition | StockMovement;

/** What the log keeps beside it. Times in milliseconds since 1970. */
export interface Noting {
  /** Names the event that caused it: the same event never makes a second entry. At most 200 characters. */
  readonly key: string;
  /** When it happened; of a reading, when the sample was taken. */
  readonly at: number;
  /** When it was noted. */
  readonly noted_at: number;
  /** Who noted it: the number of a person in this cellar. */
  readonly by: number;
}

/** Something to note in the log. */
export type NewEntry = Happening & Noting;

/** An entry of the log: never changed, never deleted. `entry` is its number in its cellar, from 1. */
export type Entry = NewEntry & { readonly entry: number };

/** An entry with the correction that takes it back, where there is one. */
export type LoggedEntry = Entry & { readonly struck?: { readonly entry: number; readonly reason: string } };
