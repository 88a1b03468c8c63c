import type { SourceKey } from '../sources.ts';
import type { Style } from '../wine.ts';

/** One limit on file. */
export interface Limit {
  readonly rule: string;
  readonly of: 'total';
  readonly operator: '<=';
  readonly limit_mg_L: number;
  readonly source: SourceKey;
}

/** A row of the code: which wines it is for. */
export interface LimitRow extends Limit {
  readonly styles: readonly Style[];
  /** Sugar (reducing substances) in g/L: up to and including, or above. */
  readonly sugar: { readonly upTo_g_L: number } | { readonly above_g_L: number };
}

const shared = { of: 'total', operator: '<=', source: 'oiv-c1-01' } as const;

/**
 * Total SO2 of still wine by the international code, in mg/L at the time of sale. It recommends; a country's law
 * decides. Sugar is reducing substances in g/L. The 400 mg/L of "some sweet white wines" is no row: it is never inferred.
 *
 * Source: OIV-MA-C1-01 (Oeno 9/98), read.
 *
 * @example
 * ```ts
 * LIMIT_ROWS.map((row) => row.limit_mg_L) // => [150, 200, 300]
 * ```
 */
export const LIMIT_ROWS: readonly LimitRow[] = [
  { ...shared, rule: 'oiv-red-dry', limit_mg_L: 150, styles: ['red'], sugar: { upTo_g_L: 4 } },
  {
    ...shared,
    rule: 'oiv-white-rosé-dry',
    limit_mg_L: 200,
    styles: ['white', 'rosé'],
    sugar: { upTo_g_L: 4 },
  },
  {
    ...shared,
    rule: 'oiv-above-4',
    limit_mg_L: 300,
    styles: ['red', 'white', 'rosé'],
    sugar: { above_g_L: 4 },
  },
];

/** mg/L below a limit from which it is worth a word (own threshold). */
export const NEAR_LIMIT_mg_L = 15;
