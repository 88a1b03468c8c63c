import { assertBetween } from '../bounds.ts';
import { DAY_ms } from '../time/durations.ts';
import { FREE_LOW_mg_L } from './free-expected.ts';

/** One addition with free SO2 before and after it, mg/L; times in milliseconds since 1970. */
export interface BindingCase {
  readonly at: number;
  readonly added_at: number;
  readonly added_mg_L: number;
  /** When free SO2 was read before the addition. */
  readonly before_at: number;
  readonly before_mg_L: number;
  readonly after_mg_L: number;
}

/** How a wine has bound what was added to it: the share, its ± (two standard deviations), and of how many additions. */
export interface Learned {
  readonly share: number;
  /** A share too. */
  readonly spread: number;
  /** How many additions. */
  readonly cases: number;
}

/** Fewest additions that anything is learned of. */
export const CASES_FEWEST = 2;

/** A reading later than so many days after the addition shows loss as well as binding (own threshold). */
export const LANDED_WITHIN_days = 7;

/** A reading longer than so many days before the addition would count loss as binding (own threshold). */
export const READ_BEFORE_WITHIN_days = 7;

/** An addition smaller than this is lost in the error of the readings, mg/L (own threshold). */
export const CASE_SMALLEST_mg_L = 5;

/** How much an addition counts beside the one after it: the wine changes (own choice). */
const EARLIER_COUNTS = 0.7;

/** Standard deviation of a reading of free SO2 as a share of it: ± 10 % is two of them (common practice, no source). */
const FREE_ERROR_SHARE = 0.05;

interface Weighed {
  readonly share: number;
  /** Variance of the share by the error of both readings. */
  readonly variance: number;
  /** Pure number. */
  readonly weight: number;
}

const shareOf = ({ before_mg_L, after_mg_L, added_mg_L }: BindingCase): number =>
  1 - (after_mg_L - before_mg_L) / added_mg_L;

/**
 * Whether an addition tells how the wine binds: large enough, read soon before and after, with figures that can be right.
 * Where almost nothing was free, all may bind at first, which tells nothing of the next addition.
 */
function isTelling(one: BindingCase): boolean {
  const share = shareOf(one);
  return (
    one.added_mg_L >= CASE_SMALLEST_mg_L &&
    one.before_mg_L >= FREE_LOW_mg_L &&
    one.added_at - one.before_at <= READ_BEFORE_WITHIN_days * DAY_ms &&
    one.at - one.added_at <= LANDED_WITHIN_days * DAY_ms &&
    share >= 0 &&
    share <= 1
  );
}

/**
 * The share of an addition that this wine has bound so far, by at least two additions with readings before and after.
 * The newest counts most, each earlier one 0.7 times the next, and less where a small addition says little. Undefined
 * for fewer. The ± is what the error of the readings leaves, or what the additions differ by, whichever is more.
 *
 * Range: SO2 in mg/L; shares from 0 to 1.
 * Source: definition; share bound = 1 − rise ÷ addition; error of a reading ± 10 % (common practice, no source).
 *
 * @param cases oldest first
 *
 * @example
 * ```ts
 * const one = { at: 1, added_at: 0, added_mg_L: 30, before_at: 0, before_mg_L: 18, after_mg_L: 36 };
 * learnBinding([one, { ...one, added_mg_L: 20, after_mg_L: 30 }])?.share // => 0.4
 * learnBinding([one, one])?.cases // => 2
 * learnBinding([one]) // => undefined
 * ```
 */
export function learnBinding(cases: readonly BindingCase[]): Learned | undefined {
  const telling = cases.filter(isTelling);
  if (telling.length < CASES_FEWEST) return undefined;
  const weighed = telling.map((one, i): Weighed => {
    const error = FREE_ERROR_SHARE * Math.hypot(one.before_mg_L, one.after_mg_L);
    const variance = Math.max((error / one.added_mg_L) ** 2, 1e-6);
    return {
      share: shareOf(one),
      variance,
      weight: EARLIER_COUNTS ** (telling.length - 1 - i) / variance,
    };
  });
  const all = weighed.reduce((sum, { weight }) => sum + weight, 0);
  const share = weighed.reduce((sum, one) => sum + one.weight * one.share, 0) / all;
  const parts = weighed.reduce((sum, { weight }) => sum + (weight / all) ** 2, 0);
  const byError = weighed.reduce((sum, one) => sum + (one.weight / all) ** 2 * one.variance, 0);
  const apart = weighed.reduce((sum, one) => sum + (one.weight / all) * (one.share - share) ** 2, 0);
  const byCases = (apart / (1 - parts)) * parts;
  return { share, spread: 2 * Math.sqrt(Math.max(byError, byCases)), cases: telling.length };
}

/**
 * What two wines that are mixed bind: their shares by volume. Undefined where nothing is known of one of them.
 *
 * @param volume_L litres of each, above 0
 * @throws RangeError for volumes that are not above 0
 *
 * Source: what binds in a litre of either still binds in the blend (mass balance).
 *
 * @example
 * ```ts
 * const [a, b] = [{ share: 0.3, spread: 0.06, cases: 3 }, { share: 0.5, spread: 0.08, cases: 2 }];
 * mixBinding([a, 3000], [b, 1000])?.share // => 0.35
 * mixBinding([a, 3000], [undefined, 1000]) // => undefined
 * ```
 */
export function mixBinding(
  [one, one_L]: readonly [Learned | undefined, number],
  [other, other_L]: readonly [Learned | undefined, number],
): Learned | undefined {
  if (one === undefined || other === undefined) return undefined;
  assertBetween('mix what binds', 'volume_L', Math.min(one_L, other_L), Number.MIN_VALUE);
  const part = one_L / (one_L + other_L);
  return {
    share: part * one.share + (1 - part) * other.share,
    spread: Math.hypot(part * one.spread, (1 - part) * other.spread),
    cases: one.cases + other.cases,
  };
}

/**
 * What is known of the binding with what was known before (of the wines that a blend was made of): by the inverse of
 * their squared ±, as two measurements of one thing are put together.
 *
 * Range: shares from 0 to 1. Source: weighted mean (general).
 *
 * @example
 * ```ts
 * joinBinding({ share: 0.3, spread: 0.1, cases: 2 }, { share: 0.5, spread: 0.1, cases: 2 })?.share // => 0.4
 * joinBinding(undefined, { share: 0.5, spread: 0.1, cases: 2 })?.share // => 0.5
 * ```
 */
export function joinBinding(before: Learned | undefined, since: Learned | undefined): Learned | undefined {
  if (before === undefined || since === undefined) return since ?? before;
  const [a, b] = [1 / before.spread ** 2, 1 / since.spread ** 2];
  return {
    share: (a * before.share + b * since.share) / (a + b),
    spread: 1 / Math.sqrt(a + b),
    cases: before.cases + since.cases,
  };
}
