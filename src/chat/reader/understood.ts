import type { AdditiveId } from '../../core/additives/additive-id.ts';
import type { FruitState } from '../../core/dose/must-ranges.ts';
import type { Problem } from '../../core/problem.ts';
import type { Command, SaidWhen } from './command.ts';
import type { Language } from './words/languages.ts';
import type { SaidTitration } from './titration/said-titration.ts';
import type { Category, Product, Stage, Style, Target } from '../../core/wine.ts';

export type { Language } from './words/languages.ts';

/** What a person wants. */
export type Intent =
  'dose' | 'effect' | 'added' | 'reading' | 'solution' | 'titration' | 'command' | 'emergency' | 'chat';

/** What a message states, by the JSON names of the message language; volumes in litres, °C, mg/L. */
export interface Fields {
  readonly vessel?: string;
  readonly vessels?: readonly string[];
  readonly volume_L?: number;
  readonly ph?: number;
  readonly free_mg_L?: number;
  readonly total_mg_L?: number;
  readonly temperature_C?: number;
  readonly alcohol_percent?: number;
  readonly sugar_g_L?: number;
  readonly style?: Style;
  readonly category?: Category;
  readonly product?: Product;
  readonly organic?: true;
  /** The step of the law for wines of a designation. */
  readonly designated_mg_L?: number;
  /** The year was declared a bad one, so that more is allowed. */
  readonly uplift?: boolean;
  /** Of a sparkling wine: the class that the law calls quality. */
  readonly quality?: boolean;
  /** Of the national scheme for protected names. */
  readonly pdo?: true;
  /** Bulk wine for export. */
  readonly bulk?: true;
  readonly density_kg_L?: number;
  /** mg/L of the room below the limit that are kept for bottling. */
  readonly reserve_mg_L?: number;
  readonly stage?: Stage;
  readonly additive?: AdditiveId;
  readonly strength_percent?: number;
  readonly tablet_SO2_g?: number;
  readonly tablet_salt_g?: number;
  readonly tablets?: number;
  readonly target?: Target;
  readonly binding_allowance_percent?: number;
  readonly binding_share?: number;
  readonly mass_g?: number;
  readonly rate_mg_L?: number;
  readonly added_mg_L?: number;
  readonly additive_volume_mL?: number;
}

/** The name of a field, as the message language and `ask` have it. */
export type FieldName = keyof Fields;

/** What the bot filled in; every one of these stands in the reply. */
export interface Assumed {
  readonly additive?: AdditiveId;
  /** The strength of the usual additive, where it is not pure. */
  readonly strength_percent?: number;
  /** That strength is of the salt and not of SO2. */
  readonly strength_of?: 'salt';
  readonly target?: Target;
  readonly stage?: Stage;
  readonly volume_L?: number;
  /** The share that the cellar adds to doses from a target. */
  readonly binding_allowance_percent?: number;
  /** Litres of must from 100 kg of fruit, as the cellar has set it. */
  readonly yield_L_per_100_kg?: number;
  /** Present where a gallon was read without saying which. */
  readonly gallon?: 'US' | 'imperial';
}

/** The fields that can be missing, by the names and in the order of the message language. */
export const ASKED_FIELDS = [
  'vessel',
  'volume_L',
  'ph',
  'free_mg_L',
  'target',
  'additive',
  'strength_percent',
  'tablet_salt_g',
  'tablet_SO2_g',
  'mass_g',
] as const;
/** A field that can be missing. */
export type AskedField = (typeof ASKED_FIELDS)[number];

