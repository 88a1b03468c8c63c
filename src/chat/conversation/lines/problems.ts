import type { ProblemCode } from '../../../core/problem.ts';
import type { Reading } from '../../reader/understood.ts';
import type { Line } from '../../replies/reply.ts';
import type { SentenceKey } from '../../replies/sentence-keys.ts';
import { line } from './line.ts';
import { noteText } from './notes.ts';

/** Each problem in a sentence with what to send instead; beside one no figure is given. */
export function problemLines(reading: Reading, vessel: string): Line[] {
  const lines = reading.problems.map(({ code, about }) =>
    line('first', keyOf(code, about, reading), { vessel, about: shortened(about), kind: kindOf(about) }),
  );
  const only = reading.problems.every(({ code }) => code === 'not-understood' || code === 'too-long');
  return only ? lines : [...lines, line('question', 'problem-no-number')];
}

/** The sentence for a problem; some have one that knows more of the matter. */
function keyOf(code: ProblemCode, about: string, reading: Reading): SentenceKey {
  if (code === 'unknown-additive' && noteText(reading, 'did-you-mean') !== undefined)
    return 'problem-did-you-mean';
  const isVolume = about === reading.where.volume_L?.text;
  if (code === 'ambiguous-number' && isVolume && noteText(reading, 'each-or-total') !== undefined)
    return 'problem-each-or-total';
  return `problem-${code}`;
}

/** Which kind of figure can be read in more than one way, by the look of it: each has its own way to write it plainly. */
const KINDS: readonly (readonly [RegExp, string])[] = [
  [/%/, 'percent'],
  [/°/, 'degree'],
  [/g\s*(\/|per)\s*h|g\/L|ppm|mg/i, 'rate'],
  [/^\D*\d{1,3}[.,]\d{3}(\D|$)/, 'thousands'],
  [/\d\s*[-–]\s*\d/, 'range'],
];

function kindOf(about: string): string {
  return KINDS.find(([pattern]) => pattern.test(about))?.[1] ?? 'other';
}

/** The person's own words, cut where they would fill the screen. */
export function shortened(about: string): string {
  const oneLine = about.replace(/[\p{C}\s]+/gu, ' ').trim();
  return oneLine.length > 40 ? `${oneLine.slice(0, 39)}…` : oneLine === '' ? '…' : oneLine;
}
