import { plainText, type Step } from '../working.ts';
import type { Mathjs } from './define.ts';

/** What mathjs makes of an expression, in a unit; NaN where it has another dimension. */
function evaluated(math: Mathjs, expression: string, unit: string): number {
  const value: unknown = math.evaluate(expression);
  if (typeof value === 'number') return unit === '' ? value : Number.NaN;
  try {
    return (value as { toNumber: (unit: string) => number }).toNumber(unit);
  } catch {
    return Number.NaN;
  }
}

/**
 * Holds a line of the working to account: `substituted`, dimensions and all, must give `result` within the rounding
 * of the digits it shows.
 *
 * @param step a line of a working; its units are those of this folder
 * @param math the one instance, from `loadMathjs`
 * @returns what is wrong with it, for the operator; undefined where nothing is
 * @throws SyntaxError when `substituted` is no expression
 *
 * @example
 * ```ts
 * import { loadMathjs } from './define.ts';
 * const math = await loadMathjs();
 * const step = { symbol: 'm', name: 'additive-mass', formula: '', substituted: '147.7 g / 0.57629', result: { value: 256.3, unit: 'g' } };
 * stepFault(step, math) // => undefined
 * stepFault({ ...step, result: { value: 265.3, unit: 'g' } }, math) // => '147.7 g / 0.57629 gives 256.29457 g, not 265.3 g'
 * ```
 */
export function stepFault(step: Step, math: Mathjs): string | undefined {
  const { substituted, result } = step;
  const value = evaluated(math, substituted, result.unit);
  const decimals = plainText(result.value).split('.')[1]?.length ?? 0;
  const half = 0.5 * 10 ** -decimals * (1 + 1e-9) + Math.abs(value) * 1e-12;
  const gap = Math.abs(value - result.value);
  if (gap <= half && gap <= 0.005 * Math.abs(value)) return undefined;
  return `${substituted} gives ${Number(value.toPrecision(8))} ${result.unit}, not ${result.value} ${result.unit}`;
}
