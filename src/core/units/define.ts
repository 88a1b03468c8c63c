// The single file loads in a tenth of a second, the many small ones in half a second and more.
import mathjs from 'mathjs/lib/browser/math.js';

/**
 * The one mathjs instance of the project. It knows three units beside its own: `galUS` (3.785411784 L),
 * `galUK` (4.54609 L) and `ppm` (1 mg/L, as the trade uses it in wine). It is only ever given unit ids
 * of this folder and lines of a working, never a person's words: `5 pH` would be picohenry to it.
 *
 * Source: the gallons by legal definition (NIST Handbook 44, UK Weights and Measures Act; from memory).
 *
 * @example
 * ```ts
 * math.evaluate('1450 galUS').toNumber('L') // => 5488.8470868
 * math.evaluate('18 ppm').toNumber('mg/L') // => 18
 * ```
 */
export const math = mathjs;

// A second copy of this module in one process (tests do that) must not fail on its own units.
math.createUnit({ galUS: '3.785411784 L', galUK: '4.54609 L', ppm: '1 mg/L' }, { override: true });

/**
 * How many of one unit make another, through the mathjs instance. For load time only: it costs microseconds.
 *
 * @param from a unit that mathjs knows
 * @param to a unit of the same dimension
 * @throws Error when the dimensions differ
 *
 * @example
 * ```ts
 * factorOf('lb', 'g') // => 453.59237
 * ```
 */
export function factorOf(from: string, to: string): number {
  return math.unit(1, from).toNumber(to);
}
