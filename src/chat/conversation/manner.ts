import type { Reading, Understood, VolumeUnit } from '../reader/understood.ts';
import type { DecimalMark } from '../replies/number-text.ts';
import { dayText } from '../replies/moment-text.ts';
import { concentrationText, molecularText } from '../replies/quantity-text.ts';
import type { UnitSystem } from './settings.ts';
import type { Here } from './here.ts';
import { zoneOf } from './zone.ts';

/** How this person writes figures, so that the reply is in their units and with their decimal mark. */
export interface Manner {
  readonly mark: DecimalMark;
  /** The same in wine; the reply keeps the one they wrote. */
  readonly unit: 'mg/L' | 'ppm';
  readonly volumeUnit: VolumeUnit;
  readonly units: UnitSystem;
  /** The day of a moment, as this person's language and the cellar's calendar have it. */
  readonly day: (at: number) => string;
}

/** The manner of one reading of a message. */
export function mannerOf(
  reading: Reading,
  decimalMark: Understood['decimalMark'],
  { settings, message }: Pick<Here, 'settings' | 'message'>,
): Manner {
  return {
    mark: decimalMark,
    unit: reading.concentrationUnit === 'ppm' ? 'ppm' : 'mg/L',
    volumeUnit: reading.volumeUnit ?? settings.volumeUnit,
    units: systemOf(reading.volumeUnit) ?? settings.units,
    day: (at) => dayText(at, { zone: zoneOf(settings), language: settings.language, now: message.at }),
  };
}

function systemOf(unit: VolumeUnit | undefined): UnitSystem | undefined {
  if (unit === undefined || unit === 'barrel') return undefined;
  return unit === 'galUS' ? 'us' : unit === 'galUK' ? 'imperial' : 'metric';
}

/** A concentration with the person's unit: `48 mg/L`. */
export function perLitre(mg_L: number, manner: Manner): string {
  return `${concentrationText(mg_L, manner.mark)} ${manner.unit}`;
}

/** A molecular concentration with the person's unit: `0.36 mg/L`. */
export function molecularPerLitre(mg_L: number, manner: Manner): string {
  return `${molecularText(mg_L, manner.mark)} ${manner.unit}`;
}
