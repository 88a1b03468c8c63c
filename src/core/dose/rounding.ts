import { assertBetween } from '../bounds.ts';
import type { Measure } from './answer.ts';

/** How an amount is measured: on a scale, in a cylinder, or counted. */
export type Instrument = 'scale' | 'cylinder' | 'tablets';

/** What rounding depends on beside the amount. Without `dose_mg_L` there is no wine: only the share counts. */
export interface RoundingLimits {
  /** SO2 that the whole amount gives the wine, mg/L. */
  readonly dose_mg_L?: number;
  /** Most SO2 that may go in, mg/L: a dose that keeps to it is never rounded past it. */
  readonly ceiling_mg_L?: number;
}

/** What the instrument shows, and how it came to that. */
export interface Rounded {
  readonly measure: Measure;
  /** What rounding changes in the wine, mg/L SO2 (above 0: more than the amount); 0 without a wine. */
  readonly rounding_mg_L: number;
  /** The amount itself, in g, mL or tablets. */
  readonly exact: number;
  /** Step of the instrument, in g, mL or tablets. */
  readonly step: number;
  /** Whether it was rounded down in place of to the nearest. */
  readonly down: boolean;
}

/** Rounding is coarse above this share of the dose (own threshold) … */
export const COARSE_SHARE = 0.01;

/** … and above this many mg/L of SO2 (own threshold). */
export const COARSE_mg_L = 0.5;

/** Finest steps: 0.01 g of a pocket balance, 0.1 mL of a syringe (common practice, no source). */
const FINEST = { scale: 0.01, cylinder: 0.1, tablets: 0.5 } as const;

const usualStep = (amount: number): number => {
  if (amount < 10) return 0.1;
  return amount < 1000 ? 1 : 10;
};

const isCoarse = (change: number, amount: number, dose_mg_L: number | undefined): boolean => {
  const share = Math.abs(change) / amount;
  return share > COARSE_SHARE && (dose_mg_L === undefined || share * dose_mg_L > COARSE_mg_L);
};

/**
 * An amount to a whole number of steps.
 *
 * @param amount in g, mL or tablets, not negative
 * @param step in the same unit
 * @param down whether to round down in place of to the nearest
 *
 * @example
 * ```ts
 * toStep(256.28, 1) // => 256
 * toStep(7.26, 0.1, true) // => 7.2
 * ```
 */
export function toStep(amount: number, step: number, down = false): number {
  // A figure a hair below a mark is at the mark: 2.9999999999 tablets are three.
  const steps = (amount / step) * (1 + 1e-10);
  return Number(((down ? Math.floor(steps) : Math.round(steps)) * step).toFixed(2));
}

/**
 * An amount as a scale or cylinder shows it, once, at the rim: under 10 to 0.1, under 1,000 to 1, above to 10
 * (g or mL; kg and L from 1,000); if that changes the wine by more than 1 % of the dose and more than 0.5 mg/L,
 * a finer step down to 0.01 g or 0.1 mL. To the nearest, but never up past a ceiling. Tablets go down to the half.
 *
 * @param amount in g, mL or number of tablets, 0 or more, full precision
 * @param instrument what measures it
 * @param limits the dose in mg/L, and the most that may go in
 * @throws RangeError for NaN, infinities and negative values
 *
 * @example
 * ```ts
 * measureOf(256.28, 'scale', { dose_mg_L: 26.9 }).measure // => { value: 256, unit: 'g' }
 * measureOf(3174.2, 'scale', { dose_mg_L: 26.9 }).measure // => { value: 3.17, unit: 'kg' }
 * measureOf(0.4671, 'scale', { dose_mg_L: 26.9 }).measure // => { value: 0.47, unit: 'g' }
 * measureOf(2.7, 'tablets').measure // => { value: 2.5, unit: 'tablets' }
 * ```
 */
export function measureOf(amount: number, instrument: Instrument, limits: RoundingLimits = {}): Rounded {
  const { dose_mg_L, ceiling_mg_L } = limits;
  assertBetween('round an amount', 'amount', amount, 0);
  assertBetween('round an amount', 'dose_mg_L', dose_mg_L ?? 0, 0);
  const finest = FINEST[instrument];
  const mg_L_of = (part: number): number => (amount === 0 ? 0 : (part / amount) * (dose_mg_L ?? 0));
  let step: number = instrument === 'tablets' ? finest : usualStep(amount);
  let down = instrument === 'tablets';
  let value = toStep(amount, step, down);
  const useless = (): boolean => amount > 0 && (value === 0 || isCoarse(value - amount, amount, dose_mg_L));
  const refine = (): void => {
    while (step > finest * 1.5 && useless()) {
      step = Number((step / 10).toFixed(2));
      value = toStep(amount, step, down);
    }
  };
  refine();
  if (
    ceiling_mg_L !== undefined &&
    dose_mg_L !== undefined &&
    // A hair above the ceiling is at it: two sums of the same figures.
    dose_mg_L <= ceiling_mg_L * (1 + 1e-9) &&
    mg_L_of(value) > ceiling_mg_L
  ) {
    down = true;
    value = toStep(amount, step, true);
    refine();
  }
  const change = value - amount;
  return {
    measure: asShown(value, instrument),
    rounding_mg_L: mg_L_of(change),
    exact: amount,
    step,
    down,
  };
}

function asShown(value: number, instrument: Instrument): Measure {
  if (instrument === 'tablets') return { value, unit: 'tablets' };
  if (value < 1000) return { value, unit: instrument === 'scale' ? 'g' : 'mL' };
  return { value: Number((value / 1000).toFixed(5)), unit: instrument === 'scale' ? 'kg' : 'L' };
}

/**
 * Whether what rounding changes is worth a warning: more than 1 % of the dose and more than 0.5 mg/L.
 *
 * @param rounding_mg_L what rounding changes, mg/L, below or above 0
 * @param dose_mg_L the dose, mg/L
 *
 * @example
 * ```ts
 * isRoundingCoarse(0.6, 27) // => true
 * isRoundingCoarse(0.4, 27) // => false
 * ```
 */
export function isRoundingCoarse(rounding_mg_L: number, dose_mg_L: number): boolean {
  return dose_mg_L > 0 && isCoarse(rounding_mg_L, dose_mg_L, dose_mg_L);
}
