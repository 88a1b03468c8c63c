import type { Basis } from '../wine.ts';
import type { SourceKey } from '../sources.ts';
import { OIV_TABLE_2 } from './dissociation-tables.ts';
import { pKBetween } from './interpolate.ts';

/** One published dissociation constant of SO2 in water or wine (no unit), and where it is from. */
export interface DissociationConstant {
  readonly pK: number;
  readonly source: SourceKey;
  /** Whether the figure, or the table that it reproduces, was read in a copy. */
  readonly read: boolean;
  readonly note: string;
}

/**
 * The single constants that are in use. Published free-SO2 tables rest on different ones: a table is checked with
 * its own. `pk-1.81` is the default of every dose, as the published targets rest on it.
 *
 * @example
 * ```ts
 * DISSOCIATION_CONSTANTS['pk-1.81'].pK // => 1.81
 * ```
 */
export const DISSOCIATION_CONSTANTS = {
  'pk-1.81': { pK: 1.81, source: 'uc-1982', read: true, note: 'whole-step rows of the table' },
  'pk-1.80': { pK: 1.8, source: 'uc-1982', read: true, note: 'half-step rows of the same table' },
  'pk-1.77': { pK: 1.77, source: 'association-table', read: true, note: 'reproduces 30 of its 30 cells' },
  'pk-1.86': { pK: 1.86, source: 'goldberg-parker-1985', read: false, note: 'thermodynamic, 25 °C' },
  'pk-1.85': { pK: 1.85, source: 'crc-handbook', read: false, note: '25 °C' },
} as const satisfies Readonly<Record<string, DissociationConstant>>;

/** Why a table of constants could not be used, where it was asked for. */
export type FallbackReason =
  | 'alcohol-and-temperature-unknown'
  | 'alcohol-unknown'
  | 'temperature-unknown'
  | 'alcohol-out-of-range'
  | 'temperature-out-of-range';

/** The constant that a figure rests on. With `fallback`, another basis was asked for and could not be used. */
export interface Dissociation {
  readonly pK: number;
  readonly basis: Basis;
  readonly source: SourceKey;
  readonly fallback?: Fallback;
}

/** What the other basis would have been at the nearest point where its table begins. */
export interface Fallback {
  readonly why: FallbackReason;
  /** % vol at which it is compared: the wine's, or the table's nearest; 12 where the alcohol is unknown. */
  readonly compared_at_alcohol_percent: number;
  /** °C at which it is compared: the wine's, or the table's nearest; 20 where the temperature is unknown. */
  readonly compared_at_temperature_C: number;
  readonly compared_pK: number;
}

/** Alcohol at which the tables are compared where the wine's is unknown, % vol (common practice, no source). */
export const COMPARED_ALCOHOL_PERCENT = 12;

const [OIV_ALCOHOL_MIN, OIV_ALCOHOL_MAX] = [0, 20];
const [OIV_TEMPERATURE_MIN_C, OIV_TEMPERATURE_MAX_C] = [20, 40];

const clamp = (value: number, min: number, max: number): number => Math.min(max, Math.max(min, value));

function whyNot(alcohol_percent?: number, temperature_C?: number): FallbackReason | undefined {
  if (alcohol_percent === undefined) {
    return temperature_C === undefined ? 'alcohol-and-temperature-unknown' : 'alcohol-unknown';
  }
  if (alcohol_percent < OIV_ALCOHOL_MIN || alcohol_percent > OIV_ALCOHOL_MAX) return 'alcohol-out-of-range';
  if (temperature_C === undefined) return 'temperature-unknown';
  return temperature_C < OIV_TEMPERATURE_MIN_C || temperature_C > OIV_TEMPERATURE_MAX_C
    ? 'temperature-out-of-range'
    : undefined;
}

/**
 * The dissociation constant of a basis for a wine. The OIV table needs alcohol (0–20 % vol) and temperature
 * (20–40 °C), both known; else the default pK 1.81 is given with the reason, and with the table's value at the
 * nearest point that it has.
 *
 * @param basis `pk-1.81` or `oiv`
 * @param alcohol_percent % vol, if known
 * @param temperature_C °C of the wine, if known
 * @returns pK (no unit), the basis that was used, its source
 * @throws RangeError for NaN and infinities
 *
 * Source: UC Cooperative Extension 1982 (read); OIV-MA-AS323-04C Table II (from memory).
 *
 * @example
 * ```ts
 * pKOf('pk-1.81').pK // => 1.81
 * pKOf('oiv', 10, 20).pK // => 1.916
 * pKOf('oiv', 13, 14).basis // => 'pk-1.81'
 * pKOf('oiv', 13, 14).fallback?.why // => 'temperature-out-of-range'
 * ```
 */
export function pKOf(basis: Basis, alcohol_percent?: number, temperature_C?: number): Dissociation {
  for (const [name, value] of [
    ['alcohol_percent', alcohol_percent],
    ['temperature_C', temperature_C],
  ] as const) {
    if (value !== undefined && !Number.isFinite(value)) {
      throw new RangeError(`Cannot look up a pK as ${name} must be finite: current value is ${value}`);
    }
  }
  const { pK, source } = DISSOCIATION_CONSTANTS['pk-1.81'];
  if (basis === 'pk-1.81') return { pK, basis, source };
  const why = whyNot(alcohol_percent, temperature_C);
  const alcohol = clamp(alcohol_percent ?? COMPARED_ALCOHOL_PERCENT, OIV_ALCOHOL_MIN, OIV_ALCOHOL_MAX);
  const temperature = clamp(
    temperature_C ?? OIV_TEMPERATURE_MIN_C,
    OIV_TEMPERATURE_MIN_C,
    OIV_TEMPERATURE_MAX_C,
  );
  const oiv = pKBetween(OIV_TABLE_2, alcohol, temperature);
  if (why === undefined) return { pK: oiv, basis: 'oiv', source: OIV_TABLE_2.source };
  return {
    pK,
    basis: 'pk-1.81',
    source,
    fallback: {
      why,
      compared_at_alcohol_percent: alcohol,
      compared_at_temperature_C: temperature,
      compared_pK: oiv,
    },
  };
}