/** How something was read, where the reply has to say so. `text` is the person's own words. */
export interface ReadNote {
  readonly id:
    | 'free-unlabelled' // a figure without the word free was taken as free SO2
    | 'ph-unlabelled' // a bare decimal was taken as the pH
    | 'volume-sum' // `6+6+4 gal` was added up
    | 'strength-as-salt' // a bisulfite strength was read as grams of salt
    | 'strength-as-SO2' // … or as grams of SO2
    | 'mass-beside-readings' // a mass without a volume was read as grams
    | 'fruit-by-weight' // the volume is asked as only a weight of fruit was given
    | 'ferment-stop' // the person wants to stop a fermentation
    | 'spoon' // an amount in spoons
    | 'negated' // something was said not to have been added
    | 'each-or-total' // one volume beside several vessels
    | 'unread-words' // words of a language that is not read yet
    | 'did-you-mean'; // a word one letter from an additive
  readonly text: string;
}

/** The unit a person used, so that the reply can answer in it. */
export type VolumeUnit = 'L' | 'hL' | 'mL' | 'm3' | 'galUS' | 'galUK' | 'barrel';

/** Facts of a message that are no field but steer what it means and what is asked. */
export interface Marks {
  /** "Made with organic grapes": in the US a class of its own, which may hold added sulfite. */
  ofOrganicFruit?: true;
  /** A powder or solution was named without its cation. */
  unnamedAdditive?: true;
  /** It was named as a solution, so that its strength is missing too. */
  unnamedSolution?: true;
  /** A small plain tablet, whose salt and size may be missing. */
  campden?: true;
  /** The word `salt` stood beside a bisulfite strength. */
  strengthAsSalt?: true;
  /** The amount stood in spoons. */
  spoon?: true;
  /** Barrels without a size: their litres, 225 each. */
  barrelsAssumed_L?: number;
  /** Those barrels were counted (`6 barrels`), not merely named. */
  barrelsCounted?: true;
  gallonRead?: true;
  /** How many equal barrels or vessels the volume is the sum of. */
  containers?: number;
  volumeUnit?: VolumeUnit;
  concentrationUnit?: 'ppm' | 'mg/L' | 'g/hL';
  /** A weight of fruit stood in the place of a volume. */
  fruitByWeight?: true;
  /** That weight, in kg. */
  fruit_kg?: number;
  /** Litres of must from 100 kg of it, as stated. */
  yield_L_per_100_kg?: number;
  /** Tons are short ones: the yield is in US gallons. */
  shortTon?: true;
  /** How sound the fruit is. */
  fruitState?: FruitState;
  /** An amount stood per weight of fruit (`7 g per 100 kg`). */
  fruitRate?: true;
  /** The wine is to be bottled. */
  bottling?: true;
  /** Oxygen at bottling, dissolved and in the headspace, mg/L; and mg of SO2 that one of it takes, where it is said. */
  oxygen_mg_L?: number;
  SO2_mg_per_mg_O2?: number;
  /** A cask without a usual size was named. */
  casksWithoutSize?: true;
  solutionUse?: 'holding' | 'cleaning' | 'make-up';
  /** Sulfur that is burnt was named: a disc, a wick. */
  wick?: true;
  /** The first line of the round said that all this was added. */
  pastLine?: true;
  /** One sample was mixed from several vessels: the person’s own words. */
  mixedSample?: string;
  /** `each` stood beside the volume of several vessels. */
  statedEach?: true;
  /** `total`, `in all` stood beside it. */
  statedTotal?: true;
  /** One volume beside several vessels: of each or in all? */
  eachOrTotal?: true;
  /** Beside readings, what was done to the vessel: it voids what was known of it. */
  alsoSaid?: 'racked' | 'moved' | 'topped' | 'blended' | 'acid';
  /** The message says "if": nothing of it is a fact. */
  conditional?: true;
  /** An acid, or what takes acid away, was named. */
  acid?: true;
  /** Something of it is still to come: the person’s own word for when. */
  toCome?: string;
  /** How far the dose may be off is asked; how sure the pH is (no unit), and the free SO2. */
  wantsRange?: true;
  ph_plus_minus?: number; // no unit
  free_plus_minus_mg_L?: number;
  /** The volume was asked about: what was said, and what the vessel is known to hold, in litres. */
  volumeChoices?: readonly number[];
}

