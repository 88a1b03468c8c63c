import type { LimitFacts } from './limit-facts.ts';
import type { LimitRow, LimitUnit } from './limit-row.ts';
import type { Limit } from './limit.ts';

/** The density that a limit by mass is taken at where nobody said the wine's: that of a dry wine, the strictest, kg/L. */
export const DENSITY_ASSUMED_kg_L = 0.99;

/** What one of the unit is in mg/L, without the density. */
const PER_UNIT: Readonly<Record<LimitUnit, number>> = {
  'mg/L': 1,
  'mg/dm3': 1,
  ppm: 1, // of wine, in the markets that write it, it is read as mg/L
  'ppm added': 1,
  'g/L': 1000,
  'mg/kg': 1,
  'g/kg': 1000,
};

/**
 * A row as the limit of a wine: in mg/L, with the uplift of a declared year where the row takes one. A limit by mass
 * is taken at the wine's density, or at 0.990 kg/L: mg/L = mg/kg × kg/L.
 *
 * @param row with its figure
 * @param facts density in kg/L
 * @throws RangeError for a row without a figure, or of added SO2
 *
 * Source: the row's text.
 *
 * @example
 * ```ts
 * const row = { id: 'example', region: 'codex', products: ['still'], of: 'total', operator: '<=', value: 350, unit: 'mg/kg', text: 'codex', checked: 'law-text', status: 'in-force' }
 * limitOfRow(row, {}).limit_mg_L // => 346.5
 * limitOfRow(row, { density_kg_L: 1.02 }).limit_mg_L // => 357
 * ```
 */
export function limitOfRow(row: LimitRow, facts: Pick<LimitFacts, 'density_kg_L' | 'uplift'>): Limit {
  const { id, value, unit, of } = row;
  if (value === undefined || of === 'added')
    throw new RangeError(`Cannot take ${id} as a limit as it has no figure to compare a wine with`);
  const isByMass = unit === 'mg/kg' || unit === 'g/kg';
  const density_kg_L = facts.density_kg_L ?? DENSITY_ASSUMED_kg_L;
  const uplift_mg_L = facts.uplift === true ? row.uplift_mg_L : undefined;
  const bare_mg_L = value * PER_UNIT[unit] * (isByMass ? density_kg_L : 1);
  return {
    rule: id,
    region: row.region,
    of: of === 'free' ? 'free' : 'total',
    operator: row.operator,
    limit_mg_L: Number((bare_mg_L + (uplift_mg_L ?? 0)).toPrecision(12)),
    confidence: row.checked === 'memory' ? 'unconfirmed' : 'read',
    as_written: { value, unit },
    ...(isByMass ? { density_kg_L } : {}),
    ...(uplift_mg_L === undefined ? {} : { uplift_mg_L }),
  };
}
