import type { Basis } from '../../core/wine.ts';
import { READER_DEFAULTS } from '../reader/reader-defaults.ts';
import type { ReaderSettings } from '../reader/understood.ts';

/** The system of units a chat works in: it decides what a bare number, a gallon and a bare temperature mean. */
export type UnitSystem = 'metric' | 'us' | 'imperial';

/** All that a conversation has to know of its chat. The language is the message's own. */
export interface Settings extends ReaderSettings {
  /** The table of dissociation constants to reckon with. */
  readonly basis: Basis;
  /** The system that rates are told in: grams per hectolitre, or per thousand gallons. */
  readonly units: UnitSystem;
}

const UNITS_OF: Readonly<
  Record<UnitSystem, Pick<Settings, 'gallon' | 'volumeUnit' | 'temperatureUnit' | 'units'>>
> = {
  metric: { units: 'metric', gallon: 'US', volumeUnit: 'L', temperatureUnit: 'C' },
  us: { units: 'us', gallon: 'US', volumeUnit: 'galUS', temperatureUnit: 'F' },
  imperial: { units: 'imperial', gallon: 'imperial', volumeUnit: 'galUK', temperatureUnit: 'C' },
};

/** What holds for a chat that has set nothing: what the reader takes for granted, pK 1.81, rates per hectolitre. */
export const DEFAULT_SETTINGS: Settings = { ...READER_DEFAULTS, basis: 'pk-1.81', units: 'metric' };

/**
 * The settings of a chat that works in another system of units.
 *
 * @example
 * ```ts
 * withUnits(DEFAULT_SETTINGS, 'us').volumeUnit // => "galUS"
 * ```
 */
export function withUnits(settings: Settings, units: UnitSystem): Settings {
  return { ...settings, ...UNITS_OF[units] };
}
