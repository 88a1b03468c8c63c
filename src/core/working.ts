import type { SourceKey } from './sources.ts';

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
  readonly name: string;
  /** The formula in words, English: the locale may translate it by `name`. */
  readonly formula: string;
  readonly substituted: string;
  readonly result: Quantity;
  /** Where the constant or the formula comes from; absent where the line is plain arithmetic. */
  readonly source?: SourceKey;
}
