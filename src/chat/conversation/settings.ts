import type { Region } from '../../core/limits/region.ts';
import type { Basis } from '../../core/wine.ts';
import { READER_DEFAULTS } from '../reader/reader-defaults.ts';
import type { ReaderSettings } from '../reader/understood.ts';

/** The system of units a chat works in: it decides what a bare number, a gallon and a bare temperature mean. */
export type UnitSystem = 'metric' | 'us' | 'imperial';

/** All that a conversation has to know of its cellar. The language is the message's own. */
export interface Settings extends ReaderSettings {
  /** The table of dissociation constants to reckon with. */
  readonly basis: Basis;
  /** The market whose law is asked. */
  readonly region: Region;
  /** The system that rates are told in: grams per hectolitre, or per thousand gallons. */
  readonly units: UnitSystem;
  /** The cellar's time zone by its name; absent until somebody tells it, and then UTC is said. */
  readonly zone?: string;
  /** No message of the bot's own comes up between these minutes of the day. */
  readonly quiet: { readonly from_minute: number; readonly to_minute: number };
  /** The minute of the day at which the daily list goes out. */
  readonly daily_minute: number | 'off';
  /** A share added to doses that are computed from a target, in %. */
  readonly allowance_percent?: number;
  readonly shortReplies: boolean;
  /** So long a pH counts, in days. */
  readonly ph_days: number;
  /** A reading falls due so many days after the last one; for barrels and where free SO2 is low. */
  readonly usual_days: number;
  readonly often_days: number;
}

/** What a cellar has set of it. */
export type CellarSettings = Partial<Omit<Settings, 'language'>>;

const UNITS_OF: Readonly<
  Record<UnitSystem, Pick<Settings, 'gallon' | 'volumeUnit' | 'temperatureUnit' | 'units'>>
> = {
  metric: { units: 'metric', gallon: 'US', volumeUnit: 'L', temperatureUnit: 'C' },
  us: { units: 'us', gallon: 'US', volumeUnit: 'galUS', temperatureUnit: 'F' },
  imperial: { units: 'imperial', gallon: 'imperial', volumeUnit: 'galUK', temperatureUnit: 'C' },
};

/**
 * What holds for a cellar that has set nothing: what the reader takes for granted, pK 1.81, rates per hectolitre; the
 * daily list at 7:30 and quiet from 20 to 6; a check a month after a reading (common practice, no source), in barrels
 * and low wine every two weeks, and a pH that counts for two (own choices).
 */
export const DEFAULT_SETTINGS: Settings = {
  ...READER_DEFAULTS,
  basis: 'pk-1.81',
  region: 'oiv',
  units: 'metric',
  quiet: { from_minute: 20 * 60, to_minute: 6 * 60 },
  daily_minute: 7 * 60 + 30,
  shortReplies: false,
  ph_days: 14,
  usual_days: 30,
  often_days: 14,
};

/**
 * The settings of a chat that works in another system of units.
 *
 * @example
 * ```ts
 * withUnits(DEFAULT_SETTINGS, 'us').volumeUnit // => "galUS"
 * ```
 */
export function withUnits<S extends CellarSettings>(settings: S, units: UnitSystem): S {
  return { ...settings, ...UNITS_OF[units] };
}

/** The settings with what the cellar has set, which is kept as JSON; undefined where it has set nothing. */
export function mergeSettings(defaults: Settings, kept: string | undefined): Settings {
  if (kept === undefined) return defaults;
  const set = JSON.parse(kept) as CellarSettings;
  return { ...defaults, ...set, targets: { ...defaults.targets, ...set.targets } };
}
