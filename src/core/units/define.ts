import type mathjs from 'mathjs/lib/browser/math.js';

/** mathjs, with the three units of this project beside its own. */
export type Mathjs = typeof mathjs;

/**
 * The one mathjs instance of the project, loaded when it is asked for: it takes a quarter of a second, so it
 * never stands between a question and its answer. It knows `galUS` (3.785411784 L), `galUK` (4.54609 L) and `ppm`
 * (1 mg/L, as the trade uses it in wine), and holds the factors of this folder and every line of a working to account.
 * It is only ever given unit ids of this folder and lines of a working, never a person's words: `5 pH` would be
 * picohenry to it.
 *
 * Source: the gallons by legal definition (NIST Handbook 44, UK Weights and Measures Act; from memory).
 *
 * @example
 * ```ts
 * const math = await loadMathjs();
 * math.evaluate('1450 galUS').toNumber('L') // => 5488.8470868
 * math.evaluate('18 ppm').toNumber('mg/L') // => 18
 * ```
 */
export async function loadMathjs(): Promise<Mathjs> {
  // The single file loads in a tenth of a second, the many small ones in half a second and more.
  const { default: math } = await import('mathjs/lib/browser/math.js');
  // The same units again change nothing: whoever asks first, they are there.
  math.createUnit({ galUS: '3.785411784 L', galUK: '4.54609 L', ppm: '1 mg/L' }, { override: true });
  return math;
}
