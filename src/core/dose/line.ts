import type { SourceKey } from '../sources.ts';
import { STEP_KINDS, type StepKind, type StepName } from '../step-names.ts';
import { SHOWN_UNITS, type ShownUnit } from '../units/shown.ts';
import { roundTo, termOf, type Step, type Term } from '../working.ts';

/** A line of the working, and its printed result as the next line takes it up. */
export interface Line {
  readonly step: Step;
  readonly result: Term;
}

/** Fewest significant digits of a working. */
export const FEWEST_DIGITS = 4;

/** Most significant digits of a working: all that a number has. */
export const MOST_DIGITS = 15;

/**
 * One line of the working: the term is computed, printed and passed on in one go.
 *
 * @param name which line; symbol, formula and source come with it
 * @param term the numbers put in
 * @param unit unit of the result
 * @param digits significant digits of the result
 * @param source in place of the line's own
 *
 * @example
 * ```ts
 * line('so2-mass', { text: '30 mg/L * 10 L', value: 300, holds: 'product' }, 'g', 4).step.result // => { value: 0.3, unit: 'g' }
 * ```
 */
export function line(name: StepName, term: Term, unit: ShownUnit, digits: number, source?: SourceKey): Line {
  const kind: StepKind = STEP_KINDS[name];
  const value = roundTo(term.value / SHOWN_UNITS[unit], digits);
  const from = source ?? kind.source;
  return {
    step: {
      symbol: kind.symbol,
      name,
      formula: kind.formula,
      substituted: term.text,
      result: { value, unit },
      ...(from === undefined ? {} : { source: from }),
    },
    result: termOf(value, unit, SHOWN_UNITS[unit], MOST_DIGITS),
  };
}

/**
 * A working with as few digits, from 4 to 15, as still lead to the figure that is shown.
 *
 * @param work makes the lines with so many significant digits
 * @param isRight whether the printed figures lead there
 *
 * @example
 * ```ts
 * withEnoughDigits((digits) => digits, (digits) => digits > 5) // => 6
 * ```
 */
export function withEnoughDigits<T>(work: (digits: number) => T, isRight: (made: T) => boolean): T {
  let made = work(FEWEST_DIGITS);
  for (let digits = FEWEST_DIGITS + 1; digits <= MOST_DIGITS && !isRight(made); digits += 1) {
    made = work(digits);
  }
  return made;
}

/**
 * Whether two figures print alike; a hair apart at a rounding mark, they do.
 *
 * @param a in any unit, finite
 * @param b in the unit of `a`: mg/L, g, mL
 * @param digits significant digits, 4 by default
 *
 * @example
 * ```ts
 * printAlike(26.9075, 26.91) // => true
 * printAlike(11.25, 11.249999999999998, 3) // => true
 * ```
 */
export function printAlike(a: number, b: number, digits: number = FEWEST_DIGITS): boolean {
  return Math.abs(a - b) <= 1e-12 * Math.abs(b) || roundTo(a, digits) === roundTo(b, digits);
}
