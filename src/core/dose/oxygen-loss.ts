import { assertBetween, assertWithinBounds } from '../bounds.ts';
import { molarMass, SO2_MOLAR_MASS } from '../chemistry/molar-mass.ts';
import { shown } from '../units/shown.ts';
import { plus, times, type Term } from '../working.ts';
import { line, type Line } from './line.ts';
import { number } from './terms.ts';

/** Oxygen that a wine takes up at bottling, and how much SO2 each milligram of it uses up. */
export interface OxygenAtBottling {
  /** Dissolved and in the headspace, mg/L of wine. */
  readonly oxygen_mg_L?: number;
  /** mg of SO2 for 1 mg of oxygen; by the formula where nobody has another figure. */
  readonly SO2_mg_per_mg_O2?: number;
}

/** Two molecules of SO2 for one of oxygen: mg SO2 for 1 mg O2 (standard atomic weights). */
export const SO2_PER_OXYGEN_BY_FORMULA = (2 * SO2_MOLAR_MASS) / molarMass({ O: 2 });

/** mg SO2 for 1 mg O2 as trade figures have it measured; they could not be confirmed (source `oxygen-trade-figure`). */
export const SO2_PER_OXYGEN_MEASURED = 2.5;

/** mg SO2 for 1 mg O2 that somebody may reckon with (own thresholds). */
export const SO2_PER_OXYGEN_BOUNDS = { min: 1, max: 5 } as const;

/**
 * SO2 that oxygen uses up at bottling, mg/L; 0 where none is stated.
 *
 * @param oxygen mg/L of oxygen, from 0 to 20, and mg of SO2 for one of it, from 1 to 5
 * @throws RangeError outside those
 *
 * @example
 * ```ts
 * oxygenLoss({ oxygen_mg_L: 2 }) // => 8.008
 * oxygenLoss({ oxygen_mg_L: 2, SO2_mg_per_mg_O2: 2.5 }) // => 5
 * oxygenLoss({}) // => 0
 * ```
 */
export function oxygenLoss({ oxygen_mg_L, SO2_mg_per_mg_O2 }: OxygenAtBottling): number {
  const action = 'allow for oxygen';
  const each = SO2_mg_per_mg_O2 ?? SO2_PER_OXYGEN_BY_FORMULA;
  assertWithinBounds(action, 'oxygen_mg_L', oxygen_mg_L);
  assertBetween(action, 'SO2_mg_per_mg_O2', each, SO2_PER_OXYGEN_BOUNDS.min, SO2_PER_OXYGEN_BOUNDS.max);
  return (oxygen_mg_L ?? 0) * each;
}

/**
 * The lines that find what oxygen takes, and the free SO2 that has to be there before it; none without oxygen.
 *
 * @param after free SO2 wanted after the loss, mg/L, not negative
 * @param digits significant digits
 *
 * @example
 * ```ts
 * const after = { text: '31.92 mg/L', value: 31.92, holds: 'quantity' };
 * oxygenLines({ oxygen_mg_L: 2 }, after, 4).map(({ step }) => step.substituted) // => ['2 mg/L * 4.0039', '31.92 mg/L + 8.008 mg/L']
 * oxygenLines({}, after, 4) // => []
 * ```
 */
export function oxygenLines(oxygen: OxygenAtBottling, after: Term, digits: number): readonly Line[] {
  const { oxygen_mg_L = 0, SO2_mg_per_mg_O2 } = oxygen;
  if (oxygen_mg_L === 0) return [];
  const each = number(SO2_mg_per_mg_O2 ?? SO2_PER_OXYGEN_BY_FORMULA, digits);
  const source = SO2_mg_per_mg_O2 === undefined ? 'ciaaw-2021' : 'as-stated';
  const loss = line('oxygen-loss', times(shown(oxygen_mg_L, 'mg/L', digits), each), 'mg/L', digits, source);
  return [loss, line('free-before-bottling', plus(after, loss.result), 'mg/L', digits)];
}
