import type { SourceKey } from './sources.ts';
import type { StepName } from './step-names.ts';

/** A number with its unit as the working shows it; `unit` is `""` for a pure number. */
export interface Quantity {
  readonly value: number;
  readonly unit: string;
}

/**
 * One line of the working, made where the number is made.
 *
 * `substituted` is an expression that mathjs evaluates as it stands (with the units of `core/units`)
 * and that gives `result` within the rounding of the digits it shows.
 */
export interface Step {
  readonly symbol: string;
  /** Which line this is; the sentence that names it is the locale's. */
  readonly name: StepName;
  /** The formula in words, English: the locale may translate it by `name`. */
  readonly formula: string;
  readonly substituted: string;
  readonly result: Quantity;
  /** Where the constant or the formula comes from; absent where the line is plain arithmetic. */
  readonly source?: SourceKey;
}

/**
 * Part of an expression: its text and its number are made together, so they cannot disagree.
 * `value` counts in milligrams, litres and their quotients.
 */
export interface Term {
  readonly text: string;
  readonly value: number;
  /** How tightly the text holds together: a sum, a product or quotient, a number with its unit, a bare number. */
  readonly holds: 'sum' | 'product' | 'quantity' | 'number';
}

/**
 * A number as the working prints it: so many significant digits, but never coarser than ones, as a reader takes
 * every digit before the decimal point for meant.
 *
 * @param value in any unit, finite
 * @param digits 1 to 15
 *
 * @example
 * ```ts
 * roundTo(256.2785, 4) // => 256.3
 * roundTo(10110.86, 4) // => 10111
 * ```
 */
export function roundTo(value: number, digits: number): number {
  return Math.abs(value) >= 10 ** digits ? Math.round(value) : Number(value.toPrecision(digits));
}

/**
 * The digits of a number without exponent, as mathjs and a pocket calculator take them.
 *
 * @param value in any unit, finite
 *
 * @example
 * ```ts
 * plainText(0.00000012) // => '0.00000012'
 * plainText(1450) // => '1450'
 * ```
 */
export function plainText(value: number): string {
  const text = String(value);
  return text.includes('e') ? value.toFixed(20).replace(/\.?0+$/, '') : text;
}

/**
 * A term of one number. What a person typed stays as typed (up to 9 digits); a converted number is rounded.
 *
 * @param value in `unit`
 * @param unit a unit that mathjs knows through `core/units`, or `""`
 * @param inBase how many milligrams, litres, mg/L or ones make one `unit`
 * @param digits significant digits where the number has more than 9
 *
 * @example
 * ```ts
 * termOf(1450, 'galUS', 3.785411784, 6).text // => '1450 galUS'
 * termOf(5488.8470868, 'L', 1, 6).text // => '5488.85 L'
 * ```
 */
export function termOf(value: number, unit: string, inBase: number, digits: number): Term {
  const short = roundTo(value, 9);
  const shown = Math.abs(short - value) <= Math.abs(value) * 1e-14 ? short : roundTo(value, digits);
  const text = plainText(shown);
  return unit === ''
    ? { text, value: shown * inBase, holds: 'number' }
    : { text: `${text} ${unit}`, value: shown * inBase, holds: 'quantity' };
}

const inBrackets = (term: Term): string => `(${term.text})`;
const asFactor = (term: Term): string => (term.holds === 'sum' ? inBrackets(term) : term.text);
const asRightFactor = (term: Term): string =>
  term.holds === 'sum' || term.holds === 'product' ? inBrackets(term) : term.text;

/**
 * Product of two terms.
 *
 * @example
 * ```ts
 * times(termOf(2, '', 1, 4), termOf(3, 'g', 1000, 4)).text // => '2 * 3 g'
 * ```
 */
export function times(a: Term, b: Term): Term {
  return { text: `${asFactor(a)} * ${asRightFactor(b)}`, value: a.value * b.value, holds: 'product' };
}

/**
 * Quotient of two terms; a divisor that is more than a bare number stands in brackets.
 *
 * @example
 * ```ts
 * over(termOf(6, 'g', 1000, 4), termOf(2, 'L', 1, 4)).text // => '6 g / (2 L)'
 * ```
 */
export function over(a: Term, b: Term): Term {
  const divisor = b.holds === 'number' ? b.text : inBrackets(b);
  return { text: `${asFactor(a)} / ${divisor}`, value: a.value / b.value, holds: 'product' };
}

/**
 * Sum of two terms of one dimension.
 *
 * @example
 * ```ts
 * plus(termOf(1, '', 1, 4), termOf(2, '', 1, 4)).text // => '1 + 2'
 * ```
 */
export function plus(a: Term, b: Term): Term {
  return { text: `${a.text} + ${b.text}`, value: a.value + b.value, holds: 'sum' };
}

/**
 * Difference of two terms of one dimension.
 *
 * @example
 * ```ts
 * minus(termOf(3.58, '', 1, 4), termOf(1.81, '', 1, 4)).text // => '3.58 - 1.81'
 * ```
 */
export function minus(a: Term, b: Term): Term {
  const taken = b.holds === 'sum' ? inBrackets(b) : b.text;
  return { text: `${a.text} - ${taken}`, value: a.value - b.value, holds: 'sum' };
}

/**
 * Ten to the power of a pure number.
 *
 * @example
 * ```ts
 * tenTo(termOf(2, '', 1, 4)).value // => 100
 * ```
 */
export function tenTo(a: Term): Term {
  return { text: `10^(${a.text})`, value: 10 ** a.value, holds: 'number' };
}
