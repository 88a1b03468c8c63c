import { assertBetween, assertWithinBounds } from '../bounds.ts';

/** How a person allows for binding: a share added to the dose, or the share of it that is lost. */
export interface Allowance {
  readonly binding_allowance_percent?: number;
  readonly binding_share?: number;
}

/**
 * SO2 that has to go in for a wanted rise of free SO2.
 *
 * @param add_mg_L wanted rise, mg/L, 0 or more
 * @param allowance a percentage added (× (1 + p)) or a share that binds (÷ (1 − s)), never both
 * @returns mg/L
 * @throws RangeError outside `BOUNDS`; TypeError for both at once, as they say the same thing twice
 *
 * @example
 * ```ts
 * doseFor(20, {}) // => 20
 * doseFor(20, { binding_allowance_percent: 30 }) // => 26
 * doseFor(20, { binding_share: 1 / 3 }) // => 30
 * ```
 */
export function doseFor(add_mg_L: number, allowance: Allowance): number {
  const { binding_allowance_percent: percent, binding_share: share } = allowance;
  assertBetween('work out a dose', 'add_mg_L', add_mg_L, 0);
  assertWithinBounds('work out a dose', 'binding_allowance_percent', percent);
  assertWithinBounds('work out a dose', 'binding_share', share);
  if (percent !== undefined && share !== undefined) {
    throw new TypeError(
      `Cannot work out a dose with an allowance and a share that binds: current values are ${percent} % and ${share}`,
    );
  }
  if (share !== undefined) return add_mg_L / (1 - share);
  return add_mg_L * (1 + (percent ?? 0) / 100);
}

/**
 * The binding that an added percentage makes up for: 30 % more covers a binding of 23 %.
 *
 * @param binding_allowance_percent %, 0 or more
 * @returns per cent of the addition that may bind
 * @throws RangeError outside `BOUNDS`
 *
 * @example
 * ```ts
 * bindingCovered(30) // => 23.08
 * bindingCovered(50) // => 33.33
 * ```
 */
export function bindingCovered(binding_allowance_percent: number): number {
  assertWithinBounds(
    'work out what an allowance covers',
    'binding_allowance_percent',
    binding_allowance_percent,
  );
  return (100 * binding_allowance_percent) / (100 + binding_allowance_percent);
}
