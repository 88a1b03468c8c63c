import { assertBetween, BOUNDS } from '../bounds.ts';
import { doseFor } from '../binding/allowance.ts';
import { FREE_LOW_mg_L } from '../binding/free-expected.ts';
import { aimAt } from '../dose/aim.ts';
import { freeToMolecular } from '../chemistry/free-to-molecular.ts';
import type { DoseRange, RangeRequest } from './range-request.ts';
import { rangeSteps } from './range-steps.ts';

/** ± of a pH as it is usually measured: two standard deviations (common practice, no source). */
export const PH_PLUS_MINUS = 0.05;

/** ± of free SO2 as it is usually measured, in per cent: two standard deviations (common practice, no source). */
export const FREE_PLUS_MINUS_percent = 10;

/** No titration is nearer than this, mg/L: a drop of 0.05 mL at 16 mg/L a mL (common practice, no source). */
export const FREE_PLUS_MINUS_LEAST_mg_L = 1;

/**
 * How far a dose may be off because pH and free SO2 are: both errors are taken as independent and normal, each ± as
 * two standard deviations, and the formula is of first order. Below 10 mg/L free nothing of the dose is counted as sure.
 * SO2 in mg/L, pH without unit.
 *
 * @throws RangeError outside `BOUNDS`, and for a ± of a pH above 0.5
 *
 * Source: propagation of independent errors (general); ± 0.05 and ± 10 % (1 mg/L at least): common practice, no
 * source.
 *
 * @example
 * ```ts
 * import { pKOf } from '../chemistry/dissociation.ts';
 * const range = doseRange({ ph: 3.58, free_mg_L: 21, target: { molecular_mg_L: 0.8 }, dissociation: pKOf('pk-1.81') });
 * range.dose_mg_L // => [21.0917, 32.7233]
 * range.molecular_sure_mg_L // => 0.7029
 * ```
 */
export function doseRange(request: RangeRequest): DoseRange {
  const { ph, free_mg_L, target, dissociation } = request;
  const {
    ph_plus_minus = PH_PLUS_MINUS,
    free_plus_minus_mg_L = Math.max(FREE_PLUS_MINUS_LEAST_mg_L, (free_mg_L * FREE_PLUS_MINUS_percent) / 100),
  } = request;
  assertBetween('tell the range of a dose', 'ph_plus_minus', ph_plus_minus, 0, 0.5);
  assertBetween(
    'tell the range of a dose',
    'free_plus_minus_mg_L',
    free_plus_minus_mg_L,
    0,
    BOUNDS.free_mg_L.max,
  );
  const { pK } = dissociation;
  const aim = aimAt(target, { free_mg_L, ph }, pK);
  const needed_mg_L = aim.target_free_mg_L ?? 0;
  const ratio = freeToMolecular(ph, pK);
  // By how much the need changes with the pH; a target in free SO2 does not change with it.
  const slope = 'molecular_mg_L' in target ? target.molecular_mg_L * (ratio - 1) * Math.LN10 : 0;
  const rise_plus_minus = Math.hypot(slope * ph_plus_minus, free_plus_minus_mg_L);
  const rise = needed_mg_L - free_mg_L;
  const gain = doseFor(1, request);
  const low = Math.max(0, rise - rise_plus_minus) * gain;
  const high = Math.max(0, rise + rise_plus_minus) * gain;
  // Where almost nothing is free all of an addition may bind: sure is only what is there.
  const after_mg_L = free_mg_L < FREE_LOW_mg_L ? free_mg_L : Math.max(needed_mg_L, free_mg_L);
  const relative =
    after_mg_L === 0
      ? 0
      : Math.hypot(free_plus_minus_mg_L / after_mg_L, Math.LN10 * (1 - 1 / ratio) * ph_plus_minus);
  const molecular_sure_mg_L = Math.max(0, (after_mg_L / ratio) * (1 - relative));
  const found = {
    dose_mg_L: [low, high] as const,
    plus_minus_mg_L: rise_plus_minus * gain,
    ph_plus_minus,
    free_plus_minus_mg_L,
    molecular_sure_mg_L,
  };
  return { ...found, steps: rangeSteps(request, { ...found, needed_mg_L, after_mg_L, gain }) };
}
