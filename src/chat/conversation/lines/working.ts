import { SOURCES } from '../../../core/sources.ts';
import type { Step } from '../../../core/working.ts';
import type { Line } from '../../replies/reply.ts';
import { expressionText, resultText, shortExpression } from '../../replies/working-text.ts';
import type { Manner } from '../manner.ts';
import { line } from './line.ts';

/** Lines of working that stand in a reply; the rest is behind the button. */
const MOST_LINES = 5;

/** Where a reading has more lines of working, these say the least and give way first. */
const GIVE_WAY: readonly Step['name'][] = ['dissociation', 'molecular-now', 'molecular-after', 'free-after'];

/** The three to five lines of the working that lead to the amount. */
export function workingLines(steps: readonly Step[], manner: Pick<Manner, 'mark' | 'unit'>): Line[] {
  // What all vessels take is told as what is measured for each, so often over.
  let shown = steps.filter(({ name }) => name !== 'all-vessels');
  for (const name of GIVE_WAY) if (shown.length > 4) shown = shown.filter((step) => step.name !== name);
  if (shown.length > MOST_LINES) shown = shown.filter((step) => !isPlainVolume(step));
  return shown.slice(-MOST_LINES).map((step) => line('working', 'working', shortValues(step, manner)));
}

/** Hectolitres are litres with two noughts more; gallons are not. */
function isPlainVolume({ name, substituted }: Step): boolean {
  return name === 'volume-in-litres' && !substituted.includes('gal');
}

/** Each line with its name, the numbers put in without the units that they share. */
export function namedWorking(steps: readonly Step[], manner: Pick<Manner, 'mark' | 'unit'>): Line[] {
  return steps.flatMap((step) => [
    line('first', `step-${step.name}`),
    line('first', 'working', shortValues(step, manner)),
  ]);
}

/** The whole working: each line with its name, its formula in words, the numbers put in, and the source. */
export function wholeWorking(steps: readonly Step[], manner: Pick<Manner, 'mark' | 'unit'>): Line[] {
  return steps.flatMap((step, at) => [
    line('first', `step-${step.name}`),
    line('first', 'working-symbol', { ...stepValues(step, manner), symbol: step.symbol }),
    ...(step.source === undefined || step.source === steps[at - 1]?.source
      ? []
      : [line('first', 'working-source', { source: SOURCES[step.source].title })]),
  ]);
}

function stepValues(
  { substituted, result }: Step,
  { mark, unit }: Pick<Manner, 'mark' | 'unit'>,
): Record<string, string> {
  return { substituted: expressionText(substituted, mark, unit), result: resultText(result, mark, unit) };
}

function shortValues(step: Step, manner: Pick<Manner, 'mark' | 'unit'>): Line['values'] {
  return stepValues({ ...step, substituted: shortExpression(step.substituted) }, manner);
}
