import type { AdditiveId } from '../../../core/additives/additive-id.ts';
import type { Region } from '../../../core/limits/region.ts';
import type { Category, Product, Stage, Style } from '../../../core/wine.ts';
import type { Language } from '../understood.ts';

/** Units a person writes; `gal` is the gallon that the chat's setting decides. */
export type UnitId =
  | 'L' | 'mL' | 'cL' | 'hL' | 'm3' | 'galUS' | 'galUK' | 'gal' | 'floz'
  | 'g' | 'mg' | 'kg' | 'lb' | 'oz' | 'ton' | 'quintal'
  | 'ppm' | 'mg/L' | 'g/hL' | 'g/L' | 'C' | 'F' | 'degree' | 'spoon' | 'none-of-ours'; // prettier-ignore

/** Words that stand before or after a figure and say what it is; `aside` is a figure that is none of ours. */
export type LabelId =
  'ph' | 'free' | 'total' | 'so2' | 'temperature' | 'alcohol' | 'sugar' | 'volume' | 'aside';

/** Ways of naming an additive: `unnamed` lacks its cation, `none` is an additive that is none of ours. */
export type AdditiveWord =
  AdditiveId | 'campden' | 'campden-potassium' | 'campden-sodium' | 'unnamed' | 'none';

/** Small words that steer the reading. */
export type CueId =
  | 'target' | 'to' | 'from' | 'raise' | 'add' | 'need' | 'addition' | 'molecular' | 'by'
  | 'binds' | 'binding' | 'no-binding' | 'extra' | 'third' | 'half' | 'quarter' | 'two-thirds' | 'three-quarters'
  | 'each' | 'altogether' | 'per' | 'in' | 'of' | 'with' | 'is' | 'and' | 'article' | 'correction'
  | 'past' | 'if' | 'not' | 'not-yet' | 'question' | 'how-much' | 'reading' | 'vessel-statement'
  | 'water' | 'holding' | 'cleaning' | 'make-up' | 'solution' | 'salt-word' | 'powder' | 'gas' | 'size'
  | 'thousand' | 'number-word' | 'number-sign' | 'bottle-unit' | 'tablet' | 'sachet' | 'effervescent' | 'joined'
  | 'ml' | 'ml-around' | 'ml-over' | 'ml-without' | 'ml-bugs' | 'over' | 'stop' | 'ferment' | 'past-ferment'
  | 'fruit' | 'wine' | 'verb' | 'pronoun' | 'month' | 'lot' | 'variety'
  | 'greeting' | 'thanks' | 'help' | 'cellar' | 'plain' | 'potassium' | 'sodium' | 'yet'
  | 'percent' | 'please' | 'in-store' | 'into' | 'clock-before' | 'no' | 'states' | 'plus' | 'times' | 'wick'
  | 'decimal' | 'again' | 'except' | 'mixed-sample' | 'should' | 'fullness' | 'share-word' | 'limit' | 'sample-word' | 'past-time' | 'asks-past' | 'got' | 'put' | 'lately' | 'bag' | 'buy' | 'in-water-name' | 'solution-name' | 'per-barrel' | 'oxygen' | 'yield' | 'fruit-sound' | 'fruit-damaged' | 'fruit-rot' | 'rises-too' | 'tap-too' | 'from-too' | 'add-behind' | 'past-if-accented' | 'only-done' | 'is-if-accented' | 'if-if-accented' | 'half-if-accented' | 'bring' | 'also-at' | 'at-strength' | 'one' | 'many'
  | 'designated' | 'declared-year' | 'density' | 'density-unit' | 'undeclared-year' | 'quality' | 'other-sparkling' | 'pdo' | 'bulk' | 'keep' | 'bottling' | 'bottling-reserve'; // prettier-ignore

/** What a word is. */
export type Tag =
  | `unit:${UnitId}`
  | `label:${LabelId}`
  | `cue:${CueId}`
  | `additive:${AdditiveWord}`
  | `style:${Style}`
  | `category:${Category}`
  | `product:${Product}`
  | `stage:${Stage}`
  | 'vessel:tank'
  | 'vessel:barrel'
  | 'vessel:cask'
  | 'vessel:other'
  | 'organic';

/**
 * The bot's own words, those of statements about a vessel, of moments and of remarks. They are looked up apart from
 * `says`, so that none of them changes how a reading is read.
 */
