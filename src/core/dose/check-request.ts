import { assertWithinBounds } from '../bounds.ts';
import type { DoseRequest, StatedAmount, WineFacts } from './request.ts';

/**
 * Refuses facts of a wine that no caller may hand in: NaN, infinities, negative and absurd figures.
 *
 * @param action what the caller wanted, for the message
 * @throws RangeError naming action, value and bound
 *
 * @example
 * ```ts
 * checkFacts('dose', { ph: 3.5, free_mg_L: 20 }) // => undefined
 * ```
 */
export function checkFacts(action: string, facts: WineFacts & { readonly volume_L?: number }): void {
  assertWithinBounds(action, 'ph', facts.ph);
  assertWithinBounds(action, 'free_mg_L', facts.free_mg_L);
  assertWithinBounds(action, 'total_mg_L', facts.total_mg_L);
  assertWithinBounds(action, 'temperature_C', facts.temperature_C);
  assertWithinBounds(action, 'alcohol_percent', facts.alcohol_percent);
  assertWithinBounds(action, 'sugar_g_L', facts.sugar_g_L);
  assertWithinBounds(action, 'volume_L', facts.volume_L);
}

/**
 * Refuses a request for a dose that no caller may hand in.
 *
 * @throws RangeError naming action, value and bound; TypeError for an allowance and a share at once
 *
 * @example
 * ```ts
 * checkDoseRequest({ stage: 'finished', stageStated: true, targetStated: false, basis: 'pk-1.81' }) // => undefined
 * ```
 */
export function checkDoseRequest(request: DoseRequest): void {
  checkFacts('dose', request);
  const { target, vessels } = request;
  if (target !== undefined) {
    if ('free_mg_L' in target) assertWithinBounds('dose', 'target_free_mg_L', target.free_mg_L);
    if ('molecular_mg_L' in target)
      assertWithinBounds('dose', 'target_molecular_mg_L', target.molecular_mg_L);
    if ('add_mg_L' in target) assertWithinBounds('dose', 'target_add_mg_L', target.add_mg_L);
  }
  assertWithinBounds('dose', 'binding_allowance_percent', request.binding_allowance_percent);
  assertWithinBounds('dose', 'binding_share', request.binding_share);
  assertWithinBounds('dose', 'vessels', vessels);
  if (vessels !== undefined && !Number.isInteger(vessels)) {
    throw new RangeError(`Cannot dose as vessels must be a whole number: current value is ${vessels}`);
  }
}

/**
 * Refuses an amount that no caller may hand in.
 *
 * @throws RangeError naming action, value and bound
 *
 * @example
 * ```ts
 * checkAmount('tell the effect', { mass_g: 100 }) // => undefined
 * ```
 */
export function checkAmount(action: string, amount: StatedAmount): void {
  assertWithinBounds(action, 'mass_g', amount.mass_g);
  assertWithinBounds(action, 'additive_volume_mL', amount.additive_volume_mL);
  assertWithinBounds(action, 'tablets', amount.tablets);
  assertWithinBounds(action, 'rate_mg_L', amount.rate_mg_L);
  assertWithinBounds(action, 'added_mg_L', amount.added_mg_L);
}
