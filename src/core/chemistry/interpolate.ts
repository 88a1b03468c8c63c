import { assertBetween } from '../bounds.ts';
import type { DissociationTable } from './dissociation-tables.ts';

/** What is looked up in: rows, columns and values of a table of constants. */
type Grid = Pick<DissociationTable, 'alcohol_percent' | 'temperature_C' | 'pK'>;

/** The four values of a table around a point, and the lines they stand on. */
export interface Cell {
  readonly alcohol_percent: readonly [number, number];
  readonly temperature_C: readonly [number, number];
  /** pK at [low alcohol, low temperature], [low, high], [high, low], [high, high]. */
  readonly pK: readonly [number, number, number, number];
}

const below = (marks: readonly number[], value: number): number => {
  let i = marks.length - 2;
  while (i > 0 && value < (marks[i] ?? 0)) i -= 1;
  return i;
};

/**
 * The cell of a table in which a point lies.
 *
 * @param alcohol_percent % vol, inside the table
 * @param temperature_C °C, inside the table
 * @throws RangeError outside the table
 *
 * @example
 * ```ts
 * cellAround({ alcohol_percent: [10, 15], temperature_C: [20, 25], pK: [[1.9, 2.1], [2, 2.2]] }, 12, 22).pK // => [1.9, 2.1, 2, 2.2]
 * ```
 */
export function cellAround(table: Grid, alcohol_percent: number, temperature_C: number): Cell {
  const { alcohol_percent: rows, temperature_C: columns } = table;
  assertBetween('look up a pK', 'alcohol_percent', alcohol_percent, rows[0] ?? 0, rows.at(-1));
  assertBetween('look up a pK', 'temperature_C', temperature_C, columns[0] ?? 0, columns.at(-1));
  const r = below(rows, alcohol_percent);
  const c = below(columns, temperature_C);
  const at = (row: number, column: number): number => table.pK[row]?.[column] ?? Number.NaN;
  return {
    alcohol_percent: [rows[r] ?? 0, rows[r + 1] ?? 0],
    temperature_C: [columns[c] ?? 0, columns[c + 1] ?? 0],
    pK: [at(r, c), at(r, c + 1), at(r + 1, c), at(r + 1, c + 1)],
  };
}

/**
 * A table's pK between its printed values, straight in both directions.
 *
 * @param alcohol_percent % vol, inside the table
 * @param temperature_C °C, inside the table
 * @returns pK, no unit
 * @throws RangeError outside the table
 *
 * @example
 * ```ts
 * pKBetween({ alcohol_percent: [10, 15], temperature_C: [20, 25], pK: [[1.9, 2.1], [2, 2.2]] }, 12.5, 22.5) // => 2.05
 * ```
 */
export function pKBetween(table: Grid, alcohol_percent: number, temperature_C: number): number {
  const cell = cellAround(table, alcohol_percent, temperature_C);
  const [a0, a1] = cell.alcohol_percent;
  const [t0, t1] = cell.temperature_C;
  const [low_low, low_high, high_low, high_high] = cell.pK;
  const a = (alcohol_percent - a0) / (a1 - a0);
  const t = (temperature_C - t0) / (t1 - t0);
  return (1 - a) * ((1 - t) * low_low + t * low_high) + a * ((1 - t) * high_low + t * high_high);
}