export type OwnWordId =
  /** A market whose law may be meant. */
  | `law:${Region}`
  | 'law' | 'limit' | 'full-dose' | 'yes'
  | 'filler' | 'request' | 'courtesy' | 'article' | 'if' | 'ask' | 'show' | 'vessels' | 'today' | 'yesterday' | 'before-yesterday' | 'sheet' | 'what-was-added'
  | 'history' | 'history-word' | 'undo' | 'strike' | 'entry' | 'because' | 'order' | 'orders' | 'open' | 'still' | 'due' | 'later' | 'tomorrow' | 'next-week'
  | 'remind' | 'again' | 'not' | 'unwatch' | 'watch' | 'settings' | 'export' | 'import' | 'backup' | 'forget'
  | 'forget-me' | 'this' | 'last' | 'month' | 'year' | 'all' | 'csv' | 'xlsx'
  | 'work-in' | 'units' | 'metric' | 'litres' | 'us' | 'imperial' | 'gallons' | 'usual' | 'usual-bare' | 'default' | 'target' | 'target-kind'
  | 'reds' | 'whites' | 'sweets' | 'red' | 'white' | 'sweet' | 'for' | 'quiet' | 'daily' | 'zone' | 'we-are-in' | 'utc'
  | 'yield' | 'allowance' | 'percent' | 'no' | 'off' | 'basis' | 'oiv' | 'replies' | 'short' | 'long' | 'ph' | 'counts'
  | 'check' | 'every' | 'often'
  | 'is' | 'has' | 'now' | 'who' | 'done-to' | 'racked' | 'moved' | 'pumped' | 'over' | 'topped' | 'blended'
  | 'emptied' | 'empty' | 'acidified' | 'went-in' | 'acid' | 'some' | 'holds' | 'capacity' | 'tank' | 'in-it' | 'there-is' | 'in' | 'wine' | 'and' | 'left'
  | 'to' | 'from' | 'with' | 'of' | 'off-lees' | 'finished' | 'two-meanings' | 'ml-way' | 'lot' | 'number' | 'remark' | 'remark-bare' | 'bottled'
  | 'sampled' | 'at' | 'on' | 'until' | 'moment-bar' | 'this-morning' | 'last-night' | 'part-of-day' | 'ago' | 'ago-before' | 'am'
  | 'pm' | 'oclock' | 'noon' | 'hour' | 'minute' | 'day' | 'week' | 'ordinal'
  | 'picture' | 'round' | 'weigh-sheet' | 'added-it' | 'done' | 'invite' | 'keeper' | 'hand' | 'guest' | 'as-role' | 'people' | 'remove' | 'make-role' | 'join' | 'at-cellar' | 'cellars'
  | 'cellar-is' | 'name-cellar' | 'leave-cellar' | 'read-along' | 'only-called' | 'language'
  | 'stock' | 'in-store' | 'how-much' | 'received' | 'used-up' | 'discarded' | 'counted' | 'supplier' | 'for-equipment' | 'spoilt'
  | 'lab-aeration' | 'lab-iodine' | 'lab-naoh' | 'lab-iodate' | 'lab-titration' | 'lab-sample' | 'lab-titrant' | 'lab-blank' | 'lab-ascorbic' | 'lab-normal' | 'lab-molar'
  | 'lab-range' | 'lab-table' | 'lab-molecular' | 'lab-so2' | 'lab-forecast' | 'lab-blend' | 'lab-too-much'
  | 'count-half' | 'count-1' | 'count-2' | 'count-3' | 'count-4' | 'count-5' | 'count-6'; // prettier-ignore

/** The plain questions about the trade that people ask again and again. */
export type QuestionId =
  | 'small-or-large' | 'how-often' | 'which-figure' | 'which-yield' | 'tablets-or-powder' | 'old-powder'
  | 'wait-before-yeast' | 'after-malolactic' | 'ppm-and-mg-L' | 'teaspoons' | 'fell-short' | 'strip-reads-otherwise'
  | 'stop-fermentation' | 'sorbate' | 'allergy' | 'law' | 'gas' | 'potassium-or-sodium' | 'when-to-measure'
  | 'how-to-mix' | 'pH-matters' | 'which-target' | 'stock-keeps' | 'too-much' | 'no-sulfite' | 'bottling'; // prettier-ignore

/** The groups of words that together make an emergency; `emergency.ts` holds the rules. */
export type DangerId =
  | 'down' | 'breathless' | 'person' | 'thing' | 'silent' | 'went-in' | 'hurt-eye' | 'swallowed' | 'drank' | 'vessel' | 'fell' | 'beside' | 'unwell' | 'mixed' | 'reactive' | 'smell' | 'place' | 'skin' | 'idiom'
  | 'gas' | 'leak' | 'alarm' | 'elsewhere' | 'burnt' | 'chemical'; // prettier-ignore

/** A topic of help: the sentences `help-<topic>-…` are its screen. */
export type HelpTopic =
  | 'wine' | 'must' | 'bottling' | 'law' | 'round' | 'stock' | 'solutions' | 'log' | 'vessels' | 'reminders'
  | 'settings' | 'pictures' | 'files' | 'people' | 'lab' | 'forecast'; // prettier-ignore

/**
 * All that people write in one language: data only. Entries are lower case without accents; an entry of
 * several words matches them with one blank or hyphen between. A word may stand under several tags.
 */
export interface Words {
  readonly language: Language;
  /** The separator that groups thousands in this language; empty where only a blank does. */
  readonly groups: '.' | ',' | '';
  /** An article is drawn together with the word behind it: `l'acide`, `d'eau`. */
  readonly elides?: true;
  /** `ä` is also written `ae`. */
  readonly umlauts?: true;
  readonly says: Readonly<Partial<Record<Tag, readonly string[]>>>;
  /** Ordinary words, other chemicals and words of other languages that are one letter from a cellar word and none. */
  readonly neverMended?: readonly string[];
  readonly own?: Readonly<Partial<Record<OwnWordId, readonly string[]>>>;
  /** What help is asked about, in the order in which the topics are listed. */
  readonly topics?: Readonly<Partial<Record<HelpTopic, readonly string[]>>>;
  /** What the languages are called in this one, by their codes; the code of its own too. */
  readonly languages?: Readonly<Partial<Record<Language, readonly string[]>>>;
  /** The names of the months in their order, January first; each the whole word and what shortens it. */
  readonly months?: readonly (readonly string[])[];
  /** The days of the week in their order, Monday first; no shortening that is also another word. */
  readonly weekdays?: readonly (readonly string[])[];
  readonly danger: Readonly<Partial<Record<DangerId, readonly string[]>>>;
  /**
   * How the plain questions are put, the first that fits counts. Each entry is groups joined by ` & `, of each of which
   * one way (`|` between them, `*` for the rest of a word) is in the message; a group behind `!` must not be in it.
   */
  readonly questions?: Readonly<Partial<Record<QuestionId, readonly string[]>>>;
}
