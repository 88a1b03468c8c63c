import type { ReaderSettings } from './understood.ts';

/**
 * A chat that has set nothing: English, US gallons, potassium metabisulfite.
 * Targets in mg/L molecular: 0.8 and 0.6 from *Understanding Wine Chemistry*, table 17.1; the split by colour is
 * common practice; 1.5 for sweet wine rests on a weak source.
 */
export const READER_DEFAULTS: ReaderSettings = {
  language: 'en',
  gallon: 'US',
  usualAdditive: 'potassium-metabisulfite',
  temperatureUnit: 'C',
  volumeUnit: 'L',
  targets: { red: 0.6, white: 0.8, sweet: 1.5 },
};
