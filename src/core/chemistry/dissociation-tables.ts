import type { SourceKey } from '../sources.ts';

/** A published table of pK by alcohol (rows, % vol) and temperature (columns, °C). */
export interface DissociationTable {
  readonly source: SourceKey;
  /** Whether every row was read in a copy; `rowsFromMemory` names the rows that were not. */
  readonly read: boolean;
  readonly rowsFromMemory: readonly number[];
  readonly alcohol_percent: readonly number[];
  readonly temperature_C: readonly number[];
  readonly pK: readonly (readonly number[])[];
}

const ALCOHOL_PERCENT = [0, 5, 10, 15, 20] as const;
const OIV_TEMPERATURE_C = [20, 25, 30, 35, 40] as const;

/**
 * OIV-MA-AS323-04C, Table I: the thermodynamic pKT (no unit), 0–20 % vol, 20–40 °C.
 * Read for 0 to 15 % vol; the row of 20 % is from memory (its second differences continue the printed ones).
 *
 * @example
 * ```ts
 * OIV_TABLE_1.pK[2] // => [1.997, 2.198, 2.394, 2.488, 2.606]
 * ```
 */
export const OIV_TABLE_1: DissociationTable = {
  source: 'oiv-as323-04c',
  read: true,
  rowsFromMemory: [20],
  alcohol_percent: ALCOHOL_PERCENT,
  temperature_C: OIV_TEMPERATURE_C,
  pK: [
    [1.798, 2.0, 2.219, 2.334, 2.493],
    [1.897, 2.098, 2.299, 2.397, 2.527],
    [1.997, 2.198, 2.394, 2.488, 2.606],
    [2.099, 2.301, 2.503, 2.607, 2.728],
    [2.203, 2.406, 2.628, 2.754, 2.895],
  ],
};

/**
 * OIV-MA-AS323-04C, Table II: the mixed pKM (no unit) at ionic strength 0.038, 0–20 % vol, 20–40 °C.
 * All of it from memory; `ionicTerm` anchors it to Table I within 0.001 at 20, 25, 30 and 40 °C (0 to 15 % vol).
 *
 * @example
 * ```ts
 * OIV_TABLE_2.pK[2] // => [1.916, 2.116, 2.311, 2.405, 2.522]
 * ```
 */
export const OIV_TABLE_2: DissociationTable = {
  source: 'oiv-as323-04c-table-2',
  read: false,
  rowsFromMemory: [0, 5, 10, 15, 20],
  alcohol_percent: ALCOHOL_PERCENT,
  temperature_C: OIV_TEMPERATURE_C,
  pK: [
    [1.723, 1.925, 2.143, 2.257, 2.416],
    [1.819, 2.02, 2.22, 2.317, 2.446],
    [1.916, 2.116, 2.311, 2.405, 2.522],
    [2.014, 2.216, 2.417, 2.52, 2.64],
    [2.114, 2.317, 2.538, 2.663, 2.803],
  ],
};

/**
 * Usseglio-Tomasset & Bosia 1984 (no unit), 0–20 % vol, 19–40 °C, as handbooks tabulate it; from memory.
 * At 25 °C it agrees with OIV Table I within 0.012, at 40 °C and 5–15 % vol it lies 0.05 to 0.07 above it.
 *
 * @example
 * ```ts
 * USSEGLIO_TOMASSET_1984.pK[2]?.[2] // => 2.21
 * ```
 */
export const USSEGLIO_TOMASSET_1984: DissociationTable = {
  source: 'usseglio-tomasset-1984',
  read: false,
  rowsFromMemory: [0, 5, 10, 15, 20],
  alcohol_percent: ALCOHOL_PERCENT,
  temperature_C: [19, 22, 25, 28, 31, 34, 37, 40],
  pK: [
    [1.78, 1.85, 2.0, 2.14, 2.25, 2.31, 2.37, 2.48],
    [1.88, 1.96, 2.11, 2.24, 2.34, 2.4, 2.47, 2.58],
    [1.98, 2.06, 2.21, 2.34, 2.45, 2.52, 2.58, 2.68],
    [2.08, 2.16, 2.31, 2.45, 2.54, 2.61, 2.67, 2.78],
    [2.18, 2.26, 2.41, 2.55, 2.64, 2.72, 2.78, 2.88],
  ],
};
