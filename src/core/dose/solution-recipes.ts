import type { SourceKey } from '../sources.ts';

/** What a solution in water is for, where it is no stock to dose from: to keep an empty barrel, or to rinse equipment. */
export type SolutionUse = 'holding' | 'rinse';

/** Grams that go into a litre of water. */
export interface SolutionRecipe {
  readonly salt_g_per_L: number;
  readonly citric_acid_g_per_L: number;
  readonly source: SourceKey;
}

/**
 * What is usual in the trade, from memory: no source could be read, and a cellar has its own figures. The acid sets
 * free what acts, and gas with it: it is dissolved first, the sulfite goes in last.
 *
 * @example
 * ```ts
 * SOLUTION_RECIPES.holding.salt_g_per_L // => 2
 * ```
 */
export const SOLUTION_RECIPES: Readonly<Record<SolutionUse, SolutionRecipe>> = {
  holding: { salt_g_per_L: 2, citric_acid_g_per_L: 1, source: 'common-practice' },
  rinse: { salt_g_per_L: 0.2, citric_acid_g_per_L: 3, source: 'common-practice' },
};

/** Litres of the barrel for which a stock's millilitres are told (a usual size; common practice). */
export const STOCK_BARREL_L = 225;

/** mg/L of SO2 for which a stock's millilitres are told, where none is named (own choice). */
export const STOCK_RISE_mg_L = 10;
