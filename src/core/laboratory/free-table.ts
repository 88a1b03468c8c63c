import { assertBetween, BOUNDS } from '../bounds.ts';
import { freeSO2Needed } from '../chemistry/free-so2-needed.ts';

/** A row of the table: free SO2 in mg/L that each molecular target needs at a pH. */
export interface FreeRow {
  readonly ph: number;
  readonly free_mg_L: readonly number[];
}

/** What a table is made for: molecular targets in mg/L, pH from and to, and the constant that it rests on. */
export interface FreeTableRequest {
  readonly molecular_mg_L: readonly number[];
  readonly ph_from: number; // pH
  readonly ph_to: number; // pH
  readonly pK: number;
}

/** Most rows of a table, so that it stands on one screen of a phone (own threshold). */
export const TABLE_ROWS_MOST = 14;

/** The steps of pH that a table may have; the finest that keeps it on one screen is taken. */
const STEPS_IN_HUNDREDTHS = [5, 10, 20, 50] as const;

/**
 * Free SO2 in mg/L that molecular targets need over the pH, in steps of 0.1 pH, of 0.05 below half a unit, and wider
 * where it would fill more than a screen.
 *
 * @throws RangeError outside `BOUNDS`, or where the pH falls from `ph_from` to `ph_to`
 *
 * Source: OIV-MA-AS323-04C 2.1 (read), turned round.
 *
 * @example
 * ```ts
 * freeTable({ molecular_mg_L: [0.8], ph_from: 3.4, ph_to: 3.6, pK: 1.81 }).map((row) => row.ph) // => [3.4, 3.45, 3.5, 3.55, 3.6]
 * freeTable({ molecular_mg_L: [0.5, 0.8], ph_from: 3.5, ph_to: 3.5, pK: 1.81 })[0]?.free_mg_L // => [24.98894, 39.9823]
 * ```
 */
export function freeTable({ molecular_mg_L, ph_from, ph_to, pK }: FreeTableRequest): readonly FreeRow[] {
  assertBetween('make a table', 'ph_from', ph_from, BOUNDS.ph.min, BOUNDS.ph.max);
  assertBetween('make a table', 'ph_to', ph_to, ph_from, BOUNDS.ph.max);
  // Hundredths are counted, so that no row is lost to a hair of rounding.
  const from = Math.round(ph_from * 100);
  const to = Math.round(ph_to * 100);
  const fits = STEPS_IN_HUNDREDTHS.filter((one) => one >= (to - from >= 50 ? 10 : 5));
  const step = fits.find((one) => Math.floor((to - from) / one) < TABLE_ROWS_MOST) ?? 50;
  const rows: FreeRow[] = [];
  for (let at = from; at <= to; at += step) {
    const ph = at / 100;
    rows.push({ ph, free_mg_L: molecular_mg_L.map((one) => freeSO2Needed(one, ph, pK)) });
  }
  return rows;
}
