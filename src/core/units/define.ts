import type mathjs from 'mathjs/lib/browser/math.js';

/** mathjs, with the three units of this project beside its own. */
export type Mathjs = typeof mathjs;

let loading: Promise<Mathjs> | undefined;

/**
 * The one mathjs instance of the project, loaded when it is first asked for: it takes a quarter of a second, so it
 * never stands between a question and its answer. It knows `galUS` (3.785411784 L), `galUK` (4.54609 L) and `ppm`
 * (1 mg/L, as the trade uses it in wine), and holds the factors of this folder and every line of a working to account.
 * It is only ever given unit ids of this folder and lines of a working, never a person's words: `5 pH` would be
 * picohenry to it.
 *
 * Source: the gallons by legal definition (NIST Handbook 44, UK Weights and Measures Act; from memory).
 *
 * @example
 * ```ts
 * (await loadMathjs()).evaluate('1450 galUS').toNumber('L') // => 5488.8470868
 * (await loadMathjs()).evaluate('18 ppm').toNumber('mg/L') // => 18
 * ```
 */
export function loadMathjs(): Promise<Mathjs> {
  // The single file loads in a tenth of a second, the many small ones in half a second and more.
  loading ??= import('mathjs/lib/browser/math.js').then(({ default: math }) => {
    // A second copy of this module in one process (tests do that) must not fail on its own units.
    math.createUnit({ galUS: '3.785411784 L', galUK: '4.54609 L', ppm: '1 mg/L' }, { override: true });
    return math;
  });
  return loading;
}
