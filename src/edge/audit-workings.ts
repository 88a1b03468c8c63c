import type { Handled } from '../chat/conversation/ports.ts';
import { loadMathjs } from '../core/units/define.ts';
import { stepFault } from '../core/units/step-fault.ts';
import type { Step } from '../core/working.ts';

/** Takes the answers of a message whose replies are sent. */
export type Audit = (answers: Handled['answers']) => void;

/** So many workings wait to be checked at most; in a flood the rest go unchecked, for the answers come first. */
const MOST_WAITING = 50;

/**
 * Checks every working that was shown a second time, by another way: mathjs evaluates the lines, units and all. It is
 * loaded after the first answer and never stands before one. A line that does not hold is a fault of ours: the
 * operator is told.
 */
export function makeAudit(tell: (sentence: string) => void): Audit {
  const waiting: Step[][] = [];
  const check = async (): Promise<void> => {
    const math = await loadMathjs();
    for (const steps of waiting.splice(0)) {
      for (const step of steps) {
        const fault = stepFault(step, math);
        if (fault !== undefined) tell(`A working does not hold, please report it: ${step.name}: ${fault}`);
      }
    }
  };
  return (answers = []) => {
    const steps = answers.flatMap((answer) => [...(answer?.steps ?? [])]);
    if (steps.length === 0 || waiting.length >= MOST_WAITING) return;
    waiting.push(steps);
    if (waiting.length > 1) return;
    setImmediate(() => {
      check().catch((fault: unknown) => tell(`A working could not be checked: ${String(fault)}`));
    });
  };
}
