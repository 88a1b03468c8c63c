import type { AdditiveAtHand } from '../additives/additive-id.ts';
import type { AsStock, Measure, PerVessel, Warning } from './answer.ts';
import { GAS_LEAST_g, RISE_NEGLIGIBLE_mg_L } from './thresholds.ts';

/** What of an amount tells whether it can be measured. */
export interface Sized {
  readonly SO2_g?: number;
  readonly measure?: Measure;
  readonly stock?: AsStock;
  readonly per_vessel?: Pick<PerVessel, 'SO2_g' | 'measure' | 'stock'>;
}

/**
 * That an addition is too small: a rise that no reading shows (below 0.5 mg/L), an amount that no instrument shows,
 * or less of the gas than can be measured out (below 5 g).
 *
 * @param add_mg_L wanted rise, mg/L, 0 or more
 * @param additive what goes in, if known
 * @param portion how much of it, if known
 *
 * Source: own thresholds.
 *
 * @example
 * ```ts
 * smallnessWarnings(0.1) // => [{ code: 'addition-negligible', values: { add_mg_L: 0.1 } }]
 * smallnessWarnings(27, { id: 'sulfur-dioxide-gas' }, { SO2_g: 4, measure: { value: 4, unit: 'g' } }) // => [{ code: 'gas-too-little', values: { SO2_g: 4, least_g: 5 } }]
 * smallnessWarnings(27) // => []
 * ```
 */
export function smallnessWarnings(
  add_mg_L: number,
  additive?: AdditiveAtHand,
  portion?: Sized,
): readonly Warning[] {
  if (add_mg_L === 0) return [];
  const { SO2_g, measure, stock } = portion?.per_vessel ?? portion ?? {};
  const isUnshown = (one: Measure | undefined): boolean => (one?.value ?? 0) === 0;
  const tooFine = SO2_g !== undefined && isUnshown(measure) && isUnshown(stock?.measure);
  if (add_mg_L < RISE_NEGLIGIBLE_mg_L || tooFine)
    return [{ code: 'addition-negligible', values: { add_mg_L } }];
  if (additive?.id === 'sulfur-dioxide-gas' && SO2_g !== undefined && SO2_g < GAS_LEAST_g)
    return [{ code: 'gas-too-little', values: { SO2_g, least_g: GAS_LEAST_g } }];
  return [];
}
