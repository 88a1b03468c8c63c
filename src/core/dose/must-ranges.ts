import type { SourceKey } from '../sources.ts';

/** How sound the fruit of a must is. */
export type FruitState = 'sound' | 'damaged' | 'rot';

/** A published range of SO2 for must, mg/L (g/hL × 10). */
export interface MustRange {
  readonly state: FruitState;
  /** Where it was published for red fruit alone. */
  readonly style?: 'red';
  readonly low_mg_L: number;
  readonly high_mg_L: number;
  readonly source: SourceKey;
}

/**
 * What was published for grapes at the crusher, by their state: 4 and 5 to 6 g/hL from consultants in a trade journal
 * (read); for red 5 at high and 5 to 8 at low acidity, 8 to 10 with rot from a handbook (from memory).
 *
 * @example
 * ```ts
 * MUST_RANGES.find(({ state }) => state === 'sound')?.low_mg_L // => 40
 * ```
 */
export const MUST_RANGES: readonly MustRange[] = [
  { state: 'sound', low_mg_L: 40, high_mg_L: 40, source: 'reussir-vigne' },
  { state: 'sound', style: 'red', low_mg_L: 50, high_mg_L: 80, source: 'handbook-enology-8' },
  { state: 'damaged', low_mg_L: 50, high_mg_L: 60, source: 'reussir-vigne' },
  { state: 'rot', style: 'red', low_mg_L: 80, high_mg_L: 100, source: 'handbook-enology-8' },
];

/**
 * The ranges for one state of the fruit, without those for another colour.
 *
 * @param style the colour, where it is known
 *
 * @example
 * ```ts
 * mustRangesFor('sound', 'white').length // => 1
 * ```
 */
export function mustRangesFor(state: FruitState, style?: string): readonly MustRange[] {
  return MUST_RANGES.filter(
    (range) =>
      range.state === state && (range.style === undefined || style === undefined || range.style === style),
  );
}

/**
 * The figures of those ranges that somebody may choose from, mg/L, rising.
 *
 * @example
 * ```ts
 * mustFigures('sound') // => [40, 50, 80]
 * mustFigures('damaged') // => [50, 60]
 * ```
 */
export function mustFigures(state: FruitState, style?: string): readonly number[] {
  const figures = mustRangesFor(state, style).flatMap(({ low_mg_L, high_mg_L }) => [low_mg_L, high_mg_L]);
  return [...new Set(figures)].toSorted((a, b) => a - b);
}
