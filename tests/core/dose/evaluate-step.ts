import { loadMathjs } from '../../../src/core/units/define.ts';
import { plainText, type Step } from '../../../src/core/working.ts';

const math = await loadMathjs();

/** What mathjs makes of a step's `substituted`, in the unit of its result. */
export function evaluated(step: Step): number {
  const value: unknown = math.evaluate(step.substituted);
  if (typeof value === 'number') {
    if (step.result.unit !== '') throw new TypeError(`${step.substituted} has no unit`);
    return value;
  }
  return (value as { toNumber: (unit: string) => number }).toNumber(step.result.unit);
}

/** What is wrong with a step's arithmetic, or nothing: the result holds within the rounding of the digits it shows. */
export function wrongIn(step: Step): string | undefined {
  const value = evaluated(step);
  const decimals = plainText(step.result.value).split('.')[1]?.length ?? 0;
  const half = 0.5 * 10 ** -decimals * (1 + 1e-9) + Math.abs(value) * 1e-12;
  const gap = Math.abs(value - step.result.value);
  if (gap <= half && gap <= 0.005 * Math.abs(value)) return undefined;
  return `${step.substituted} is ${value}, not ${step.result.value} ${step.result.unit}`;
}

const OPERAND = (step: Step): string =>
  `${plainText(step.result.value)}${step.result.unit === '' ? '' : ` ${step.result.unit}`}`;

/** Lines whose printed result no later line takes up, without those that lead nowhere (molecular SO2, the last line). */
export function loose(steps: readonly Step[]): string[] {
  return steps
    .filter(
      ({ name }) =>
        !['molecular-now', 'molecular-after', 'mass-by-rate', 'solution-strength-by-salt'].includes(name),
    )
    .slice(0, -1)
    .filter((step) => {
      const after = steps.slice(steps.indexOf(step) + 1);
      return !after.some(({ substituted }) => substituted.includes(OPERAND(step)));
    })
    .map((step) => `${step.name} ${OPERAND(step)}`);
}