/** Where a field stood in the text (UTF-16 offsets of the message as it came). */
export interface Place {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

/** One reading of a message: what was said, what was assumed, what is asked, what is wrong. */
export interface Reading {
  readonly intent: Intent;
  /** The matter of a `chat`, the word of a `command`, the kind of an `emergency`. */
  readonly topic?: string;
  readonly fields: Fields;
  readonly assumed: Assumed;
  readonly asks: readonly AskedField[];
  readonly problems: readonly Problem[];
  /** Figures that are none of ours, in the person's words. */
  readonly setAside: readonly string[];
  readonly notes: readonly ReadNote[];
  /** The word `salt` beside a bisulfite strength. */
  readonly strength_of?: 'salt';
  readonly volumeUnit?: VolumeUnit;
  /** How many equal barrels or vessels `volume_L` is the sum of (`6 barrels`, `40 x 225 L`). */
  readonly containers?: number;
  readonly concentrationUnit?: 'ppm' | 'mg/L' | 'g/hL';
  /** One of the bot's own words, or a statement about a vessel; only with the intent `command`. */
  readonly command?: Command;
  /** What the burette gave; only with the intent `titration`. */
  readonly titration?: SaidTitration;
  /** When it happened or was sampled, as it was said. */
  readonly when?: SaidWhen;
  /** The lot on the additive's label. */
  readonly chemical_lot?: string;
  /** A remark for the log, in the person's words. */
  readonly remark?: string;
  /** Fields that stand for what is known of the vessel and not for what was said, with the time they are of. */
  readonly recalled?: Readonly<Partial<Record<FieldName, number>>>;
  /** Where the total is a sum: the total that was measured, and what went in since, in mg/L. */
  readonly totalOf?: { readonly measured_mg_L: number; readonly since_mg_L: number };
  /** The rule of the law that the dose passes, where it was asked for all the same. */
  readonly over_rule?: string;
  /** Fields that the log has had from this person already, when the reading goes on over several messages. */
  readonly noted?: readonly FieldName[];
  /** The key of the event that noted them, when buttons of the reading may still move its time. */
  readonly event?: string;
  /** When it was said, in milliseconds since 1970, where a button goes on with it later; else with its message. */
  readonly said_at?: number;
  /** Whether the sample was taken before or after the last addition, where that was asked; `dose` wants one all the same. */
  readonly sampled?: 'before' | 'after' | 'dose';
  /** What else was read that steers what is asked. */
  readonly marks: Readonly<Marks>;
  readonly where: Readonly<Partial<Record<FieldName, Place>>>;
}

/** What a message means. A round has several readings; `shared` applies to all of them. */
export interface Understood {
  readonly readings: readonly Reading[];
  readonly shared: Fields;
  /** The language the words of the message are of, where they tell; else the chat's. */
  readonly language: Language;
  readonly decimalMark: '.' | ',';
}

/** What the reader has to know of the chat. */
export interface ReaderSettings {
  readonly language: Language;
  /** The chat's language until this message, where it is the first in another one: both must group thousands alike. */
  readonly languageBefore?: Language;
  readonly gallon: 'US' | 'imperial';
  readonly usualAdditive: AdditiveId;
  /** Its strength, where it is not pure. */
  readonly usualStrength?: { readonly strength_percent: number; readonly strength_of?: 'salt' };
  /** Litres of must from 100 kg of fruit, where the cellar has set it. */
  readonly yield_L_per_100_kg?: number;
  readonly temperatureUnit: 'C' | 'F';
  readonly volumeUnit: VolumeUnit;
  /** Usual molecular targets in mg/L. */
  readonly targets: { readonly red: number; readonly white: number; readonly sweet: number };
}

/** A question that the bot asked and still waits for, as far as reading its answer needs it. */
export interface AwaitedField {
  readonly field: AskedField;
  readonly reading: Reading;
}

/** A reading before its assumptions and questions are worked out. */
export type Draft = Omit<Reading, 'assumed' | 'asks'>;
