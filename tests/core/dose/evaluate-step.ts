import { loadMathjs } from '../../../src/core/units/define.ts';
import { stepFault } from '../../../src/core/units/step-fault.ts';
import { plainText, type Step } from '../../../src/core/working.ts';

const math = await loadMathjs();

/** What is wrong with a step's arithmetic, or nothing. */
export const wrongIn = (step: Step): string | undefined => stepFault(step, math);

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
